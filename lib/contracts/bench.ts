import { z } from 'zod';
import { salts } from '@/lib/brine/salts';

const number = (min: number, max: number, fallback: number) =>
  z.coerce.number().min(min).max(max).catch(fallback).default(fallback);

/** What the brine bench is set to, as it stands in the address: SI, and whatever cannot be read is left at its default. */
export const BenchQuery = z.object({
  salt: z.enum(salts).catch('NaCl').default('NaCl'),
  by: z.enum(['strength', 'reading']).catch('strength').default('strength'),
  /** mass fraction */
  strength: number(0, 0.99, 0.23),
  /** specific gravity 60/60 °F as read */
  sg: number(0.5, 2, 1.163),
  /** temperature of the brine when it was read */
  brineC: number(-60, 60, 10),
  roadC: z.coerce.number().min(-60).max(60).optional().catch(undefined),
  waterMm: number(0.01, 20, 0.1),
  tankL: number(0, 10_000_000, 0),
  /** mass fraction the tank should have */
  wanted: number(0.01, 0.45, 0.23),
});
export type BenchQuery = z.output<typeof BenchQuery>;
