import { describe, expect, it } from 'vitest';
import { mixBrines, zdanovskiiFreezingPoint } from '../../../lib/brine/blend';
import { massFractionFromSpecificGravity, salometerDegrees } from '../../../lib/brine/hydrometer';
import { lnIceActivity } from '../../../lib/brine/ice';
import { crystallisations } from '../../../lib/brine/hydrates';
import { icePointC } from '../../../lib/brine/ice-point';
import { eutecticOf, freezingPoint, massFractionAt } from '../../../lib/brine/liquidus';
import { brineToHold, iceMeltedPerKgSalt, saltToHold } from '../../../lib/brine/melt';
import {
  debyeHueckelSlopeAt,
  lnActivityCoefficients,
  lnWaterActivity,
  osmoticCoefficient,
  pitzerAt,
} from '../../../lib/brine/pitzer';
import {
  cationOf,
  chloridesOf,
  saltPerWaterOf,
  saltPerWaterToMolality,
  salts,
  type Salt,
} from '../../../lib/brine/salts';
import { hasReference, numberIn, readReference, whySkipped } from '../shared-reference';
import { published } from './published';

const asSalt = (text: string | undefined): Salt => {
  const salt = salts.find((known) => known === text);
  if (salt === undefined) throw new Error(`No salt: ${text ?? 'absent'}`);
  return salt;
};
const chlorideRows = (file: string, column: string) =>
  readReference(file).filter((row) => salts.some((salt) => salt === row[column]));

describe.skipIf(!hasReference)(`check files of the reference collection${whySkipped}`, () => {
  it('reproduces 105 rows of activities to 1e-7', () => {
    const rows = chlorideRows('chem/model_check_pitzer.csv', 'salt');
    expect(rows).toHaveLength(105);
    for (const row of rows) {
      const salt = asSalt(row['salt']);
      const cation = cationOf[salt];
      const tempK = numberIn(row, 'temperature_C') + 273.15;
      const molality = { Na: 0, K: 0, Ca: 0, Mg: 0, [cation]: numberIn(row, 'molality_mol_per_kg') };
      const model = pitzerAt(tempK, [cation]);
      const lnGamma = lnActivityCoefficients(model, molality);
      const mean =
        ((lnGamma.cations[cation] ?? Number.NaN) + chloridesOf[salt] * lnGamma.chloride) / (1 + chloridesOf[salt]);
      const pairs = [
        [debyeHueckelSlopeAt(tempK), 'A_phi'],
        [osmoticCoefficient(model, molality), 'osmotic_coefficient'],
        [lnWaterActivity(model, molality), 'ln_water_activity'],
        [mean, 'ln_gamma_pm'],
        [lnIceActivity(tempK), 'ln_ice_activity'],
      ] as const;
      for (const [computed, column] of pairs)
        expect(Math.abs(computed - numberIn(row, column)), column).toBeLessThan(1e-7);
    }
  });

  it('reproduces 34 rows of freezing points to 0.002 °C and their water activity to 1e-6', () => {
    const rows = chlorideRows('chem/model_check_liquidus.csv', 'material');
    expect(rows).toHaveLength(34);
    for (const row of rows) {
      const salt = asSalt(row['material']);
      const massFraction = numberIn(row, 'mass_fraction_percent') / 100;
      const perWater = saltPerWaterOf([{ salt, massFraction }]);
      const ice = icePointC(perWater) ?? Number.NaN;
      expect(Math.abs(ice - numberIn(row, 'freezing_point_C'))).toBeLessThan(0.002);
      expect(Math.exp(lnIceActivity(ice + 273.15))).toBeCloseTo(numberIn(row, 'water_activity_at_freezing_point'), 5);
      const m = saltPerWaterToMolality(salt, perWater[salt] ?? Number.NaN);
      expect(m).toBeCloseTo(numberIn(row, 'molality_mol_per_kg'), 5);
    }
  });

  it('reproduces 36 rows of the inverse to 0.002 % by mass', () => {
    const rows = chlorideRows('chem/model_check_inverse.csv', 'material');
    expect(rows).toHaveLength(36);
    for (const row of rows) {
      const salt = asSalt(row['material']);
      const tempC = numberIn(row, 'temperature_C');
      const result = massFractionAt(salt, tempC);
      expect(
        result.ok && Math.abs(100 * result.massFraction - numberIn(row, 'liquidus_mass_fraction_percent')),
      ).toBeLessThan(0.002);
      const melt = iceMeltedPerKgSalt(salt, tempC);
      expect(melt.ok && melt.iceKgPerKgSalt).toBeCloseTo(numberIn(row, 'kg_ice_melted_per_kg_anhydrous'), 2);
    }
  });

  it('reproduces 12 blends by both methods to 0.005 °C and their dihydrate to 0.02', () => {
    const rows = readReference('chem/model_check_blends.csv');
    expect(rows).toHaveLength(12);
    for (const row of rows) {
      const second = numberIn(row, 'mass_fraction_of_brine2_in_blend');
      const blend = mixBrines([
        {
          massKg: 1 - second,
          solutes: [{ salt: asSalt(row['salt1']), massFraction: numberIn(row, 'brine1_mass_percent') / 100 }],
        },
        {
          massKg: second,
          solutes: [{ salt: asSalt(row['salt2']), massFraction: numberIn(row, 'brine2_mass_percent') / 100 }],
        },
      ]);
      const perWater = saltPerWaterOf(blend);
      expect(Math.abs((icePointC(perWater) ?? Number.NaN) - numberIn(row, 'ice_point_full_pitzer_C'))).toBeLessThan(
        0.005,
      );
      const rule = zdanovskiiFreezingPoint(blend);
      expect(rule.ok && Math.abs(rule.freezingPointC - numberIn(row, 'ice_point_zdanovskii_C'))).toBeLessThan(0.005);
      if (row['hydrohalite_saturation_C'] === '') continue;
      const dihydrate = crystallisations(perWater).find(({ solid }) => solid.formula === 'NaCl·2H2O');
      expect(Math.abs((dihydrate?.tempC ?? Number.NaN) - numberIn(row, 'hydrohalite_saturation_C'))).toBeLessThan(0.02);
    }
  });

  it('reproduces 33 rows of the hydrate branches to 0.02 °C', () => {
    const rows = readReference('chem/model_check_hydrate_branch.csv');
    expect(rows).toHaveLength(33);
    const formulas = {
      Hydrohalite: 'NaCl·2H2O',
      Antarcticite: 'CaCl2·6H2O',
      'MgCl2:12H2O': 'MgCl2·12H2O',
      'MgCl2:8H2O': 'MgCl2·8H2O',
    };
    for (const row of rows) {
      const result = freezingPoint([
        { salt: asSalt(row['salt']), massFraction: numberIn(row, 'mass_fraction_percent') / 100 },
      ]);
      if (!result.ok) throw new Error(result.reason);
      expect(result.solid).toBe(formulas[(row['solid_phase'] ?? '') as keyof typeof formulas]);
      expect(Math.abs(result.freezingPointC - numberIn(row, 'saturation_temperature_C'))).toBeLessThan(0.02);
    }
  });

  it('has in its own fixtures every reference row of the three chlorides', () => {
    let count = 0;
    for (const [file, salt] of [
      ['nacl', 'NaCl'],
      ['cacl2', 'CaCl2'],
      ['mgcl2', 'MgCl2'],
    ] as const) {
      const rows = readReference(`chem/${file}.csv`).filter(
        (row) =>
          /^(reference|corrected)/.test(row['quality'] ?? '') &&
          ['ice', 'MgCl2.12H2O'].includes(row['solid_phase'] ?? ''),
      );
      for (const row of rows) {
        if (row['freezing_point_C'] === '') continue;
        const here = published.freezing
          .filter((table) => table.salt === salt && table.source === row['source'])
          .flatMap((table) => table.rows)
          .filter(
            ([percent, tempC]) =>
              percent === numberIn(row, 'mass_fraction_percent') && tempC === numberIn(row, 'freezing_point_C'),
          );
        expect(here.length, `${salt} ${row['mass_fraction_percent'] ?? ''}`).toBeGreaterThan(0);
        count += 1;
      }
    }
    expect(count).toBe(122);
  });
});

