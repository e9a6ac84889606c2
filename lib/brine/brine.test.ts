import { describe, expect, it } from 'vitest';
import { prewetByMass, saltToStrengthenKg, waterToDiluteKg } from './batch';
import { bisect } from './bisect';
import { mixBrines, zdanovskiiFreezingPoint } from './blend';
import { brineDensityKgPerM3, waterDensityKgPerM3 } from './density';
import { harvieJ } from './harvie';
import { large, small } from './harvie-coefficients';
import { massFractionFromSpecificGravity, salometerDegrees, specificGravity60F } from './hydrometer';
import { icePointC } from './ice-point';
import { eutecticOf, freezingPoint, massFractionAt, saturatedMassFractionAt } from './liquidus';
import { brineToHold, filmAtRefreeze, iceMeltedPerKgSalt, productToHold, saltToHold } from './melt';
import { cationMixings, chloridePairs } from './pitzer-parameters';
import { crystals } from './equilibrium-constants';
import { massFractionToSaltPerWater, saltPerWaterOf, saltPerWaterToMassFraction, salts, type Salt } from './salts';

const freezingC = (salt: Salt, massFraction: number): number => {
  const result = freezingPoint([{ salt, massFraction }]);
  if (!result.ok) throw new Error(`${salt} ${massFraction}: ${result.reason}`);
  return result.freezingPointC;
};
const strengthAt = (salt: Salt, tempC: number): number => {
  const result = massFractionAt(salt, tempC);
  if (!result.ok) throw new Error(`${salt} ${tempC}: ${result.reason}`);
  return result.massFraction;
};
const between = (from: number, to: number, steps: number) =>
  Array.from({ length: steps + 1 }, (_, index) => from + ((to - from) * index) / steps);

describe('tables of coefficients', () => {
  it('hold every row of the source: column sums and counts', () => {
    const series = Object.values(chloridePairs).flatMap(({ b0, b1, b2, c0 }) => [b0, b1, b2, c0]);
    const all = [...series, ...cationMixings.flatMap(({ theta, psi }) => [theta, psi])];
    expect(all).toHaveLength(28);
    const sum = (column: number) => all.reduce((total, row) => total + (row[column] ?? Number.NaN), 0);
    const sums = [4.083428152, -4374.317998803, -11.264762628, 0.014453389, -8.75e-7, 208761.4420611];
    for (const [column, expected] of sums.entries()) expect(sum(column)).toBeCloseTo(expected, 4);
    expect(crystals).toHaveLength(8);
    expect([small.length, large.length]).toEqual([21, 21]);
  });
});

