import { rateMLPerM2Of } from './materials';
import { passOverRoadOf } from './least-rate';
import { firstBroken, tryRate } from './trial';
import { type ChoiceInput, type MaterialAnswer } from './choose-treatment';

/** The most that may be spread, how long that lasts, and what the whole time would have taken. */
export interface ShorterCycle {
  readonly materialId: string;
  readonly rateGPerM2: number;
  readonly rateMLPerM2: number | null;
  /** the promise is kept for this long, min; a truck has to be back by then */
  readonly holdMin: number;
  readonly neededRateGPerM2: number;
}

/**
 * Of the products refused for their rate alone, the one that at its limit lasts longest, if at least as long as the
 * policy's shortest cycle; null when none does.
 */
export function shorterCycle(
  input: ChoiceInput,
  { options, isPloughed }: { options: readonly MaterialAnswer[]; isPloughed: boolean },
): ShorterCycle | null {
  let longest: ShorterCycle | null = null;
  for (const { materialId, answer } of options) {
    const material = input.materials.find(({ id }) => id === materialId);
    if (!material || answer.ok || material.form === 'abrasive') continue;
    const { limit, neededRateGPerM2 } = answer;
    if (neededRateGPerM2 === undefined || limit === undefined) continue;
    const road = passOverRoadOf({ ...input, isPloughed });
    const scatter = input.policy.scatter[material.form];
    const brokenIndex = firstBroken(tryRate(road, { material, rateGPerM2: limit, scatter }));
    if (brokenIndex === null) continue;
    const holdMin = (brokenIndex - 1) * input.weather.stepMin - input.policy.marginMin;
    if (holdMin < input.policy.shortestCycleMin || (longest && holdMin <= longest.holdMin)) continue;
    const rateMLPerM2 = material.form === 'liquid' ? rateMLPerM2Of(limit, material.densityKgPerM3) : null;
    longest = { materialId, rateGPerM2: limit, rateMLPerM2, holdMin, neededRateGPerM2 };
  }
  return longest;
}
