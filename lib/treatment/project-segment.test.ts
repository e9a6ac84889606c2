import { describe, expect, it } from 'vitest';
import { plainFilm, type Film } from '../road/film';
import { filmParametersFor } from '../road/parameters';
import { DRY_MM } from '../road/partition';
import { type PrecipitationType } from '../road/precipitation';
import { holdMin, projectSegment, slackMin, type TimedPass } from './project-segment';

const parameters = { ...filmParametersFor('asphalt'), textureMm: Infinity };
const promise = { kind: 'bare', looseBrineShare: 0.1 } as const;
const salted = (waterMm: number, NaCl: number): Film => ({
  ...plainFilm({ liquidMm: waterMm }),
  dissolved: { NaCl, CaCl2: 0, MgCl2: 0, KCl: 0 },
});

function falling(steps: number, given: { stepMin: number; tempC: number; mmPerH: number; type: PrecipitationType }) {
  return {
    stepMin: given.stepMin,
    tempsC: new Float64Array(steps).fill(given.tempC),
    precipitationMm: new Float64Array(steps).fill((given.mmPerH * given.stepMin) / 60),
    precipitationTypes: Array.from({ length: steps }, () => given.type),
  };
}

/** shared reference practice/check-values.csv, V042 to V044: `S (1 − w)/w`, no losses, ±2 %. */
const dilution = [
  { id: 'V042', saltGPerM2: 15.4, tempC: -5, filmGPerM2: 0, mmPerH: 0.5, refreezesGPerM2: 179.9, minutes: 21.6 },
  { id: 'V043', saltGPerM2: 7.7, tempC: -3, filmGPerM2: 50, mmPerH: 1, refreezesGPerM2: 148.7, minutes: 5.9 },
  { id: 'V044', saltGPerM2: 25, tempC: -8, filmGPerM2: 20, mmPerH: 2, refreezesGPerM2: 187.3, minutes: 5.0 },
];

describe('a road through time', () => {
  it.each(dilution)(
    '$id: $saltGPerM2 g/m² NaCl at $tempC °C refreeze at $refreezesGPerM2 g/m², after $minutes min',
    ({ saltGPerM2, tempC, filmGPerM2, mmPerH, refreezesGPerM2, minutes }) => {
      const weather = falling(1000, { stepMin: 0.05, tempC, mmPerH, type: 'freezing-rain' });
      const film = salted(filmGPerM2 / 1000, saltGPerM2);
      const result = projectSegment({ film, weather, passes: [], parameters, vehiclesPerH: 0, promise });
      const hold = holdMin(result, { index: 0, stepMin: 0.05 });
      if (hold === null) throw new Error('it never refreezes');
      // The expected minutes are printed to a tenth.
      expect(Math.abs(hold - minutes)).toBeLessThan(minutes * 0.02 + 0.1);
      const index = Math.round(hold / 0.05);
      const waterGPerM2 = (result.waterMm[index] ?? 0) * 1000;
      expect(Math.abs(waterGPerM2 - refreezesGPerM2) / refreezesGPerM2).toBeLessThan(0.02);
      expect(result.freezeMarginC[index - 5]).toBeGreaterThan(0);
      expect(result.freezeMarginC[index + 5]).toBeLessThan(0);
    },
  );

  const snowfall = falling(60, { stepMin: 10, tempC: -4, mmPerH: 0.6, type: 'snow' });
  const project = (passes: readonly TimedPass[], film: Film = plainFilm()) =>
    projectSegment({ film, weather: snowfall, passes, parameters, vehiclesPerH: 100, promise });
  const pass = (index: number, rateGPerM2: number): TimedPass => ({
    index,
    isPloughed: true,
    product: { composition: { NaCl: 0.97 }, waterMassFraction: 0.02, dissolveMin: 15 },
    rateGPerM2,
    scatter: 0.3,
  });

  it('more salt never shortens the hold', () => {
    const holds = [0, 5, 10, 20, 40, 80, 160].map(
      (rate) => holdMin(project([pass(0, rate)]), { index: 0, stepMin: 10 }) ?? Infinity,
    );
    expect(holds[0]).toBeLessThan(holds[6] ?? 0);
    holds.forEach((hold, index) => expect(hold).toBeGreaterThanOrEqual(holds[index - 1] ?? 0));
  });

  it('shares lie from 0 to 1, water is never negative, and margin and share agree on ice', () => {
    const result = project([pass(0, 20), pass(18, 30), pass(40, 25)]);
    expect(result.knownUntil).toBe(60);
    for (let index = 0; index < 60; index += 1) {
      const phi = result.phi[index] ?? NaN;
      expect(phi).toBeGreaterThanOrEqual(0);
      expect(phi).toBeLessThanOrEqual(1);
      expect(result.waterMm[index]).toBeGreaterThanOrEqual(0);
      const isWet = (result.waterMm[index] ?? 0) >= DRY_MM;
      if (isWet && (result.freezeMarginC[index] ?? 0) < -0.1) expect(phi).toBeLessThan(1);
    }
  });

  it('a plough brings the water down to 0.3 mm and the pass lengthens the hold', () => {
    const index = 30;
    expect(project([]).waterMm[index]).toBeCloseTo(3, 5);
    const ploughed = project([pass(index, 30)]);
    expect(ploughed.waterMm[index]).toBeCloseTo(0.3, 2);
    expect(holdMin(ploughed, { index, stepMin: 10, graceMin: 20 })).toBeGreaterThan(60);
    expect(holdMin(project([]), { index, stepMin: 10 })).toBe(0);
  });

  it('entries from the first unknown temperature on are unknown, not zero', () => {
    const tempsC = Float64Array.from(snowfall.tempsC, (temp, index) => (index < 12 ? temp : NaN));
    const weather = { ...snowfall, tempsC };
    const result = projectSegment({ film: plainFilm(), weather, passes: [], parameters, vehiclesPerH: 0, promise });
    expect(result.knownUntil).toBe(12);
    expect(result.freezeMarginC[12]).toBeNaN();
    expect(result.isKept[12]).toBe(0);
  });

  it('a road begins where its temperature is first known', () => {
    const tempsC = Float64Array.from(snowfall.tempsC, (temp, index) => (index < 12 ? NaN : temp));
    const weather = { ...snowfall, tempsC };
    const result = projectSegment({ film: plainFilm(), weather, passes: [], parameters, vehiclesPerH: 0, promise });
    expect([result.knownFrom, result.knownUntil]).toEqual([12, 60]);
    expect(result.phi[11]).toBeNaN();
    expect(result.waterMm[14]).toBeCloseTo(0.2, 6);
  });

  it('hands back the film before the pass at an entry, and leaves the one given alone', () => {
    const film = salted(0.1, 5);
    const input = { film, weather: snowfall, passes: [pass(6, 30)], parameters, vehiclesPerH: 0, promise };
    const { filmAt } = projectSegment({ ...input, filmAtIndex: 6 });
    expect((filmAt?.liquidMm ?? 0) + (filmAt?.frozenMm ?? 0)).toBeCloseTo(0.7, 9);
    expect(filmAt?.dissolved.NaCl).toBeCloseTo(5, 9);
    expect(film).toEqual(salted(0.1, 5));
  });

  it('slack is hold minus the time to the next pass, and open while the hold is', () => {
    expect(slackMin(35, 30)).toBe(5);
    expect(slackMin(20, 45)).toBe(-25);
    expect(slackMin(null, 45)).toBeNull();
  });
});
