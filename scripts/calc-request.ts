import { z } from 'zod';
import { salts } from '../lib/brine/salts';

const material = z.enum(salts, {
  error: (issue) =>
    `${JSON.stringify(issue.input ?? null)} is no material this answers for; it knows ${salts.join(', ')}`,
});
const massFraction = z
  .number({ error: 'a mass fraction is a number: 10 % is 0.1' })
  .min(0, { error: 'a mass fraction is 0 or more' })
  .lt(1, { error: 'a mass fraction is below 1: 10 % is 0.1' });
const solutes = z
  .array(z.strictObject({ material, massFraction }), { error: 'solutes is a list of { material, massFraction }' })
  .max(20, { error: 'at most 20 solutes' })
  .refine((list) => list.reduce((sum, solute) => sum + solute.massFraction, 0) < 1, {
    error: 'the mass fractions add up to 1 or more, which leaves no water',
  });
const tempC = z
  .number({ error: 'a temperature is a number of °C' })
  .min(-273.15, { error: 'nothing is colder than −273.15 °C' })
  .max(1000, { error: 'a temperature above 1,000 °C is not a brine' });

/** One question a line. */
export const CalcRequest = z.discriminatedUnion(
  'ask',
  [
    z.strictObject({ ask: z.literal('freezing-point'), solutes }),
    z.strictObject({ ask: z.literal('mass-fraction-at'), material, tempC }),
    z.strictObject({ ask: z.literal('eutectic'), material }),
    z.strictObject({ ask: z.literal('density'), solutes, tempC }),
    z.strictObject({ ask: z.literal('saturation-temp'), solutes }),
    z.strictObject({
      ask: z.literal('blend-freezing-point'),
      solutes,
      method: z.enum(['pitzer', 'zdanovskii'], { error: 'method is "pitzer" or "zdanovskii"' }).default('pitzer'),
    }),
    z.strictObject({
      ask: z.literal('strength-from-reading'),
      material,
      specificGravity: z.number({ error: 'a specific gravity is a number such as 1.17' }),
      tempC,
    }),
    z.strictObject({ ask: z.literal('ice-melted'), material, tempC }),
  ],
  {
    error:
      'ask is one of "freezing-point", "mass-fraction-at", "eutectic", "density", "saturation-temp", "blend-freezing-point", "strength-from-reading", "ice-melted"',
  },
);
export type CalcRequest = z.infer<typeof CalcRequest>;