describe.each(salts)('the freezing curve of %s', (salt) => {
  const eutectic = eutecticOf(salt);

  it('falls steadily with strength down to the eutectic', () => {
    const curve = between(0, eutectic.massFraction * 0.9999, 60).map((w) => freezingC(salt, w));
    for (const [index, tempC] of curve.entries()) {
      if (index > 0) expect(tempC).toBeLessThan(curve[index - 1] ?? Number.NaN);
    }
    expect(curve[0]).toBe(0);
  });

  it('comes back to the strength it started from', () => {
    for (const w of between(0.002, eutectic.massFraction * 0.9999, 25)) {
      expect(strengthAt(salt, freezingC(salt, w))).toBeCloseTo(w, 7);
    }
  });

  it('has ice below the eutectic strength and the hydrate above it, meeting at one temperature', () => {
    const under = freezingPoint([{ salt, massFraction: eutectic.massFraction - 1e-7 }]);
    const over = freezingPoint([{ salt, massFraction: eutectic.massFraction + 1e-7 }]);
    expect(under).toMatchObject({ ok: true, solid: 'ice' });
    expect(over).toMatchObject({ ok: true, solid: eutectic.solid });
    expect(under.ok && under.freezingPointC).toBeCloseTo(eutectic.tempC, 3);
    expect(over.ok && over.freezingPointC).toBeCloseTo(eutectic.tempC, 3);
  });

  it('rises steadily with strength beyond the eutectic: an over-strong brine freezes warmer', () => {
    const saturated = saturatedMassFractionAt(salt, 24);
    if (!saturated.ok) throw new Error(saturated.reason);
    const curve = between(eutectic.massFraction + 1e-5, saturated.massFraction, 40).map((w) => freezingC(salt, w));
    // MgCl2·12H2O melts congruently at 30.6 %: past that the curve dips a quarter of a degree before the octahydrate.
    const dipC = salt === 'MgCl2' ? 0.3 : 0;
    for (const [index, tempC] of curve.entries()) {
      if (index > 0) expect(tempC).toBeGreaterThan((curve[index - 1] ?? Number.NaN) - dipC);
    }
    expect(curve.at(-1)).toBeCloseTo(24, 3);
  });

  it('refuses below the eutectic and above freezing, naming the limit', () => {
    expect(massFractionAt(salt, eutectic.tempC - 0.001)).toEqual({
      ok: false,
      reason: 'below-eutectic',
      limitC: eutectic.tempC,
    });
    expect(massFractionAt(salt, 0.001)).toEqual({ ok: false, reason: 'above-freezing', limitC: 0 });
    expect(massFractionAt(salt, 0)).toEqual({ ok: true, massFraction: 0 });
    expect(massFractionAt(salt, eutectic.tempC).ok).toBe(true);
  });

  it('refuses what is saturated at 25 °C already, and names the strength that is not', () => {
    const refused = freezingPoint([{ salt, massFraction: 0.7 }]);
    expect(refused).toMatchObject({ ok: false, reason: 'above-saturation', limitC: 25 });
    if (refused.ok || refused.reason !== 'above-saturation') throw new Error('not refused');
    expect(freezingC(salt, refused.limitMassFraction - 1e-6)).toBeGreaterThan(23);
  });

  it('is what the blend rule gives for a blend of one', () => {
    for (const w of between(0.01, eutectic.massFraction * 0.999, 7)) {
      const blend = zdanovskiiFreezingPoint([{ salt, massFraction: w }]);
      expect(blend.ok && blend.freezingPointC).toBeCloseTo(freezingC(salt, w), 5);
    }
  });

  it('has a density that rises with strength and comes back through the hydrometer', () => {
    for (const w of between(0.005, 0.25, 10)) {
      const read = massFractionFromSpecificGravity(salt, specificGravity60F(salt, w), 15.56);
      expect(read.ok && read.massFraction).toBeCloseTo(w, 6);
    }
  });
});

describe('compositions', () => {
  it('are the same when a salt is split in two or the order is turned', () => {
    const whole = freezingPoint([
      { salt: 'NaCl', massFraction: 0.1 },
      { salt: 'CaCl2', massFraction: 0.05 },
    ]);
    const split = freezingPoint([
      { salt: 'CaCl2', massFraction: 0.05 },
      { salt: 'NaCl', massFraction: 0.04 },
      { salt: 'NaCl', massFraction: 0.06 },
    ]);
    expect(split.ok && whole.ok && Math.abs(split.freezingPointC - whole.freezingPointC) < 1e-6).toBe(true);
  });

  it('freeze a blend colder with more of either salt', () => {
    const base = icePointC({ NaCl: 0.1, CaCl2: 0.1 }) ?? Number.NaN;
    for (const salt of salts) {
      const more = { NaCl: 0.1, CaCl2: 0.1, MgCl2: 0, KCl: 0 };
      more[salt] += 0.01;
      expect(icePointC(more)).toBeLessThan(base);
    }
  });

  it('report both the ice point and the warmer dihydrate of 23.3 % NaCl with a tenth of 32 % CaCl2', () => {
    const blend = mixBrines([
      { massKg: 0.9, solutes: [{ salt: 'NaCl', massFraction: 0.233 }] },
      { massKg: 0.1, solutes: [{ salt: 'CaCl2', massFraction: 0.32 }] },
    ]);
    const result = freezingPoint(blend);
    expect(result).toMatchObject({ ok: true, solid: 'NaCl·2H2O' });
    expect(result.ok && result.freezingPointC).toBeCloseTo(-15.509, 2);
    expect(result.ok && result.icePointC).toBeCloseTo(-23.436, 2);
  });

  it('are water when there is no salt, and a slip when there is no water', () => {
    expect(freezingPoint([])).toMatchObject({ ok: true, freezingPointC: 0, solid: 'ice' });
    expect(() => freezingPoint([{ salt: 'NaCl', massFraction: 1 }])).toThrow(RangeError);
    expect(() => freezingPoint([{ salt: 'NaCl', massFraction: -0.1 }])).toThrow(RangeError);
    expect(() => freezingPoint([{ salt: 'NaCl', massFraction: Number.NaN }])).toThrow(RangeError);
    expect(() => mixBrines([])).toThrow(RangeError);
  });

  it('convert between fraction of brine and salt per water both ways', () => {
    expect(massFractionToSaltPerWater(0.2)).toBeCloseTo(0.25, 12);
    expect(saltPerWaterToMassFraction(0.25)).toBeCloseTo(0.2, 12);
    expect(saltPerWaterToMassFraction(Infinity)).toBe(1);
    expect(
      saltPerWaterOf([
        { salt: 'NaCl', massFraction: 0.1 },
        { salt: 'KCl', massFraction: 0.1 },
      ]).NaCl,
    ).toBeCloseTo(0.125, 12);
  });
});

