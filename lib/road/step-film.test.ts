import { describe, expect, it } from 'vitest';
import { salts } from '../brine/salts';
import { noLoss, plainFilm, waterMmOf, type Film } from './film';
import { filmParametersFor } from './parameters';
import { brineShare, filmFreezingPointC, heldLiquidMm } from './partition';
import { passOver } from './pass';
import { type PrecipitationType } from './precipitation';
import { meltableMm, stepFilm } from './step-film';

const parameters = filmParametersFor('asphalt');
const still = { durationMin: 10, tempC: -5, precipitationMm: 0, precipitationType: 'none' as const, vehicles: 0 };
const withSalt = (film: Film, NaCl: number): Film => ({ ...film, dissolved: { ...film.dissolved, NaCl } });
const prewet = { composition: { NaCl: 0.7, CaCl2: 0.03 }, waterMassFraction: 0.25, dissolveMin: 5 };

describe('a step of the film', () => {
  it('conserves water and every salt to 1e-9 through snow, rain, salt, plough, thaw and traffic', () => {
    const types: PrecipitationType[] = ['snow', 'sleet', 'freezing-drizzle', 'none', 'rain', 'unknown'];
    const total = noLoss();
    let film = plainFilm({ liquidMm: 0.2 });
    let inMm = 0.2;
    const inSalt = { NaCl: 0, CaCl2: 0, MgCl2: 0, KCl: 0 };
    for (let index = 0; index < 200; index += 1) {
      const precipitationType = types[Math.floor(index / 9) % types.length] ?? 'none';
      const precipitationMm = precipitationType === 'none' ? 0 : 0.13 + 0.1 * Math.sin(index);
      const step = {
        durationMin: 10,
        tempC: 6 * Math.sin(index / 31) - 2,
        precipitationType,
        precipitationMm,
        vehicles: 40,
      };
      const after = stepFilm(film, step, parameters);
      film = after.film;
      inMm += precipitationMm;
      for (const key of ['drainedMm', 'sprayedMm', 'evaporatedMm'] as const) total[key] += after.lost[key];
      for (const salt of salts) total.salts[salt] += after.lost.salts[salt];
      if (index % 25 !== 24) continue;
      passOver(film, { isPloughed: true, product: prewet, rateGPerM2: 20, scatter: 0.15 }, 0.3, total);
      inMm += (20 * 0.85 * 0.25) / 1000;
      inSalt.NaCl += 20 * 0.85 * 0.7;
      inSalt.CaCl2 += 20 * 0.85 * 0.03;
    }
    const outMm = total.drainedMm + total.sprayedMm + total.ploughedMm;
    expect(outMm).toBeGreaterThan(1);
    expect(Math.abs(inMm - waterMmOf(film) - outMm)).toBeLessThan(1e-9);
    for (const salt of salts) {
      const left = film.dissolved[salt] + film.undissolved[salt] + total.salts[salt];
      expect(Math.abs(inSalt[salt] - left)).toBeLessThan(1e-9);
    }
  });

  it('freezes a plain wet road at −5 °C at once and thaws it at +2 °C no faster than 120 W/m² allow', () => {
    const frozen = stepFilm(plainFilm({ liquidMm: 0.4 }), still, parameters).film;
    expect(frozen.frozenMm).toBe(0.4);
    expect(brineShare(frozen)).toBe(0);
    const thawing = stepFilm(frozen, { ...still, tempC: 2 }, parameters).film;
    expect(meltableMm(120, 10)).toBeCloseTo(0.2156, 4);
    expect(thawing.liquidMm).toBeCloseTo(meltableMm(120, 10), 12);
  });

  it('15.4 g/m² NaCl at −5 °C keep 0.18 mm liquid and let the rest of 0.3 mm freeze', () => {
    const { film } = stepFilm(withSalt(plainFilm({ liquidMm: 0.3 }), 15.4), still, parameters);
    expect(film.liquidMm).toBeCloseTo(0.18, 2);
    expect(film.liquidMm).toBeCloseTo(heldLiquidMm(film.dissolved, -5), 12);
    expect(filmFreezingPointC(film)).toBeGreaterThan(-5);
  });

  it('dry grains dissolve with their time constant and only where there is water', () => {
    const spread = (waterMm: number) => {
      const film = plainFilm({ liquidMm: waterMm });
      const salt = { composition: { NaCl: 1 }, waterMassFraction: 0, dissolveMin: 15 };
      passOver(film, { isPloughed: false, product: salt, rateGPerM2: 10, scatter: 0 }, 0.3);
      return stepFilm(film, { ...still, durationMin: 15 }, parameters).film;
    };
    expect(spread(0.1).dissolved.NaCl).toBeCloseTo(10 * (1 - Math.exp(-1)), 9);
    expect(spread(0).undissolved.NaCl).toBe(10);
  });

  it('liquid above what the texture holds runs off with its salt at the same strength', () => {
    const before = withSalt(plainFilm({ liquidMm: 1 }), 50);
    const { film, lost } = stepFilm(before, { ...still, tempC: 1 }, parameters);
    expect(lost.drainedMm).toBeCloseTo(0.5 * (1 - Math.exp(-10 / 7.5)), 12);
    expect(film.dissolved.NaCl / film.liquidMm).toBeCloseTo(50, 9);
  });

  it('1,000 vehicles take a third of the brine off a wet road and a fiftieth off a dry one', () => {
    const wet = stepFilm(
      withSalt(plainFilm({ liquidMm: 0.3 }), 20),
      { ...still, tempC: 1, vehicles: 1000 },
      parameters,
    );
    expect(wet.lost.salts.NaCl / 20).toBeCloseTo(1 - Math.exp(-0.4), 9);
    const grains = { ...plainFilm(), undissolved: { NaCl: 20, CaCl2: 0, MgCl2: 0, KCl: 0 } };
    const dry = stepFilm(grains, { ...still, vehicles: 1000 }, parameters);
    expect(dry.lost.salts.NaCl / 20).toBeCloseTo(1 - Math.exp(-0.02), 9);
  });

  it('evaporation happens only where the parameters supply it', () => {
    const wet = plainFilm({ liquidMm: 0.3 });
    expect(stepFilm(wet, { ...still, tempC: 3 }, parameters).lost.evaporatedMm).toBe(0);
    const drying = { ...parameters, evaporationMm: () => 0.05 };
    expect(stepFilm(wet, { ...still, tempC: 3 }, drying).lost.evaporatedMm).toBe(0.05);
  });

  it('refuses a step of no time, negative rain and a temperature that is none', () => {
    expect(() => stepFilm(plainFilm(), { ...still, durationMin: 0 }, parameters)).toThrow(RangeError);
    expect(() => stepFilm(plainFilm(), { ...still, precipitationMm: -1 }, parameters)).toThrow(RangeError);
    expect(() => stepFilm(plainFilm(), { ...still, tempC: NaN }, parameters)).toThrow(RangeError);
    expect(() => plainFilm({ liquidMm: -0.1 })).toThrow(RangeError);
  });
});

