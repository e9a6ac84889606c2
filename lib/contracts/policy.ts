import { z } from 'zod';
import { highestRateGPerM2 } from '@/lib/ledger/limits';
import { defaultPolicy, type Policy } from '@/lib/treatment/policy';
import { promiseKinds } from '@/lib/treatment/promise';
import { typedNumber } from './form-values';

const rate = (what: string) =>
  typedNumber(
    z
      .number(`${what} must be a number.`)
      .gt(0, `${what} must be above 0.`)
      .max(highestRateGPerM2, `${what} is over ${highestRateGPerM2} g/m²: check the unit.`),
  );
const share = (what: string, max: number) =>
  typedNumber(
    z
      .number(`${what} must be a number.`)
      .min(0, `${what} cannot be below 0 %.`)
      .max(max, `${what} cannot be over ${max * 100} %.`),
  );
const minutes = (what: string, least: number) =>
  typedNumber(
    z
      .number(`${what} must be a number.`)
      .min(least, `${what} is at least ${least} minutes.`)
      .max(480, `${what} is at most 8 hours.`),
  );
const Promised = z.enum(promiseKinds, 'Choose a promise.');
const traffic = typedNumber(
  z
    .number('Traffic must be a number.')
    .min(0, 'Traffic cannot be negative.')
    .max(4000, 'No lane carries over 4000 an hour.'),
);

/** The rules of one version of the policy. Versions are added, never changed. */
export const PolicyRules = z.strictObject({
  promises: z.strictObject({ A: Promised, B: Promised, C: Promised, D: Promised }),
  looseBrineShare: share('The brine share', 0.5),
  maxRateGPerM2: z.strictObject({
    liquid: rate('The most liquid'),
    prewet: rate('The most pre-wetted solid'),
    solid: rate('The most dry solid'),
  }),
  minRateGPerM2: z.strictObject({
    liquid: rate('The least liquid'),
    prewet: rate('The least pre-wetted solid'),
    solid: rate('The least dry solid'),
  }),
  scatter: z.strictObject({
    liquid: share('Scatter', 0.9),
    prewet: share('Scatter', 0.9),
    solid: share('Scatter', 0.9),
  }),
  marginMin: minutes('The margin', 0),
  workInMin: minutes('The time to work in', 0),
  ploughFromMm: typedNumber(
    z.number('The depth must be a number.').min(0, 'The depth cannot be negative.').max(50, 'The depth is over 50 mm.'),
  ),
  shortestCycleMin: minutes('The shortest cycle', 15),
  abrasiveRateGPerM2: rate('The rate of abrasives'),
  vehiclesPerH: z.strictObject({ A: traffic, B: traffic, C: traffic, D: traffic }),
  blowingFromMPerS: typedNumber(
    z.number('The wind must be a number.').min(0, 'Wind cannot be negative.').max(60, 'The wind is over 60 m/s.'),
  ),
  blowingBelowC: typedNumber(
    z
      .number('The temperature must be a number.')
      .min(-60, 'The temperature is below −60 °C.')
      .max(0, 'The temperature is at or below 0 °C.'),
  ),
});

export const AdoptPolicyInput = z
  .strictObject({
    /** the version this was begun from: a newer one in between is not overwritten unseen */
    basedOnVersion: z.int().min(0),
    rules: PolicyRules,
  })
  .superRefine(({ rules }, context) => {
    for (const form of ['liquid', 'prewet', 'solid'] as const) {
      if (rules.minRateGPerM2[form] < rules.maxRateGPerM2[form]) continue;
      context.addIssue({
        code: 'custom',
        path: ['rules', 'maxRateGPerM2', form],
        message: 'The most must be above the least.',
      });
    }
  });
export type AdoptPolicyInput = z.output<typeof AdoptPolicyInput>;

/** What a version says, read back from the database; a part it does not name is as in the default policy. */
export function readPolicy(rules: unknown): Policy {
  const named = typeof rules === 'object' && rules !== null ? rules : {};
  return PolicyRules.parse({ ...defaultPolicy, ...named });
}