describe('density and readings', () => {
  it('gives water at 20 °C 998.2 kg/m³ and 10 % NaCl 1070.7', () => {
    expect(waterDensityKgPerM3(20)).toBeCloseTo(998.2, 1);
    const brine = brineDensityKgPerM3([{ salt: 'NaCl', massFraction: 0.1 }], 20);
    expect(brine.ok && brine.densityKgPerM3).toBeCloseTo(1070.7, 0);
  });

  it('goes on in a straight line in the cold without a step or a turn', () => {
    for (const [salt, massFraction, from] of [
      ['NaCl', 0.2, 5],
      ['CaCl2', 0.3, 25],
      ['MgCl2', 0.2, 25],
    ] as const) {
      const at = (tempC: number) => {
        const result = brineDensityKgPerM3([{ salt, massFraction }], tempC);
        return result.ok ? result.densityKgPerM3 : Number.NaN;
      };
      expect(at(from - 1e-6)).toBeCloseTo(at(from), 4);
      const coldest = Math.ceil(eutecticOf(salt).tempC);
      for (let tempC = coldest + 1; tempC < 30; tempC += 1) expect(at(tempC)).toBeLessThan(at(tempC - 1));
      expect(at(coldest) - at(coldest + 1)).toBeCloseTo(at(0) - at(1), 6);
    }
  });

  it('refuses below every eutectic and beyond what was measured', () => {
    expect(brineDensityKgPerM3([{ salt: 'NaCl', massFraction: 0.1 }], -30)).toMatchObject({
      ok: false,
      reason: 'below-eutectic',
    });
    expect(brineDensityKgPerM3([{ salt: 'NaCl', massFraction: 0.3 }], 20)).toMatchObject({
      ok: false,
      reason: 'above-saturation',
    });
    expect(brineDensityKgPerM3([], -1)).toEqual({ ok: false, reason: 'below-eutectic', limitC: 0 });
    expect(brineDensityKgPerM3([], 120)).toMatchObject({ ok: false, reason: 'above-model' });
  });

  it('reads SG 1.170 as 22.30 % NaCl at 60 °F, 1,170 kg/m³ as 21.53 % at 0 °C, and 22.3 % as 84.5 degrees salometer', () => {
    const warm = massFractionFromSpecificGravity('NaCl', 1.17, 15.56);
    const cold = massFractionFromSpecificGravity('NaCl', 1170 / 999.01, 0);
    expect(warm.ok && 100 * warm.massFraction).toBeCloseTo(22.3, 1);
    expect(cold.ok && 100 * cold.massFraction).toBeCloseTo(21.53, 1);
    expect(salometerDegrees(0.223)).toBeCloseTo(84.5, 1);
  });

  it('refuses a reading lighter than water or beyond saturation', () => {
    expect(massFractionFromSpecificGravity('NaCl', 0.9, 15)).toMatchObject({ ok: false, reason: 'below-water' });
    expect(massFractionFromSpecificGravity('NaCl', 1.4, 15)).toMatchObject({ ok: false, reason: 'above-saturation' });
    expect(massFractionFromSpecificGravity('NaCl', 1.1, -25)).toMatchObject({ ok: false, reason: 'below-eutectic' });
  });
});