describe('a pass', () => {
  const slush = (): Film => ({
    ...withSalt(plainFilm({ liquidMm: 0.5, frozenMm: 2.5 }), 6),
    fellMm: 3,
    fellAsSnowMm: 3,
  });
  const nothing = { product: null, rateGPerM2: 0, scatter: 0 };

  it('a plough leaves 0.3 mm with its share of the salt', () => {
    const film = slush();
    passOver(film, { ...nothing, isPloughed: true }, 0.3);
    expect(waterMmOf(film)).toBeCloseTo(0.3, 12);
    expect(film.dissolved.NaCl).toBeCloseTo(0.6, 12);
    expect(film.fellMm).toBe(0.3);
  });

  it('a plough leaves bonded ice and plain wet alone', () => {
    const bonded = { ...slush(), isBonded: true };
    passOver(bonded, { ...nothing, isPloughed: true }, 0.3);
    expect(waterMmOf(bonded)).toBe(3);
    const wet = plainFilm({ liquidMm: 2 });
    passOver(wet, { ...nothing, isPloughed: true }, 0.3);
    expect(wet.liquidMm).toBe(2);
  });

  it('a third scattered leaves two thirds on the lane; a negative rate is refused', () => {
    const film = plainFilm();
    passOver(film, { isPloughed: false, product: prewet, rateGPerM2: 30, scatter: 1 / 3 }, 0.3);
    expect(film.undissolved.NaCl).toBeCloseTo(14, 12);
    expect(film.liquidMm).toBeCloseTo(0.005, 12);
    const wrong = { isPloughed: false, product: prewet, rateGPerM2: -1, scatter: 0 };
    expect(() => passOver(film, wrong, 0.3)).toThrow(RangeError);
  });
});
