import { describe, expect, it } from 'vitest';
import { fromStep, packSteps, toStep, unpackSteps, UNKNOWN_STEP } from './packed-steps';

describe('packed steps', () => {
  it('come back as they were, extremes and unknowns too', () => {
    const steps = Int16Array.from([0, 1, -1, 32_767, UNKNOWN_STEP, 500, -500, 32_767, -32_767, 0, 7, 7]);
    expect([...unpackSteps(packSteps(steps, 4), 4)]).toEqual([...steps]);
    expect([...unpackSteps(packSteps(steps, 12), 12)]).toEqual([...steps]);
  });

  it('come back for a long row', () => {
    const steps = Int16Array.from({ length: 20_000 }, (_, index) => Math.round(3000 * Math.sin(index / 50)));
    expect(unpackSteps(packSteps(steps, 100), 100)).toEqual(steps);
  });

  it('keep hundredths of a degree, and not known as null', () => {
    expect(fromStep(toStep(-6.237, 100), 100)).toBe(-6.24);
    expect(fromStep(toStep(NaN, 100), 100)).toBeNull();
    expect(fromStep(toStep(1e9, 100), 100)).toBe(327.67);
  });

  it('refuse what does not fill its rows', () => {
    expect(() => unpackSteps(packSteps(new Int16Array(6), 3), 4)).toThrow(RangeError);
  });
});
