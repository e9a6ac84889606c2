import { z } from 'zod';
import { highestRateGPerM2 } from '@/lib/ledger/limits';
import { typedNumber } from './form-values';

export const serviceClasses = ['A', 'B', 'C', 'D'] as const;
export type ServiceClass = (typeof serviceClasses)[number];

export const promises = ['bare', 'passable', 'low'] as const;
export type ServicePromise = (typeof promises)[number];

const rate = (what: string) =>
  typedNumber(
    z
      .number(`${what} must be a number.`)
      .gt(0, `${what} must be above 0.`)
      .max(highestRateGPerM2, `${what} is over ${highestRateGPerM2} g/m²: check the unit.`),
  );

const ClassRules = z.strictObject({
  promise: z.enum(promises, 'Choose a promise.'),
  /** time in which a truck comes round again, min */
  cycleMin: typedNumber(
    z
      .number('The cycle must be a number.')
      .min(15, 'A cycle is at least 15 minutes.')
      .max(1440, 'A cycle is at most a day.'),
  ),
});

/** The rules of one version of the policy, as they stand in the database. Versions are added, never changed. */
export const PolicyRules = z.strictObject({
  /** how long after the next pass is due the promise must still hold, min */
  marginMin: typedNumber(
    z
      .number('The margin must be a number.')
      .min(0, 'The margin cannot be negative.')
      .max(240, 'A margin over 4 hours is another cycle.'),
  ),
  /** the most of each form in one pass, g/m² */
  maxRateGPerM2: z.strictObject({
    solid: rate('The most dry solid'),
    prewet: rate('The most pre-wetted solid'),
    abrasive: rate('The most abrasive'),
  }),
  maxLiquidRateMlPerM2: rate('The most liquid'),
  classes: z.strictObject({ A: ClassRules, B: ClassRules, C: ClassRules, D: ClassRules }),
});
export type PolicyRules = z.output<typeof PolicyRules>;

export const AdoptPolicyInput = z.strictObject({
  /** the version this was begun from: a newer one in between is not overwritten unseen */
  basedOnVersion: z.int().min(0),
  rules: PolicyRules,
});
export type AdoptPolicyInput = z.output<typeof AdoptPolicyInput>;
