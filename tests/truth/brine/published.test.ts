import { describe, expect, it } from 'vitest';
import { eutecticOf } from '../../../lib/brine/liquidus';
import { cationOf, chloridesOf } from '../../../lib/brine/salts';
import { lnActivityCoefficients, lnWaterActivity, osmoticCoefficient, pitzerAt } from '../../../lib/brine/pitzer';
import { published } from './published';
import { densityErrors, freezingErrors, spreadOf } from './score';
import { densityTolerances, eutecticTolerances, tolerances } from './tolerances';

describe('freezing points against published tables', () => {
  it.each(tolerances)('$salt, $table, $solid down to $downToC °C: within $largestC °C', (tolerance) => {
    const table = published.freezing.find(
      ({ salt, table: name, solid }) =>
        salt === tolerance.salt && name === tolerance.table && solid === tolerance.solid,
    );
    if (table === undefined) throw new Error('No such table among the fixtures');
    const errors = freezingErrors(table).filter(({ tableC }) => tableC >= tolerance.downToC);
    const spread = spreadOf(errors.map(({ errorC }) => errorC));
    expect(spread.count).toBe(tolerance.count);
    expect(spread.largest).toBeLessThanOrEqual(tolerance.largestC);
    expect(spread.mean).toBeLessThanOrEqual(tolerance.meanC);
    const rates = errors.flatMap(({ rateError }) => (rateError === null ? [] : [rateError]));
    expect(100 * spreadOf(rates).largest).toBeLessThanOrEqual(tolerance.largestRatePercent);
    for (const { solid } of errors) expect(solid).toBe(tolerance.solid);
  });

  it('covers every table of the fixtures to its last row', () => {
    const widest = new Map<string, number>();
    for (const { salt, table, solid, count } of tolerances) {
      const key = `${salt} ${table} ${solid}`;
      widest.set(key, Math.max(widest.get(key) ?? 0, count));
    }
    const rows = published.freezing.map(({ salt, table, solid, rows: list }) => [
      `${salt} ${table} ${solid}`,
      list.length,
    ]);
    expect(Object.fromEntries(widest)).toEqual(Object.fromEntries(rows));
    expect(published.freezing.reduce((sum, { rows: list }) => sum + list.length, 0)).toBe(122);
  });
});

describe('densities against published tables', () => {
  it.each(densityTolerances)('$salt, $table: within $largest kg/m³', ({ salt, table: name, count, largest, mean }) => {
    const table = published.density.find((entry) => entry.salt === salt && entry.table === name);
    if (table === undefined) throw new Error('No such table among the fixtures');
    const spread = spreadOf(densityErrors(table).map(({ errorKgPerM3 }) => errorKgPerM3));
    expect(spread.count).toBe(count);
    expect(spread.largest).toBeLessThanOrEqual(largest);
    expect(spread.mean).toBeLessThanOrEqual(mean);
  });
});

describe('eutectics in print', () => {
  it('are met in temperature and strength', () => {
    expect(published.eutectic).toHaveLength(5);
    for (const { salt, massFractionPercent, tempC } of published.eutectic) {
      if (salt === 'KCl') throw new Error('no eutectic of KCl is among the fixtures');
      const computed = eutecticOf(salt);
      const allowed = eutecticTolerances[salt];
      expect(Math.abs(computed.tempC - tempC), salt).toBeLessThanOrEqual(allowed.tempC);
      expect(Math.abs(100 * computed.massFraction - massFractionPercent), salt).toBeLessThanOrEqual(
        allowed.massFractionPercent,
      );
    }
  });
});

describe('the model against another program with the same parameters', () => {
  it('reproduces PHREEQC to 1e-7 in activity and osmotic coefficients', () => {
    expect(published.model.rows).toHaveLength(12);
    for (const row of published.model.rows) {
      const cation = cationOf[row.salt];
      const molality = { Na: 0, K: 0, Ca: 0, Mg: 0, [cation]: row.molality };
      const model = pitzerAt(row.tempC + 273.15, [cation]);
      expect(osmoticCoefficient(model, molality)).toBeCloseTo(row.osmoticCoefficient, 7);
      expect(lnWaterActivity(model, molality)).toBeCloseTo(row.lnWaterActivity, 7);
      const lnGamma = lnActivityCoefficients(model, molality);
      const chlorides = chloridesOf[row.salt];
      const mean = ((lnGamma.cations[cation] ?? Number.NaN) + chlorides * lnGamma.chloride) / (1 + chlorides);
      expect(mean).toBeCloseTo(row.lnGamma, 7);
    }
  });
});