describe('worked examples of the method', () => {
  const strength = (salt: Salt, tempC: number) => {
    const result = massFractionAt(salt, tempC);
    return result.ok ? 100 * result.massFraction : Number.NaN;
  };

  it('1, 2, 3: 10 % NaCl freezes at −6.607 °C; at −8 °C 11.709 %, 66.31 g/m² dry or 518.5 g/m² of 23 % brine', () => {
    const result = freezingPoint([{ salt: 'NaCl', massFraction: 0.1 }]);
    expect(result.ok && Math.abs(result.freezingPointC + 6.607)).toBeLessThan(0.002);
    expect(Math.abs(strength('NaCl', -8) - 11.709)).toBeLessThan(0.01);
    const dry = saltToHold('NaCl', 500, -8);
    const wet = brineToHold({ salt: 'NaCl', massFraction: 0.23 }, 500, -8);
    expect(dry.ok && Math.abs(dry.saltGPerM2 - 66.31)).toBeLessThan(0.1);
    expect(wet.ok && Math.abs(wet.brineGPerM2 - 518.5)).toBeLessThan(0.5);
  });

  it('4, 5: −31 °C is 25.118 % CaCl2 and no limit of it; 15 % MgCl2 freezes at −15.837 °C', () => {
    expect(Math.abs(strength('CaCl2', -31) - 25.118)).toBeLessThan(0.005);
    expect(eutecticOf('CaCl2').tempC).toBeLessThan(-50);
    const result = freezingPoint([{ salt: 'MgCl2', massFraction: 0.15 }]);
    expect(result.ok && Math.abs(result.freezingPointC + 15.837)).toBeLessThan(0.002);
  });

  it('6: a kilogram of NaCl melts 8.528 kg of ice at −7 °C', () => {
    const melt = iceMeltedPerKgSalt('NaCl', -7);
    expect(melt.ok && Math.abs(melt.iceKgPerKgSalt - 8.528)).toBeLessThan(0.005);
  });

  it('8: specific gravity 1.170 is 22.30 % NaCl and 84.5 degrees salometer', () => {
    const read = massFractionFromSpecificGravity('NaCl', 1.17, 15.56);
    expect(read.ok && Math.abs(100 * read.massFraction - 22.3)).toBeLessThan(0.02);
    expect(read.ok && Math.abs(salometerDegrees(read.massFraction) - 84.5)).toBeLessThan(0.1);
  });

  it('10: 20 % NaCl at 25 °C has a water activity of 0.83906', () => {
    const molality = { Na: saltPerWaterToMolality('NaCl', 0.25), K: 0, Ca: 0, Mg: 0 };
    expect(Math.abs(Math.exp(lnWaterActivity(pitzerAt(298.15, ['Na']), molality)) - 0.83906)).toBeLessThan(1e-5);
  });
});
