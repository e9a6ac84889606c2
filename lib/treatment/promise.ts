import { type Film } from '../road/film';

export const promiseKinds = ['bare', 'passable', 'low'] as const;
/** What a service class was promised. */
export type PromiseKind = (typeof promiseKinds)[number];

/** Of loose snow that must be kept from bonding, or of a thin film that must not turn to ice. */
export type Target = 'loose-snow' | 'no-ice';

/** Brine share that a thin film keeps; 0.8 and 0.5 are common practice, no source. */
const NO_ICE_SHARE: Readonly<Record<PromiseKind, number>> = { bare: 1, passable: 0.8, low: 0.5 };
/** Part of the loose-snow share that a class keeps. */
const LOOSE_PART: Readonly<Record<PromiseKind, number>> = { bare: 1, passable: 1, low: 0.5 };

/** For this long after snow what a plough left of it still counts as snow, min: a cycle; common practice, no source. */
const RECENT_SNOW_MIN = 180;
/** W of a thin film at most, mm. */
export const THIN_FILM_MM = 0.3;

/**
 * How many times the solution of −2 °C keeps snow as loose at a pavement temperature in °C: 1 at and above −2, 1.7 at
 * −6, 5 at −17 and straight lines between (laboratory study of anti-compaction, doi 10.3141/2482-06); below −17 the
 * last line goes on. −8.1 °C: 2.33.
 */
export function looseFactor(tempC: number): number {
  if (tempC >= -2) return 1;
  if (tempC >= -6) return 1 + (0.7 * (-2 - tempC)) / 4;
  return 1.7 + (3.3 * (-6 - tempC)) / 11;
}

/** mm of rain that a mm of snow turns to slush; common practice, no source. */
const SLUSH_PER_SNOW = 2;

/** What fell on a road since it was last bare; salt does not change it, so that more salt never makes a promise stricter. */
export type Cover = Pick<Film, 'fellMm' | 'fellAsSnowMm' | 'sinceSnowMin'>;

/**
 * The part of a cover, 0 to 1, that is judged as a thin film in which no ice is allowed; the rest is snow or slush to be
 * kept loose. Rain, frost and a wet road are thin film; of what falls on snow only the first 0.3 mm and what is more
 * than twice the snow, since the rest makes slush. Snow is kept loose while it falls, for a cycle after, and while over
 * 0.3 mm of it lie unploughed; then what a plough left is a thin film too. 0.3 mm of ploughed snow with 0.2 mm of
 * drizzle on it: 0.4.
 */
export function thinFilmPart({ fellMm, fellAsSnowMm, sinceSnowMin }: Cover): number {
  if (fellMm <= 0) return 1;
  const isRecent = sinceSnowMin !== null && sinceSnowMin <= RECENT_SNOW_MIN;
  const snowMm = isRecent || fellAsSnowMm > THIN_FILM_MM + 1e-9 ? fellAsSnowMm : 0;
  const restMm = fellMm - snowMm;
  return Math.max(Math.min(THIN_FILM_MM, restMm), restMm - SLUSH_PER_SNOW * fellAsSnowMm) / fellMm;
}

/** The promise that asks for more of a cover. */
export function targetOf(cover: Cover): Target {
  return thinFilmPart(cover) > 0.5 ? 'no-ice' : 'loose-snow';
}

/**
 * The least brine share, 0 to 1, that keeps a promise on a cover at a pavement temperature in °C. No ice: 1 (bare), 0.8
 * (passable), 0.5 (low). Loose snow: `looseBrineShare · looseFactor(T)`, half of it for low, never over the share for no
 * ice. A cover of both takes each for its part. Snow at −5.3 °C, bare: 0.158.
 */
export function targetBrineShare(
  promise: { kind: PromiseKind; looseBrineShare: number },
  cover: Cover,
  tempC: number,
): number {
  const noIce = NO_ICE_SHARE[promise.kind];
  const loose = Math.min(noIce, LOOSE_PART[promise.kind] * promise.looseBrineShare * looseFactor(tempC));
  return loose + (noIce - loose) * thinFilmPart(cover);
}