describe('melting and holding', () => {
  it('melts 8.528 kg of ice per kg of NaCl at −7 °C and holds 0.5 kg/m² at −8 °C with 66.3 g/m²', () => {
    const melt = iceMeltedPerKgSalt('NaCl', -7);
    const hold = saltToHold('NaCl', 500, -8);
    expect(melt.ok && melt.iceKgPerKgSalt).toBeCloseTo(8.528, 3);
    expect(hold.ok && hold.saltGPerM2).toBeCloseTo(66.31, 1);
  });

  it('holds the same water with the rate that water refreezes at', () => {
    const hold = saltToHold('MgCl2', 320, -9);
    const film = hold.ok ? filmAtRefreeze('MgCl2', hold.saltGPerM2, -9) : hold;
    expect(film.ok && film.waterGPerM2).toBeCloseTo(320, 9);
    expect(filmAtRefreeze('NaCl', 0, 0)).toEqual({ ok: true, waterGPerM2: 0 });
  });

  it('needs 518.5 g/m² of 23 % brine for that, and refuses a brine that would freeze itself', () => {
    const brine = brineToHold({ salt: 'NaCl', massFraction: 0.23 }, 500, -8);
    expect(brine.ok && brine.brineGPerM2).toBeCloseTo(518.5, 0);
    expect(brineToHold({ salt: 'NaCl', massFraction: 0.05 }, 500, -8)).toMatchObject({
      ok: false,
      reason: 'brine-too-weak',
    });
  });

  it('holds with a product what its one salt would, and with a blend of the same total something between', () => {
    const rate = (composition: Parameters<typeof productToHold>[0]['composition'], tempC = -8) => {
      const result = productToHold({ composition, waterMassFraction: 0.77 }, 500, tempC);
      return result.ok ? result.productGPerM2 : Number.NaN;
    };
    const brine = brineToHold({ salt: 'NaCl', massFraction: 0.23 }, 500, -8);
    expect(brine.ok && brine.brineGPerM2).toBeCloseTo(rate({ NaCl: 0.23 }), 3);
    const [salty, mixed, strong] = [rate({ NaCl: 0.23 }), rate({ NaCl: 0.13, MgCl2: 0.1 }), rate({ MgCl2: 0.23 })];
    expect(mixed).toBeLessThan(salty);
    expect(mixed).toBeGreaterThan(strong);
    expect(productToHold({ composition: { NaCl: 0.05 }, waterMassFraction: 0.95 }, 500, -8)).toEqual({
      ok: false,
      reason: 'product-too-weak',
    });
    expect(productToHold({ composition: { NaCl: 0.97 }, waterMassFraction: 0 }, 500, -22)).toMatchObject({
      ok: false,
      reason: 'below-eutectic',
    });
    expect(productToHold({ composition: {}, waterMassFraction: 0 }, 500, -2)).toMatchObject({
      reason: 'below-eutectic',
      limitC: 0,
    });
  });

  it('makes diluting and strengthening undo each other, and refuses the wrong way round', () => {
    const water = waterToDiluteKg({ massKg: 1000, fromMassFraction: 0.25, toMassFraction: 0.2 });
    expect(water).toBeCloseTo(250, 9);
    const salt = saltToStrengthenKg({ massKg: 1000, fromMassFraction: 0.2, toMassFraction: 0.233 });
    expect((200 + salt) / (1000 + salt)).toBeCloseTo(0.233, 12);
    expect(() => waterToDiluteKg({ massKg: 1, fromMassFraction: 0.2, toMassFraction: 0.3 })).toThrow(RangeError);
    expect(() => saltToStrengthenKg({ massKg: 1, fromMassFraction: 0.3, toMassFraction: 0.2 })).toThrow(RangeError);
    expect(prewetByMass({ rateGPerM2: 18, solidMassFraction: 0.7, brineMassFraction: 0.23 }).saltGPerM2).toBeCloseTo(
      13.842,
      9,
    );
  });
});

describe('numerics', () => {
  it('joins the two series of J(x) at x = 1 and refuses x at or below 0', () => {
    expect(harvieJ(1 - 1e-9).j).toBeCloseTo(harvieJ(1 + 1e-9).j, 8);
    expect(harvieJ(1 - 1e-9).xJPrime).toBeCloseTo(harvieJ(1 + 1e-9).xJPrime, 7);
    const h = 1e-5;
    expect((2 * (harvieJ(2 + h).j - harvieJ(2 - h).j)) / (2 * h)).toBeCloseTo(harvieJ(2).xJPrime, 6);
    expect(() => harvieJ(0)).toThrow(RangeError);
  });

  it('refuses a bracket without a change of sign', () => {
    expect(() => bisect((x) => x * x + 1, [-1, 1], 1e-9)).toThrow(RangeError);
    expect(bisect((x) => x - 0.3, [0, 1], 1e-12)).toBeCloseTo(0.3, 10);
  });
});
