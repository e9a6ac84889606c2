import { describe, expect, it } from 'vitest';
import { UNKNOWN_STEP } from '@/lib/contracts/packed-steps';
import { NO_END } from '@/lib/contracts/storm-state';
import { roadColumns, type RoadProjections } from './storm-columns';

/** Kept at each step by a digit, −3 °C throughout, wet with a brine of margin +1 while kept and −1 when not. */
function projected(kept: string, knownCount = kept.length): RoadProjections['alone'] {
  const isKept = Uint8Array.from(kept, Number);
  return {
    isKept,
    freezeMarginC: Float32Array.from(isKept, (one, index) => (index < knownCount ? (one ? 1 : -1) : NaN)),
    targetPhi: new Float32Array(kept.length).fill(1),
    waterMm: new Float32Array(kept.length).fill(0.2),
    brineMassFraction: new Float32Array(kept.length).fill(0.08),
    knownFrom: 0,
    knownUntil: knownCount,
  };
}

function columns(kept: string, more: Partial<RoadProjections> = {}) {
  const alone = projected(kept);
  return roadColumns({
    alone,
    withPlan: alone,
    plannedIndex: null,
    tempsC: new Float64Array(kept.length).fill(-3),
    passIndexes: [],
    workInSteps: 2,
    ...more,
  });
}

describe('a road’s columns', () => {
  it('count the steps until the promise breaks, 0 while it is broken, no end where it is kept to the last', () => {
    expect([...columns('111001').holdSteps]).toEqual([3, 2, 1, 0, 0, NO_END]);
  });

  it('give a fresh salt its time to work, but only if it then works', () => {
    const worked = columns('000111', { passIndexes: [1] });
    expect([...worked.holdSteps]).toEqual([0, NO_END, NO_END, NO_END, NO_END, NO_END]);
    expect([...worked.marginC]).toEqual([-100, 100, 100, 100, 100, 100]);
    expect([...columns('000011', { passIndexes: [1] }).holdSteps].slice(0, 4)).toEqual([0, 0, 0, 0]);
  });

  it('before the planned visit show what is left if nobody comes, after it what the visit leaves', () => {
    const { holdSteps, marginC } = columns('110000', {
      withPlan: projected('110111'),
      plannedIndex: 3,
      passIndexes: [3],
    });
    expect([...holdSteps]).toEqual([2, 1, 0, NO_END, NO_END, NO_END]);
    expect(marginC[3]).toBe(100);
  });

  it('leave what is not known unknown', () => {
    const alone = projected('1110', 3);
    const { holdSteps, marginC } = columns('1110', { alone, withPlan: alone });
    expect(holdSteps[3]).toBe(UNKNOWN_STEP);
    expect(marginC[3]).toBe(UNKNOWN_STEP);
    expect(holdSteps[2]).toBe(NO_END);
  });
});
