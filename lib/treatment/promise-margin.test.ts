import { describe, expect, it } from 'vitest';
import { curveOf } from '../road/partition';
import { promiseMarginC } from './promise-margin';

const freezingPointC = (massFraction: number) => curveOf('NaCl').freezingPointC(massFraction / (1 - massFraction));
const at = (tempC: number, massFraction: number, targetPhi: number) =>
  promiseMarginC({ tempC, freezeMarginC: tempC - freezingPointC(massFraction), targetPhi });

describe('the margin against the promise', () => {
  it('is the freeze margin where no ice is allowed', () => {
    expect(at(-5, 0.1, 1)).toBeCloseTo(-5 - freezingPointC(0.1), 9);
  });

  it('crosses 0 where the brine share is just what was promised', () => {
    const tempC = -5;
    const perWater = curveOf('NaCl').saltPerWaterAt(tempC);
    const onCurve = perWater / (1 + perWater);
    expect(at(tempC, onCurve * 0.16, 0.16)).toBeCloseTo(0, 2);
    expect(at(tempC, onCurve * 0.17, 0.16)).toBeGreaterThan(0.2);
    expect(at(tempC, onCurve * 0.15, 0.16)).toBeLessThan(-0.2);
  });

  it('1.55 % NaCl on loose snow at −5 °C has 1.36 °C left, though by itself it would freeze', () => {
    expect(at(-5, 0.0155, 0.16)).toBeCloseTo(1.36, 1);
    expect(-5 - freezingPointC(0.0155)).toBeCloseTo(-4.08, 1);
  });

  it('is the pavement temperature where no salt lies, whatever was promised', () => {
    expect(at(-4, 0, 0.1)).toBeCloseTo(-4, 9);
    expect(at(-4, 0, 1)).toBeCloseTo(-4, 9);
  });

  it('stops at the eutectic and lets what is not known stay so', () => {
    expect(at(-10, 0.2, 0.1)).toBeCloseTo(-10 - curveOf('NaCl').eutecticC, 6);
    expect(promiseMarginC({ tempC: NaN, freezeMarginC: NaN, targetPhi: 0.1 })).toBeNaN();
  });
});
