import { waterMmOf, type Film } from '../road/film';
import { DRY_MM } from '../road/partition';
import { isFreezingRain, isRain } from '../road/precipitation';
import { eutecticLimitC, type Material } from './materials';
import { type Policy } from './policy';
import { type RoadWeather } from './weather';

/** Why a material is not for this road and pass. */
export type RefusalReason =
  | 'not-needed'
  | 'melts-nothing'
  | 'below-eutectic'
  | 'below-practical-limit'
  | 'over-spreader-limit'
  | 'over-policy-limit'
  | 'not-in-time'
  | 'brine-too-weak'
  | 'liquid-before-rain'
  | 'liquid-in-freezing-rain'
  | 'liquid-on-bonded'
  | 'dry-cold-blowing';

export interface Refusal {
  readonly ok: false;
  readonly reason: RefusalReason;
  /** what it would take, where a limit forbids it, g/m² */
  readonly neededRateGPerM2?: number;
  /** the limit met: °C or g/m² by the reason */
  readonly limit?: number;
}

export interface Circumstances {
  readonly film: Film;
  readonly weather: RoadWeather;
  readonly untilIndex: number;
  readonly windMPerS: number | null;
  readonly policy: Policy;
}

export function coldestC(weather: RoadWeather, untilIndex: number): number {
  let coldest = Infinity;
  for (let index = 0; index <= untilIndex; index += 1) coldest = Math.min(coldest, weather.tempsC[index] ?? Infinity);
  return coldest;
}

function refuseLiquid({ film, weather, untilIndex }: Circumstances): Refusal | null {
  if (film.isBonded) return { ok: false, reason: 'liquid-on-bonded' };
  let isFirst = true;
  for (let index = 1; index <= untilIndex; index += 1) {
    if (!((weather.precipitationMm[index] ?? 0) > 0)) continue;
    const type = weather.precipitationTypes[index] ?? 'none';
    if (isFreezingRain(type, weather.tempsC[index] ?? 0)) return { ok: false, reason: 'liquid-in-freezing-rain' };
    if (isFirst && isRain(type)) return { ok: false, reason: 'liquid-before-rain' };
    if (type !== 'none') isFirst = false;
  }
  return null;
}

/**
 * True where chemical on a cold, dry road would catch blowing snow and make ice that would not have formed (Wisconsin
 * DOT; wind threshold of dry snow, Li and Pomeroy 1997).
 */
export function isDryColdBlowing({ film, weather, untilIndex, windMPerS, policy }: Circumstances): boolean {
  return (
    windMPerS !== null &&
    windMPerS >= policy.blowingFromMPerS &&
    coldestC(weather, untilIndex) < policy.blowingBelowC &&
    waterMmOf(film) < DRY_MM
  );
}

/**
 * The rules that forbid a material before any rate is worked out: none that melts nothing; no liquid on bonded ice, in
 * freezing rain or before rain; nothing on cold dry road in blowing snow; none below its eutectic or its practical limit
 * at the coldest of the time to be held. Null when none does.
 */
export function forbid(material: Material, circumstances: Circumstances): Refusal | null {
  if (material.form === 'abrasive') return { ok: false, reason: 'melts-nothing' };
  if (isDryColdBlowing(circumstances)) return { ok: false, reason: 'dry-cold-blowing' };
  const coldest = coldestC(circumstances.weather, circumstances.untilIndex);
  const eutecticC = eutecticLimitC(material);
  if (coldest < eutecticC) return { ok: false, reason: 'below-eutectic', limit: eutecticC };
  if (material.practicalMinimumC !== null && coldest < material.practicalMinimumC) {
    return { ok: false, reason: 'below-practical-limit', limit: material.practicalMinimumC };
  }
  return material.form === 'liquid' ? refuseLiquid(circumstances) : null;
}
