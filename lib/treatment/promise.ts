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

/** Snow that fell within this long is still being ploughed and driven through, min; common practice, no source. */
const RECENT_SNOW_MIN = 60;
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

/**
 * Which promise the film is judged by. Snow and sleet, while they fall and for an hour after, or while they are most of
 * an unploughed cover of over 0.3 mm: loose snow. Frost, freezing rain, a wet road, and what a plough left: no ice.
 * Judged by what fell, not by what is left of it, so that more salt never makes the promise stricter.
 */
export function targetOf(film: Pick<Film, 'fellMm' | 'fellAsSnowMm' | 'sinceSnowMin'>): Target {
  const isMostlySnow = film.fellAsSnowMm > 0.5 * film.fellMm;
  const isRecent = film.sinceSnowMin !== null && film.sinceSnowMin <= RECENT_SNOW_MIN;
  const isCovered = isRecent || film.fellMm > THIN_FILM_MM + 1e-9;
  return isMostlySnow && isCovered ? 'loose-snow' : 'no-ice';
}

/**
 * The least brine share, 0 to 1, that keeps a promise at a pavement temperature in °C: for no ice 1 (bare), 0.8
 * (passable), 0.5 (low); for loose snow `looseBrineShare · looseFactor(T)`, half of it for low, never over 1.
 * Loose snow at −5.3 °C, bare: 0.158.
 */
export function targetBrineShare(
  promise: { kind: PromiseKind; looseBrineShare: number },
  target: Target,
  tempC: number,
): number {
  if (target === 'no-ice') return NO_ICE_SHARE[promise.kind];
  return Math.min(1, LOOSE_PART[promise.kind] * promise.looseBrineShare * looseFactor(tempC));
}
