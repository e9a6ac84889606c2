import { copyFilm, waterMmOf, type Film } from '../road/film';
import { type FilmParameters } from '../road/parameters';
import { passOver, type Pass } from '../road/pass';
import { brineShare, filmFreezingPointC, filmMassFraction } from '../road/partition';
import { advanceFilm, settle } from '../road/step-film';
import { type PromiseKind, targetBrineShare } from './promise';
import { type RoadWeather } from './weather';

/** A pass at a step of the series. */
export interface TimedPass extends Pass {
  index: number;
}

export interface ProjectionInput {
  /** what lies there at entry 0, before a pass at 0; left as it is */
  film: Film;
  weather: RoadWeather;
  /** in order of index */
  passes: readonly TimedPass[];
  parameters: FilmParameters;
  vehiclesPerH: number;
  promise: { kind: PromiseKind; looseBrineShare: number };
  /** hands back the film at this entry, before a pass there */
  filmAtIndex?: number;
}

/**
 * One road through time, an entry a step, from `knownFrom` up to and without `knownUntil`. Before the first known
 * pavement temperature (NaN in `tempsC` means unknown), and from the first gap after it on, entries are NaN and `isKept`
 * 0: unknown, not zero.
 */
export interface Projection {
  /**
   * Pavement temperature minus the freezing point of what lies there, °C; below 0 there is or will be ice. On a dry
   * road (`waterMm` below `DRY_MM`) it is the pavement temperature: what a first drop of water would meet.
   */
  freezeMarginC: Float32Array;
  /** share of what lies there that is brine, 0 to 1; 1 on a dry road */
  phi: Float32Array;
  waterMm: Float32Array;
  /** strength of what lies there taken as one brine, 0 to 1 */
  brineMassFraction: Float32Array;
  /** brine share that the promise asks for */
  targetPhi: Float32Array;
  /** 1 while the promise is kept */
  isKept: Uint8Array;
  knownFrom: number;
  knownUntil: number;
  filmAt: Film | null;
}

/** Room for rounding when a share is held against its target. */
const SLACK = 1e-4;

function emptyProjection(count: number): Projection {
  const unknown = () => new Float32Array(count).fill(NaN);
  return {
    freezeMarginC: unknown(),
    phi: unknown(),
    waterMm: unknown(),
    brineMassFraction: unknown(),
    targetPhi: unknown(),
    isKept: new Uint8Array(count),
    knownFrom: 0,
    knownUntil: 0,
    filmAt: null,
  };
}

function note(into: Projection, index: number, { film, tempC, promise }: Noted): void {
  const phi = brineShare(film);
  const target = targetBrineShare(promise, film, tempC);
  into.freezeMarginC[index] = tempC - filmFreezingPointC(film);
  into.phi[index] = phi;
  into.waterMm[index] = waterMmOf(film);
  into.brineMassFraction[index] = filmMassFraction(film);
  into.targetPhi[index] = target;
  into.isKept[index] = phi >= target - SLACK ? 1 : 0;
}

interface Noted {
  film: Film;
  tempC: number;
  promise: ProjectionInput['promise'];
}

/**
 * What becomes of a road: its film from entry 0 through the weather and the passes. The same stepping as behind every
 * rate, so that map, hold and rate cannot disagree. About 0.2 µs of work per salt, road and step.
 */
export function projectSegment(input: ProjectionInput): Projection {
  const { weather, passes, parameters, promise } = input;
  const { stepMin, tempsC, precipitationMm, precipitationTypes } = weather;
  const count = tempsC.length;
  const result = emptyProjection(count);
  const film = copyFilm(input.film);
  const vehicles = (input.vehiclesPerH * stepMin) / 60;
  const context = { parameters, loss: null };
  const step = { durationMin: stepMin, tempC: 0, precipitationMm: 0, precipitationType: 'none' as const, vehicles };
  let nextPass = 0;
  for (let index = 0; index < count; index += 1) {
    const tempC = tempsC[index] ?? NaN;
    if (Number.isNaN(tempC)) {
      if (result.knownUntil > 0) break;
      result.knownFrom = index + 1;
      continue;
    }
    if (index === result.knownFrom) settle(film, { tempC, durationMin: Infinity }, parameters);
    else {
      const precipitationType = precipitationTypes[index] ?? 'none';
      advanceFilm(film, { ...step, tempC, precipitationMm: precipitationMm[index] ?? 0, precipitationType }, context);
    }
    if (index === input.filmAtIndex) result.filmAt = copyFilm(film);
    for (let pass = passes[nextPass]; pass && pass.index <= index; pass = passes[nextPass]) {
      if (pass.index === index) passOver(film, pass, parameters.ploughResidualMm);
      nextPass += 1;
    }
    note(result, index, { film, tempC, promise });
    result.knownUntil = index + 1;
  }
  return result;
}

/**
 * Minutes from `fromIndex` until the promise is first broken; null when it is kept as far as the projection knows.
 * 0 when it is broken at once. `graceMin` leaves out what a fresh salt needs to work.
 */
export function holdMin(
  projection: Pick<Projection, 'isKept' | 'knownUntil'>,
  from: { index: number; stepMin: number; graceMin?: number },
): number | null {
  const first = from.index + Math.ceil((from.graceMin ?? 0) / from.stepMin);
  for (let index = first; index < projection.knownUntil; index += 1) {
    if (!projection.isKept[index]) return index === first && from.graceMin ? 0 : (index - from.index) * from.stepMin;
  }
  return null;
}

/** Hold minus the time to the next pass, min; null while the hold has no end in sight. */
export function slackMin(hold: number | null, toNextPassMin: number): number | null {
  return hold === null ? null : hold - toNextPassMin;
}
