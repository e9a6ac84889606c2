import { z } from 'zod';
import { salts } from '@/lib/brine/salts';
import { filledName, typedBoolean, typedId, typedIdOrNone, typedNumber, typedNumberOrNone } from './form-values';

/** What the database holds too: from fluffy abrasives to dense rock. */
export const materialLimits = {
  densityKgPerM3: { min: 500, max: 3000 },
  practicalMinimumC: { min: -60, max: 0 },
  costCentsPerTonne: { max: 1_000_000 },
} as const;

const fraction = (what: string) =>
  z.number(`${what} must be a number.`).min(0, `${what} cannot be below 0 %.`).max(1, `${what} cannot be over 100 %.`);

const costCentsPerTonne = typedNumber(
  z
    .number('The cost must be an amount of money.')
    .int('The cost goes to two decimals.')
    .min(0, 'The cost cannot be negative.')
    .max(materialLimits.costCentsPerTonne.max, 'The cost is beyond what is believable: check the unit.'),
);

const practicalMinimumC = typedNumberOrNone(
  z
    .number('The temperature must be a number.')
    .min(materialLimits.practicalMinimumC.min, 'No material works below −60 °C.')
    .max(materialLimits.practicalMinimumC.max, 'The lowest useful temperature is at or below 0 °C.'),
);

const shared = { id: typedIdOrNone, name: filledName('A material'), practicalMinimumC, isActive: typedBoolean };

const SingleMaterial = z
  .strictObject({
    ...shared,
    form: z.enum(['solid', 'liquid', 'abrasive'], 'Choose a form.'),
    composition: z.partialRecord(z.enum(salts), typedNumberOrNone(fraction('A share'))),
    waterMassFraction: typedNumber(fraction('Water')),
    densityKgPerM3: typedNumber(
      z
        .number('The density must be a number.')
        .min(materialLimits.densityKgPerM3.min, 'The density is below 500 kg/m³: check the unit.')
        .max(materialLimits.densityKgPerM3.max, 'The density is over 3000 kg/m³: check the unit.'),
    ),
    costCentsPerTonne,
  })
  .superRefine((input, context) => {
    const saltShare = Object.values(input.composition).reduce<number>((sum, share) => sum + (share ?? 0), 0);
    // Typed percentages may add up to a rounding error over the whole.
    if (saltShare + input.waterMassFraction > 1.0005) {
      context.addIssue({ code: 'custom', path: ['waterMassFraction'], message: 'Salts and water come to over 100 %.' });
    }
    if (input.form !== 'abrasive' && saltShare <= 0) {
      context.addIssue({ code: 'custom', path: ['composition'], message: 'A de-icer has at least one salt.' });
    }
    if (input.form === 'liquid' && input.waterMassFraction <= 0) {
      context.addIssue({ code: 'custom', path: ['waterMassFraction'], message: 'A liquid has water in it.' });
    }
  });

const PrewetMaterial = z.strictObject({
  ...shared,
  form: z.literal('prewet'),
  solidMaterialId: typedId,
  liquidMaterialId: typedId,
  liquidMassFraction: typedNumber(
    z
      .number('The share of liquid must be a number.')
      .gt(0, 'The share of liquid is above 0 %.')
      .max(0.5, 'Over half liquid is no pre-wetted solid any more.'),
  ),
});

export const SaveMaterialInput = z.discriminatedUnion('form', [SingleMaterial, PrewetMaterial]);
export type SaveMaterialInput = z.output<typeof SaveMaterialInput>;
export type SaveSingleMaterialInput = z.output<typeof SingleMaterial>;
export type SavePrewetMaterialInput = z.output<typeof PrewetMaterial>;
