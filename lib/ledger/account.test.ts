import { describe, expect, it } from 'vitest';
import { accountFor, chlorideKg, differenceFraction, emptyAccount, medianRate, type LedgerEntry } from './account';

const rockSalt = { id: 1, name: 'Rock salt', composition: { NaCl: 0.97 }, costCentsPerTonne: 7200 };
const pure = (salt: 'NaCl' | 'MgCl2' | 'CaCl2') => ({
  id: 2,
  name: salt,
  composition: { [salt]: 1 },
  costCentsPerTonne: 0,
});
const entry = (over: Partial<LedgerEntry>): LedgerEntry => ({
  runId: 'r',
  segmentId: 1,
  areaM2: 10_000,
  isSensitive: false,
  outcome: 'spread',
  materialId: 1,
  rateGPerM2: 22,
  recommendedMaterialId: 1,
  recommendedRateGPerM2: 20,
  ...over,
});
const materials = new Map([[1, rockSalt]]);

describe('account', () => {
  // Check values V045–V047 (molar masses)
  it.each([
    ['NaCl', 606.63],
    ['MgCl2', 744.72],
    ['CaCl2', 638.88],
  ] as const)('1,000 kg of %s hold %f kg of chloride', (salt, expected) => {
    expect(chlorideKg(pure(salt), 1000)).toBeCloseTo(expected, 1);
  });

  it('20 g/m² on a hectare is 200 kg, and 22 g/m² is a tenth over', () => {
    const account = accountFor([entry({})], materials);
    expect(account.recommendedKg).toBeCloseTo(200, 9);
    expect(account.spreadKg).toBeCloseTo(220, 9);
    expect(differenceFraction(account)).toBeCloseTo(0.1, 9);
    expect(account.saltKg).toBeCloseTo(213.4, 9);
    expect(account.costCents).toBeCloseTo(1584, 9);
  });

  it('a skipped road adds to what was recommended and nothing to what was spread', () => {
    const account = accountFor([entry({ outcome: 'skipped', materialId: null, rateGPerM2: null })], materials);
    expect(account).toMatchObject({ skipped: 1, spreadKg: 0, costCents: 0 });
    expect(account.recommendedKg).toBeCloseTo(200, 9);
  });

  it('counts chloride on sensitive ground apart', () => {
    const account = accountFor([entry({}), entry({ isSensitive: true })], materials);
    expect(account.chlorideOnSensitiveKg).toBeCloseTo(account.chlorideKg / 2, 9);
  });

  it('has no difference to show when nothing was recommended', () => {
    expect(differenceFraction(emptyAccount)).toBeNull();
  });

  it('takes the middle rate, or half-way between two', () => {
    expect(medianRate([30, 10, 20])).toBe(20);
    expect(medianRate([30, 10])).toBe(20);
    expect(medianRate([])).toBeNull();
  });
});
