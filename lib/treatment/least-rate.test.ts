import { describe, expect, it } from 'vitest';
import { plainFilm, type Film } from '../road/film';
import { filmParametersFor } from '../road/parameters';
import { type PrecipitationType } from '../road/precipitation';
import { gPerM2ToLbPerLaneMile } from '../units/convert';
import { fastLiquidus } from '../brine/fast';
import { defaultMaterials } from './default-materials';
import { leastRate, type LeastRateInput } from './least-rate';
import { type Material } from './materials';
import { defaultPolicy, type Policy } from './policy';
import { looseFactor } from './promise';
import { projectSegment } from './project-segment';
import { type RoadWeather } from './weather';

const named = (id: string): Material => {
  const material = defaultMaterials.find((candidate) => candidate.id === id);
  if (!material) throw new Error(`no ${id}`);
  return material;
};
const pureSalt: Material = {
  ...named('rock-salt'),
  composition: { NaCl: 1 },
  waterMassFraction: 0,
  practicalMinimumC: null,
};
const open = { liquid: 5000, prewet: 5000, solid: 5000 };
const none = { liquid: 0, prewet: 0, solid: 0 };
const policy: Policy = {
  ...defaultPolicy,
  scatter: { liquid: 0.05, prewet: 0.15, solid: 0.2 },
  maxRateGPerM2: open,
  minRateGPerM2: none,
};
const still = { ...filmParametersFor('asphalt'), textureMm: Infinity };

function weather(steps: number, tempC: number, fall: { mm?: number; type?: PrecipitationType } = {}): RoadWeather {
  const { mm = 0, type = 'none' } = fall;
  return {
    stepMin: 10,
    tempsC: Array.from({ length: steps }, () => tempC),
    precipitationMm: Array.from({ length: steps }, () => mm),
    precipitationTypes: Array.from({ length: steps }, () => type),
  };
}

const snow = (mm: number): Film => ({ ...plainFilm({ frozenMm: mm }), fellAsSnowMm: mm, sinceSnowMin: 0 });

const base: LeastRateInput = {
  film: plainFilm({ liquidMm: 0.18 }),
  weather: weather(20, -6.2),
  untilMin: 120,
  promise: 'bare',
  material: pureSalt,
  policy,
  parameters: still,
};

/** shared reference treatment.md, section 5: NaCl, 20 % scatter, no residue; lb per 12-ft lane-mile. */
const table = [
  { tempC: (31 - 32) / 1.8, loose: 15, thin: 15 },
  { tempC: -2.5, loose: 73, thin: 70 },
  { tempC: (22.5 - 32) / 1.8, loose: 211, thin: 146 },
  { tempC: (17.5 - 32) / 1.8, loose: 445, thin: 218 },
  { tempC: (12.5 - 32) / 1.8, loose: 762, thin: 284 },
];

describe('the least rate', () => {
  it.each(table)('at $tempC °C 0.1 mm of water needs $thin lb per lane-mile for no ice', ({ tempC, thin }) => {
    const answer = leastRate({ ...base, film: plainFilm({ liquidMm: 0.1 }), weather: weather(20, tempC) });
    if (!answer.ok) throw new Error(answer.reason);
    // Whole pounds and a tenth of a degree in the table: ±0.5 lb and ±0.05 °C.
    expect(Math.abs(gPerM2ToLbPerLaneMile(answer.rateGPerM2) - thin)).toBeLessThan(0.5 + thin * 0.02);
  });

  it.each(table)('at $tempC °C 1 mm of snow needs $loose lb per lane-mile to stay loose', ({ tempC, loose }) => {
    const answer = leastRate({ ...base, film: snow(1), weather: weather(9, tempC, { mm: 0 }), untilMin: 40 });
    if (!answer.ok) throw new Error(answer.reason);
    // The table's prototype leaves the salt out of the mass whose share is asked for: (1 − w φ) between the two.
    const perWater = fastLiquidus('NaCl').saltPerWaterAt(tempC);
    const strength = perWater / (1 + perWater);
    const asTable = gPerM2ToLbPerLaneMile(answer.rateGPerM2) * (1 - strength * 0.1 * looseFactor(tempC));
    expect(Math.abs(asTable - loose)).toBeLessThan(0.5 + loose * 0.02);
  });

  it('a rate found is enough and 2 % less is not, under snow, traffic and drainage', () => {
    const input = {
      ...base,
      film: plainFilm(),
      weather: weather(20, -5, { mm: 0.15, type: 'snow' as const }),
      parameters: filmParametersFor('asphalt'),
      vehiclesPerH: 250,
    };
    const answer = leastRate(input);
    if (!answer.ok) throw new Error(answer.reason);
    expect(answer.lossFraction).toBeGreaterThan(0.2);
    const keeps = (rateGPerM2: number) => {
      const { isKept } = projectSegment({
        ...input,
        vehiclesPerH: 250,
        promise: { kind: 'bare', looseBrineShare: 0.1 },
        passes: [{ index: 0, isPloughed: false, rateGPerM2, scatter: 0.2, product: { ...pureSalt, dissolveMin: 0 } }],
      });
      return isKept.slice(2, 15).every((kept) => kept === 1);
    };
    expect(keeps(answer.rateGPerM2 * 1.005)).toBe(true);
    expect(keeps(answer.rateGPerM2 * 0.98)).toBe(false);
  });

  it('an earlier treatment is taken off the rate, and enough of it makes a rate needless', () => {
    const salted = (NaCl: number) => ({ ...base.film, dissolved: { NaCl, CaCl2: 0, MgCl2: 0, KCl: 0 } });
    const fresh = leastRate(base);
    const after = leastRate({ ...base, film: salted(8) });
    if (!fresh.ok || !after.ok) throw new Error('no rate');
    expect(fresh.rateGPerM2 - after.rateGPerM2).toBeCloseTo(8 / 0.8, 1);
    expect(leastRate({ ...base, film: salted(40) })).toEqual({ ok: false, reason: 'not-needed' });
  });

  it('a rate over the limit is refused with what it would take, never cut', () => {
    const free = leastRate(base);
    if (!free.ok) throw new Error(free.reason);
    const tight = { ...policy, maxRateGPerM2: { ...open, solid: 20 } };
    expect(leastRate({ ...base, policy: tight })).toEqual({
      ok: false,
      reason: 'over-policy-limit',
      limit: 20,
      neededRateGPerM2: free.rateGPerM2,
    });
    expect(leastRate({ ...base, spreaderMaxGPerM2: 15 })).toMatchObject({ reason: 'over-spreader-limit', limit: 15 });
  });

  it('a rate below the spreader’s least dose is raised to it and says what physics asked for', () => {
    const answer = leastRate({ ...base, policy: { ...policy, minRateGPerM2: { ...none, solid: 50 } } });
    expect(answer).toMatchObject({ ok: true, rateGPerM2: 50 });
    expect(answer.ok && answer.leastGPerM2).toBeLessThan(50);
  });

  it('0.5 mm of ice cannot melt in the 20 min of work-in at 120 W/m², whatever is spread', () => {
    const icy = { ...base, film: plainFilm({ frozenMm: 0.5 }), weather: weather(20, -3) };
    expect(leastRate(icy)).toEqual({ ok: false, reason: 'not-in-time' });
  });

  it('a brine is given in mL/m² too, by its density', () => {
    const brine = leastRate({ ...base, material: named('salt-brine'), weather: weather(20, -3) });
    if (!brine.ok || brine.rateMLPerM2 === null) throw new Error('no rate');
    expect(brine.rateGPerM2 / brine.rateMLPerM2).toBeCloseTo(1.178, 9);
  });

  it('more water, more cold and a longer wait never lower the rate', () => {
    const rate = (change: Partial<LeastRateInput>) => {
      const snowing = { film: plainFilm(), weather: weather(40, -4, { mm: 0.02, type: 'snow' as const }) };
      const answer = leastRate({ ...base, ...snowing, ...change });
      return answer.ok ? answer.rateGPerM2 : answer.reason;
    };
    const first = rate({});
    expect(first).toBeGreaterThan(1);
    expect(rate({ film: snow(0.3) })).toBeGreaterThan(Number(first));
    expect(rate({ weather: weather(40, -7, { mm: 0.02, type: 'snow' }) })).toBeGreaterThan(Number(first));
    expect(rate({ untilMin: 240 })).toBeGreaterThan(Number(first));
  });
});

