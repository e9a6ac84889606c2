import { describe, expect, it } from 'vitest';
import { zdanovskiiFreezingPointOf } from './blend';
import { fastLiquidus, fastMixtureFreezingPointC } from './fast';
import { saltPerWaterOnIceBranch } from './ice-point';
import { freezingPointOf } from './liquidus';
import { salts } from './salts';

describe.each(salts)('the tabulated curve of %s', (salt) => {
  const fast = fastLiquidus(salt);

  it('is within 0.01 °C of the full model from 0 to the eutectic', () => {
    let largest = 0;
    let count = 0;
    for (let tempC = -0.003; tempC > fast.eutecticC; tempC -= 0.0437) {
      largest = Math.max(largest, Math.abs(fast.freezingPointC(saltPerWaterOnIceBranch(salt, tempC)) - tempC));
      const full = freezingPointOf({ [salt]: fast.saltPerWaterAt(tempC) });
      largest = Math.max(largest, full.ok ? Math.abs(full.freezingPointC - tempC) : Infinity);
      count += 1;
    }
    expect(count).toBeGreaterThan(200);
    expect(largest).toBeLessThan(0.01);
  });

  it('answers 0 for no salt and no frost, Infinity below the eutectic, and the eutectic for more salt than it', () => {
    expect(fast.freezingPointC(0)).toBe(0);
    expect(fast.saltPerWaterAt(0)).toBe(0);
    expect(fast.saltPerWaterAt(3)).toBe(0);
    expect(fast.saltPerWaterAt(fast.eutecticC - 1e-6)).toBe(Infinity);
    expect(fast.saltPerWaterAt(fast.eutecticC)).toBeLessThan(1);
    expect(fast.freezingPointC(5)).toBe(fast.eutecticC);
    expect(fast.freezingPointC(Infinity)).toBe(fast.eutecticC);
    expect(fast.eutecticMassFraction).toBeCloseTo(
      fast.saltPerWaterAt(fast.eutecticC) / (1 + fast.saltPerWaterAt(fast.eutecticC)),
      3,
    );
  });

  it('is the mixture of one', () => {
    for (const x of [0.01, 0.1, 0.2, 3]) expect(fastMixtureFreezingPointC({ [salt]: x })).toBe(fast.freezingPointC(x));
  });
});

describe('the tabulated blend', () => {
  it('is within 0.01 °C of the rule worked out in full', () => {
    for (const [i, first] of salts.entries())
      for (const second of salts.slice(i + 1))
        for (const a of [0.005, 0.05, 0.12])
          for (const b of [0.002, 0.04, 0.11]) {
            const full = zdanovskiiFreezingPointOf({ [first]: a, [second]: b });
            const fast = fastMixtureFreezingPointC({ [first]: a, [second]: b });
            expect(full.ok && Math.abs(full.freezingPointC - fast), `${first} ${a} ${second} ${b}`).toBeLessThan(0.01);
          }
  });

  it('is nought for water, never below the coldest eutectic, and no jump when a trace of a second salt comes in', () => {
    expect(fastMixtureFreezingPointC({})).toBe(0);
    expect(fastMixtureFreezingPointC({ NaCl: 0, CaCl2: 0 })).toBe(0);
    expect(fastMixtureFreezingPointC({ NaCl: 5, CaCl2: 5 })).toBeCloseTo(fastLiquidus('CaCl2').eutecticC, 9);
    const alone = fastMixtureFreezingPointC({ NaCl: 2 });
    expect(fastMixtureFreezingPointC({ NaCl: 2, CaCl2: 1e-7 })).toBeCloseTo(alone, 2);
  });

  it('falls steadily as salt is added', () => {
    let last = 0;
    for (let x = 0.001; x < 0.25; x += 0.004) {
      const next = fastMixtureFreezingPointC({ NaCl: x, MgCl2: x / 3 });
      expect(next).toBeLessThan(last);
      last = next;
    }
  });
});
