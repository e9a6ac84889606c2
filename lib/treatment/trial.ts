import { salts } from '../brine/salts';
import { copyFilm, waterMmOf, type Film, type SaltMasses } from '../road/film';
import { type FilmParameters } from '../road/parameters';
import { passOver } from '../road/pass';
import { brineShare, heldLiquidMm } from '../road/partition';
import { advanceFilm, settle } from '../road/step-film';
import { type Material, productOf, saltMassFraction } from './materials';
import { type PromiseKind, type Target, targetBrineShare, targetOf } from './promise';
import { type RoadWeather } from './weather';

/** One road, one pass over it at entry 0 of the weather, and what is to be held until when. */
export interface PassOverRoad {
  readonly film: Film;
  readonly weather: RoadWeather;
  readonly isPloughed: boolean;
  readonly parameters: FilmParameters;
  readonly vehiclesPerH: number;
  readonly promise: { kind: PromiseKind; looseBrineShare: number };
  /** entries of the weather that are judged, both included */
  readonly fromIndex: number;
  readonly untilIndex: number;
}

export interface JudgedStep {
  index: number;
  tempC: number;
  waterMm: number;
  /** g/m² of each salt, grains counted as dissolved */
  masses: SaltMasses;
  phi: number;
  target: Target;
  targetPhi: number;
}

// Fields one by one: spreading objects here took half the time of a whole plan.
function judge(film: Film, at: { index: number; tempC: number }, promise: PassOverRoad['promise']): JudgedStep {
  const { index, tempC } = at;
  const { NaCl, CaCl2, MgCl2, KCl } = film.dissolved;
  const target = targetOf(film);
  return {
    index,
    tempC,
    waterMm: waterMmOf(film),
    masses: { NaCl, CaCl2, MgCl2, KCl },
    phi: brineShare(film),
    target,
    targetPhi: targetBrineShare(promise, film, tempC),
  };
}

/**
 * The judged steps of a pass that spreads `rateGPerM2` of a material. Its grains count as dissolved at once: a rate is
 * not raised to beat the time grains need, which the policy's work-in time allows for.
 */
export function tryRate(road: PassOverRoad, spread: Spread): JudgedStep[] {
  const { weather, parameters } = road;
  const film = copyFilm(road.film);
  for (const salt of salts) {
    film.dissolved[salt] += film.undissolved[salt];
    film.undissolved[salt] = 0;
  }
  const first = weather.tempsC[0] ?? NaN;
  settle(film, { tempC: first, durationMin: Infinity }, parameters);
  const product = spread.material ? { ...productOf(spread.material), dissolveMin: 0 } : null;
  passOver(film, { ...spread, product, isPloughed: road.isPloughed }, parameters.ploughResidualMm);
  const steps: JudgedStep[] = [];
  const context = { parameters, loss: null };
  const vehicles = (road.vehiclesPerH * weather.stepMin) / 60;
  for (let index = 0; index <= road.untilIndex; index += 1) {
    const tempC = weather.tempsC[index] ?? NaN;
    if (index > 0) {
      const step = {
        durationMin: weather.stepMin,
        tempC,
        precipitationMm: weather.precipitationMm[index] ?? 0,
        precipitationType: weather.precipitationTypes[index] ?? ('none' as const),
        vehicles,
      };
      advanceFilm(film, step, context);
    }
    if (index >= road.fromIndex) steps.push(judge(film, { index, tempC }, road.promise));
  }
  return steps;
}

export interface Spread {
  material: Material | null;
  rateGPerM2: number;
  scatter: number;
}

/** Room for rounding, in brine share. */
const TOLERANCE = 1e-3;

export function isKeptThrough(steps: readonly JudgedStep[]): boolean {
  return steps.every(({ phi, targetPhi, waterMm }) => waterMm < 0.02 || phi >= targetPhi - TOLERANCE);
}

/** Index of the first step at which the promise is broken, or null. */
export function firstBroken(steps: readonly JudgedStep[]): number | null {
  const broken = steps.find(({ phi, targetPhi, waterMm }) => waterMm >= 0.02 && phi < targetPhi - TOLERANCE);
  return broken?.index ?? null;
}

/** kg/m² of liquid that 1 g/m² of a product holds at a temperature, its own water left out. */
function heldPerGram(material: Material, tempC: number): number {
  const { NaCl = 0, CaCl2 = 0, MgCl2 = 0, KCl = 0 } = material.composition;
  return heldLiquidMm({ NaCl, CaCl2, MgCl2, KCl }, tempC);
}

export interface Need {
  step: JudgedStep;
  /** g/m² to leave the spreader; Infinity when no amount is enough */
  rateGPerM2: number;
  /** part of what left the spreader that is still there */
  remains: number;
}

/**
 * What one step asks for in closed form: the smallest rate with
 * `held liquid + salts ≥ φ (water + salts)`, given the part of the salt still there. Linear in the rate.
 */
export function needAt(step: JudgedStep, without: SaltMasses, spread: Spread & { material: Material }): Need {
  const { material, rateGPerM2: triedGPerM2, scatter } = spread;
  const saltShare = saltMassFraction(material);
  const lasting = salts.reduce((sum, salt) => sum + step.masses[salt] - without[salt], 0);
  const landedSalt = triedGPerM2 * saltShare;
  const remains = landedSalt > 0 ? Math.min(1 - scatter, Math.max(0, lasting / landedSalt)) : 1 - scatter;
  if (step.tempC >= 0) return { step, rateGPerM2: 0, remains };
  const restMm = step.waterMm - (triedGPerM2 * remains * material.waterMassFraction) / 1000;
  const restSaltKg = salts.reduce((sum, salt) => sum + without[salt], 0) / 1000;
  const lacking = step.targetPhi * (restMm + restSaltKg) - heldLiquidMm(without, step.tempC) - restSaltKg;
  if (lacking <= 0 || restMm < 0.02) return { step, rateGPerM2: 0, remains };
  const perGram =
    heldPerGram(material, step.tempC) +
    saltShare / 1000 -
    (step.targetPhi * (material.waterMassFraction + saltShare)) / 1000;
  return { step, rateGPerM2: perGram > 0 ? lacking / (perGram * remains) : Infinity, remains };
}
