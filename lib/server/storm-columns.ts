import { toStep, UNKNOWN_STEP } from '@/lib/contracts/packed-steps';
import { NO_END, perUnit } from '@/lib/contracts/storm-state';
import { type Projection } from '@/lib/treatment/project-segment';
import { promiseMarginC } from '@/lib/treatment/promise-margin';

/** A road through the steps, ready to be packed. */
export interface RoadColumns {
  marginC: Int16Array;
  waterMm: Int16Array;
  massFraction: Int16Array;
  holdSteps: Int16Array;
}

type Projected = Pick<
  Projection,
  'freezeMarginC' | 'targetPhi' | 'waterMm' | 'brineMassFraction' | 'isKept' | 'knownFrom' | 'knownUntil'
>;

export interface RoadProjections {
  /** with what was logged only: what happens if nobody comes */
  alone: Projected;
  /** with what the plan asks for as well; the same when it asks for nothing */
  withPlan: Projected;
  /** step of the planned visit; null when none is planned */
  plannedIndex: number | null;
  tempsC: ArrayLike<number>;
  /** steps of every visit, logged and planned */
  passIndexes: readonly number[];
  /** steps that a fresh salt is given to work */
  workInSteps: number;
}

interface Judged {
  kept: Uint8Array;
  marginC: Float32Array;
}

/** The promise and its margin at every step; while a fresh salt works, what it will have reached counts. */
function judged(projected: Projected, road: RoadProjections): Judged {
  const kept = Uint8Array.from(projected.isKept);
  const marginC = Float32Array.from(projected.freezeMarginC, (freezeMarginC, index) =>
    promiseMarginC({ tempC: road.tempsC[index] ?? NaN, freezeMarginC, targetPhi: projected.targetPhi[index] ?? 1 }),
  );
  for (const from of road.passIndexes) {
    const until = Math.min(projected.knownUntil - 1, from + road.workInSteps);
    if (from < projected.knownFrom || !kept[until]) continue;
    for (let index = from; index < until; index += 1) {
      kept[index] = 1;
      marginC[index] = Math.max(marginC[index] ?? NaN, marginC[until] ?? NaN);
    }
  }
  return { kept, marginC };
}

/** Steps from each until the promise breaks; `NO_END` while it does not as far as is known. */
function holdsOf(kept: Uint8Array, { knownFrom, knownUntil }: Projected): Int16Array {
  const holds = new Int16Array(kept.length).fill(UNKNOWN_STEP);
  let breakAt = Infinity;
  for (let index = knownUntil - 1; index >= knownFrom; index -= 1) {
    if (!kept[index]) breakAt = index;
    holds[index] = Math.min(NO_END, breakAt - index);
  }
  return holds;
}

/**
 * A road's columns. Before the planned visit the hold is what is left if nobody comes, though the plan is assumed to be
 * carried out after it: so the cursor ahead of the plan shows the roads as they will be, and slack at any time what
 * hangs on the truck.
 */
export function roadColumns(road: RoadProjections): RoadColumns {
  const { alone, withPlan, plannedIndex, workInSteps } = road;
  const shown = judged(withPlan, road);
  const holdSteps = holdsOf(shown.kept, withPlan);
  if (plannedIndex !== null) {
    const left = judged(alone, {
      ...road,
      passIndexes: road.passIndexes.filter((index) => index !== plannedIndex),
      workInSteps,
    });
    const holdsAlone = holdsOf(left.kept, alone);
    holdSteps.set(holdsAlone.subarray(0, plannedIndex));
  }
  return {
    marginC: Int16Array.from(shown.marginC, (value) => toStep(value, perUnit.marginC)),
    waterMm: Int16Array.from(withPlan.waterMm, (value) => toStep(value, perUnit.waterMm)),
    massFraction: Int16Array.from(withPlan.brineMassFraction, (value) => toStep(value, perUnit.massFraction)),
    holdSteps,
  };
}
