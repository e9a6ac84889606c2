import { z } from 'zod';
import { highestLoadKg, highestRateGPerM2 } from '@/lib/ledger/limits';
import { filledName, typedBoolean, typedId, typedIdOrNone, typedNumber, typedNumberOrNone } from './form-values';

const amount = (what: string, max: number, maxText: string) =>
  z
    .number(`${what} must be a number.`)
    .min(0, `${what} cannot be negative.`)
    .max(max, `${what} is over ${maxText}: check the unit.`);

export const SaveYardInput = z.strictObject({
  id: typedIdOrNone,
  name: filledName('A yard'),
  longitudeDeg: typedNumber(z.number('The longitude must be a number.').min(-180).max(180, 'Longitudes end at 180.')),
  latitudeDeg: typedNumber(z.number('The latitude must be a number.').min(-90).max(90, 'Latitudes end at 90.')),
  solidCapacityKg: typedNumber(amount('The stockpile', 100_000_000, '100 000 t')),
  brineCapacityL: typedNumber(amount('The brine tank', 10_000_000, '10 000 000 L')),
  isActive: typedBoolean,
});
export type SaveYardInput = z.output<typeof SaveYardInput>;

export const SaveTruckInput = z.strictObject({
  id: typedIdOrNone,
  number: typedNumber(z.number('The number must be a whole number.').int('The number must be whole.').min(1).max(9999)),
  name: filledName('A truck'),
  yardId: typedId,
  ploughWidthM: typedNumberOrNone(
    z
      .number('The plough width must be a number.')
      .min(1, 'A plough is at least 1 m wide.')
      .max(8, 'A plough is at most 8 m wide.'),
  ),
  isActive: typedBoolean,
});
export type SaveTruckInput = z.output<typeof SaveTruckInput>;

export const SaveSpreaderInput = z
  .strictObject({
    id: typedIdOrNone,
    truckId: typedId,
    name: filledName('A spreader'),
    hopperKg: typedNumber(amount('The hopper', highestLoadKg, `${highestLoadKg / 1000} t`)),
    tankL: typedNumber(amount('The tank', 60_000, '60 000 L')),
    minRateGPerM2: typedNumber(amount('The lowest rate', highestRateGPerM2, `${highestRateGPerM2} g/m²`)),
    maxRateGPerM2: typedNumber(amount('The highest rate', highestRateGPerM2, `${highestRateGPerM2} g/m²`)),
    maxLiquidRateMlPerM2: typedNumberOrNone(amount('The highest liquid rate', 1000, '1000 mL/m²')),
    calibratedOn: z.preprocess(
      (value) => (value === '' || value === undefined ? null : value),
      z.iso.date('The date of calibration must be a date.').nullable(),
    ),
  })
  .refine((input) => input.maxRateGPerM2 > input.minRateGPerM2, {
    path: ['maxRateGPerM2'],
    message: 'The highest rate must be above the lowest.',
  });
export type SaveSpreaderInput = z.output<typeof SaveSpreaderInput>;
