import { describe, expect, it } from 'vitest';
import { plainFilm, type Film } from '../road/film';
import { type PrecipitationType } from '../road/precipitation';
import { chooseTreatment, type ChoiceInput } from './choose-treatment';
import { defaultMaterials } from './default-materials';
import { chlorideShare, prewetMaterial } from './materials';
import { defaultPolicy } from './policy';

const snow = (mm: number): Film => ({ ...plainFilm({ frozenMm: mm }), fellMm: mm, fellAsSnowMm: mm, sinceSnowMin: 0 });

function under(tempC: number, mmPerH: number, type: PrecipitationType): ChoiceInput['weather'] {
  return {
    stepMin: 10,
    tempsC: Array.from({ length: 30 }, () => tempC),
    precipitationMm: Array.from({ length: 30 }, () => mmPerH / 6),
    precipitationTypes: Array.from({ length: 30 }, () => type),
  };
}

const base: ChoiceInput = {
  film: plainFilm(),
  weather: under(-3, 0.3, 'snow'),
  untilMin: 90,
  promise: 'bare',
  policy: defaultPolicy,
  materials: defaultMaterials,
  vehiclesPerH: 100,
};

describe('the treatment chosen', () => {
  it('light snow on a bare road: brine before it, with every material answered', () => {
    const treatment = chooseTreatment(base);
    expect(treatment).toMatchObject({ action: 'anti-ice', materialId: 'salt-brine', isPloughed: false });
    expect(treatment.rateMLPerM2).toBeGreaterThan(0);
    expect(treatment.options.map(({ materialId }) => materialId)).toEqual(defaultMaterials.map(({ id }) => id));
    expect(treatment.cautions).toEqual(expect.arrayContaining(['advice', 'pavement-not-air']));
  });

  it('warm and dry: nothing', () => {
    const treatment = chooseTreatment({ ...base, weather: under(3, 0, 'none') });
    expect(treatment).toMatchObject({ action: 'nothing', rateGPerM2: null });
    expect(treatment.options[0]?.answer).toEqual({ ok: false, reason: 'not-needed' });
  });

  it('4 mm of snow are ploughed first, and only what is left is salted', () => {
    const treatment = chooseTreatment({ ...base, film: snow(4) });
    expect(treatment.isPloughed).toBe(true);
    expect(treatment.water).toMatchObject({ nowMm: 4, afterPloughMm: 0.3 });
    expect(treatment.rateGPerM2).toBeLessThan(30);
  });

  it('freezing drizzle rules out liquids and says so', () => {
    const drizzle = chooseTreatment({ ...base, weather: under(-2, 0.1, 'freezing-drizzle') });
    expect(['pre-wet', 'solid']).toContain(drizzle.action);
    expect(drizzle.cautions).toContain('liquid-rain');
  });

  it('below the limit of all salts at hand: abrasives, with the reasons kept', () => {
    const salts = defaultMaterials.filter(({ id }) => !id.startsWith('calcium') && !id.startsWith('magnesium'));
    const cold = chooseTreatment({ ...base, materials: salts, film: snow(0.5), weather: under(-16, 0.2, 'snow') });
    expect(cold).toMatchObject({ action: 'abrasives', materialId: 'sand', rateGPerM2: 62 });
    expect(cold.cautions).toEqual(expect.arrayContaining(['below-limit', 'abrasive-dust']));
  });

  it('a rate over the limit becomes a shorter cycle that says how long it holds and what it would have taken', () => {
    const heavy = { ...base, promise: 'bare' as const, weather: under(-5, 1.5, 'snow'), untilMin: 150 };
    const treatment = chooseTreatment(heavy);
    expect(treatment.chosen).toBeNull();
    expect(treatment.shorterCycle?.holdMin).toBeGreaterThanOrEqual(45);
    expect(treatment.shorterCycle?.holdMin).toBeLessThan(150);
    expect(treatment.shorterCycle?.neededRateGPerM2).toBeGreaterThan(treatment.rateGPerM2 ?? Infinity);
    expect(treatment.cautions).toContain('shorter-cycle');
  });

  it('with nothing that can hold and no abrasives a person decides', () => {
    const salt = defaultMaterials.filter(({ id }) => id === 'rock-salt');
    const treatment = chooseTreatment({ ...base, materials: salt, weather: under(-16, 0.2, 'snow') });
    expect(treatment).toMatchObject({ action: 'undecided', rateGPerM2: null, materialId: null });
  });

  it('salt-sensitive ground gets the material with the least chloride', () => {
    const { options, materialId } = chooseTreatment({ ...base, isSensitive: true });
    const chosen = options.find((option) => option.materialId === materialId)?.chlorideGPerM2 ?? Infinity;
    for (const { chlorideGPerM2 } of options)
      if (chlorideGPerM2 !== null) expect(chosen).toBeLessThanOrEqual(chlorideGPerM2);
  });

  it('blowing snow on a cold dry road: no chemical', () => {
    const blowing = chooseTreatment({ ...base, weather: under(-12, 0.1, 'snow'), windMPerS: 10 });
    expect(blowing.action).toBe('nothing');
    expect(blowing.cautions).toContain('blowing-snow');
  });
});

describe('materials', () => {
  const part = (id: string) => {
    const found = defaultMaterials.find((material) => material.id === id);
    if (!found) throw new Error(id);
    return found;
  };

  it('70 % salt and 30 % brine of 23.3 % hold 0.7 × 0.97 + 0.3 × 0.233 of NaCl', () => {
    const mix = { id: 'x', name: 'x', solid: part('rock-salt'), liquid: part('salt-brine'), liquidMassFraction: 0.3 };
    expect(prewetMaterial(mix).composition.NaCl).toBeCloseTo(0.7489, 12);
    expect(() => prewetMaterial({ ...mix, liquidMassFraction: 1 })).toThrow(RangeError);
  });

  it('a kilogram of rock salt carries 0.588 kg of chloride', () => {
    expect(chlorideShare(part('rock-salt'))).toBeCloseTo(0.5884, 4);
  });
});