describe('the rules that forbid', () => {
  const brine = named('salt-brine');
  const raining = (type: PrecipitationType, tempC: number): RoadWeather => {
    const all = weather(20, tempC, { mm: 0.05, type });
    // It has to be needed at all: the road freezes towards the end.
    return { ...all, tempsC: Array.from(all.tempsC, (temp, index) => (index > 10 ? -4 : temp)) };
  };

  it('no liquid before rain, in freezing rain or on bonded ice', () => {
    const rainThenCold = raining('rain', 1);
    const turned = {
      ...rainThenCold,
      precipitationTypes: Array.from({ length: 20 }, (_, i) => (i < 5 ? 'rain' : 'none') as PrecipitationType),
    };
    expect(leastRate({ ...base, material: brine, weather: turned })).toMatchObject({ reason: 'liquid-before-rain' });
    expect(leastRate({ ...base, material: brine, weather: raining('freezing-drizzle', -1) })).toMatchObject({
      reason: 'liquid-in-freezing-rain',
    });
    const bonded = { ...base.film, isBonded: true };
    expect(leastRate({ ...base, material: brine, film: bonded })).toMatchObject({ reason: 'liquid-on-bonded' });
  });

  it('no rock salt below −9.4 °C, none at all below −21.2 °C, and CaCl2 still at −25 °C', () => {
    const at = (material: Material, tempC: number) => leastRate({ ...base, material, weather: weather(20, tempC) });
    expect(at(named('rock-salt'), -12)).toMatchObject({ reason: 'below-practical-limit', limit: -9.4 });
    const eutectic = at(named('rock-salt'), -25);
    expect(eutectic).toMatchObject({ reason: 'below-eutectic' });
    expect(!eutectic.ok && eutectic.limit).toBeCloseTo(-21.2, 0);
    expect(at(named('calcium-brine'), -25)).toMatchObject({ ok: true });
  });

  it('nothing chemical on a cold dry road in blowing snow; sand melts nothing', () => {
    const dry = { ...base, film: plainFilm(), weather: weather(20, -12, { mm: 0.05, type: 'snow' }), windMPerS: 9 };
    expect(leastRate({ ...dry, material: named('calcium-brine') })).toMatchObject({ reason: 'dry-cold-blowing' });
    expect(leastRate({ ...base, material: named('sand') })).toMatchObject({ reason: 'melts-nothing' });
  });

  it('a brine weaker than the road would have to be is no answer', () => {
    const weak: Material = { ...brine, composition: { NaCl: 0.05 }, waterMassFraction: 0.95 };
    expect(leastRate({ ...base, material: weak })).toMatchObject({ reason: 'brine-too-weak' });
  });

  it('an unknown temperature within the time is a slip of the caller', () => {
    expect(() => leastRate({ ...base, weather: weather(20, NaN) })).toThrow(RangeError);
  });
});
