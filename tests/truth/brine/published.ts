import { z } from 'zod';
import { salts } from '../../../lib/brine/salts';
import fixtures from './fixtures.json';

const salt = z.enum(salts);
const row = z.tuple([z.number(), z.number()]);

/** What `fixtures.json` holds: published values with their sources, none of them computed here. */
const Published = z.strictObject({
  about: z.string(),
  freezing: z.array(
    z.strictObject({
      salt,
      table: z.enum(['crc', 'lange', 'melinder']),
      solid: z.string(),
      source: z.string(),
      rows: z.array(row),
    }),
  ),
  density: z.array(
    z.strictObject({
      salt,
      table: z.enum(['crc', 'lange']),
      tempC: z.number(),
      source: z.string(),
      rows: z.array(row),
    }),
  ),
  eutectic: z.array(z.strictObject({ salt, massFractionPercent: z.number(), tempC: z.number(), source: z.string() })),
  model: z.strictObject({
    source: z.string(),
    rows: z.array(
      z.strictObject({
        salt,
        molality: z.number(),
        tempC: z.number(),
        osmoticCoefficient: z.number(),
        lnWaterActivity: z.number(),
        lnGamma: z.number(),
      }),
    ),
  }),
});

export const published = Published.parse(fixtures);
export type FreezingTable = (typeof published.freezing)[number];
export type DensityTable = (typeof published.density)[number];
