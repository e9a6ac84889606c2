import { metresPerDegree } from '../geo/position';
import { type PrecipitationType } from '../road/precipitation';
import { type ReadingStatus, type Station, type StationSeries } from './station-series';

export type Exposure = 'open' | 'sheltered' | 'shaded' | 'ridge' | 'shore';

/** Where a road lies. */
export interface Site {
  readonly latDeg: number;
  readonly lonDeg: number;
  readonly heightM: number;
  readonly exposure: Exposure;
  readonly isBridge: boolean;
  readonly isTunnel?: boolean;
}

/** °C a metre of height, standard atmosphere (ICAO). */
const LAPSE_C_PER_M = 0.0065;

/**
 * How much warmer or colder than a level road in open country, °C, at night in winter: common practice, no source. The
 * energy balance, with sky view and shade of each road, takes their place once it is there.
 */
const EXPOSURE_OFFSET_C: Readonly<Record<Exposure, number>> = {
  open: 0,
  sheltered: 0.3,
  shaded: -0.4,
  ridge: -0.7,
  shore: 0.5,
};
const BRIDGE_OFFSET_C = -1;
const TUNNEL_OFFSET_C = 3;
/** Stations a road is carried from. */
const NEAREST = 3;
/** Farther than this a station says nothing about a road, m; common practice, no source. */
export const STATION_REACH_M = 50_000;
/** Nearer than this counts as this, m, so that a road beside a station does not divide by nothing. */
const NEAR_M = 200;

export interface CarryPart {
  readonly stationIndex: number;
  /** 0 to 1; the parts of a road add up to 1 */
  readonly weight: number;
  /** for the difference in height, °C */
  readonly heightOffsetC: number;
}

export interface Carried {
  readonly tempsC: Float64Array;
  readonly precipitationMm: Float64Array;
  readonly precipitationTypes: PrecipitationType[];
  /** forecast error, one standard deviation, °C */
  readonly errorC: Float64Array;
  readonly stationIds: readonly number[];
  readonly newestReadingAt: number | null;
  readonly ageMin: number | null;
  /** of the best-informed of the stations */
  readonly status: ReadingStatus;
  /** where the present comes from */
  readonly source: 'measured' | 'forecast';
  readonly hasFlaggedReading: boolean;
  /** what exposure, bridge and tunnel add, °C */
  readonly siteOffsetC: number;
  readonly waterAtStartMm: number;
  readonly windMPerS: number | null;
}

export function siteOffsetC({ exposure, isBridge, isTunnel = false }: Site): number {
  return EXPOSURE_OFFSET_C[exposure] + (isBridge ? BRIDGE_OFFSET_C : 0) + (isTunnel ? TUNNEL_OFFSET_C : 0);
}

/**
 * The nearest stations of a site, at most three, weighted by 1/d² (inverse distance: common practice, no source), each
 * with the height difference at 6.5 °C a kilometre. Empty where no station is within 50 km: the road is then unknown, which
 * is never shown as clear.
 */
export function carryParts(
  site: Site,
  stations: readonly Pick<Station, 'latDeg' | 'lonDeg' | 'heightM'>[],
): CarryPart[] {
  const { lonM, latM } = metresPerDegree(site.latDeg);
  const near = stations
    .map(({ latDeg, lonDeg, heightM }, stationIndex) => ({
      stationIndex,
      distanceM: Math.hypot((lonDeg - site.lonDeg) * lonM, (latDeg - site.latDeg) * latM),
      heightOffsetC: (heightM - site.heightM) * LAPSE_C_PER_M,
    }))
    .filter(({ distanceM }) => distanceM <= STATION_REACH_M)
    .sort((a, b) => a.distanceM - b.distanceM)
    .slice(0, NEAREST)
    .map((part) => ({ ...part, raw: 1 / Math.max(NEAR_M, part.distanceM) ** 2 }));
  const total = near.reduce((sum, { raw }) => sum + raw, 0);
  return near.map(({ stationIndex, heightOffsetC, raw }) => ({ stationIndex, heightOffsetC, weight: raw / total }));
}

interface Pulled {
  part: CarryPart;
  from: StationSeries;
}

function weightedTemps(pulled: readonly Pulled[], offsetC: number, count: number): Float64Array {
  const tempsC = new Float64Array(count);
  for (let index = 0; index < count; index += 1) {
    let sum = 0;
    let weights = 0;
    for (const { part, from } of pulled) {
      const tempC = from.tempsC[index] ?? NaN;
      if (Number.isNaN(tempC)) continue;
      sum += part.weight * (tempC + part.heightOffsetC);
      weights += part.weight;
    }
    tempsC[index] = weights > 0 ? sum / weights + offsetC : NaN;
  }
  return tempsC;
}

function weightedFall(pulled: readonly Pulled[], count: number) {
  const mm = new Float64Array(count);
  const types: PrecipitationType[] = [];
  for (let index = 0; index < count; index += 1) {
    let most = 0;
    let type: PrecipitationType = 'none';
    for (const { part, from } of pulled) {
      const amount = part.weight * (from.precipitationMm[index] ?? 0);
      mm[index] = (mm[index] ?? 0) + amount;
      if (amount > most) {
        most = amount;
        type = from.precipitationTypes[index] ?? 'none';
      }
    }
    types.push(type);
  }
  return { mm, types };
}

const rank: Readonly<Record<ReadingStatus, number>> = { current: 0, stale: 1, missing: 2 };

function weightedMean(pulled: readonly Pulled[], of: (series: StationSeries) => number | null): number | null {
  let sum = 0;
  let weights = 0;
  for (const { part, from } of pulled) {
    const value = of(from);
    if (value === null) continue;
    sum += part.weight * value;
    weights += part.weight;
  }
  return weights > 0 ? sum / weights : null;
}

/**
 * Station series carried to a road: temperature by weighted stations, height, exposure and bridge; precipitation by the
 * weights alone, none in a tunnel. A station counts at the steps where it knows a temperature. Status and age are those
 * of its best-informed station; `source` says whether now is measured. `count` is the number of steps;
 * without any station all temperatures are NaN.
 */
export function carry(
  site: Site,
  parts: readonly CarryPart[],
  { series, count }: { series: readonly StationSeries[]; count: number },
): Carried {
  const pulled = parts.flatMap((part): Pulled[] => {
    const from = series[part.stationIndex];
    return from ? [{ part, from }] : [];
  });
  const offsetC = siteOffsetC(site);
  const { mm, types } = weightedFall(site.isTunnel ? [] : pulled, count);
  const bestFirst = [...pulled].sort((a, b) => rank[a.from.status] - rank[b.from.status])[0]?.from;
  const errorC = Float64Array.from(
    { length: count },
    (_, index) => weightedMean(pulled, ({ errorC: error }) => error[index] ?? null) ?? 0,
  );
  return {
    tempsC: weightedTemps(pulled, offsetC, count),
    precipitationMm: mm,
    precipitationTypes: types,
    errorC,
    stationIds: pulled.map(({ from }) => from.stationId),
    newestReadingAt: bestFirst?.newestAt ?? null,
    ageMin: bestFirst?.ageMin ?? null,
    status: bestFirst?.status ?? 'missing',
    source: bestFirst && bestFirst.status !== 'missing' ? 'measured' : 'forecast',
    hasFlaggedReading: pulled.some(({ from }) => from.isNewestFlagged),
    siteOffsetC: offsetC,
    waterAtStartMm: (site.isTunnel ? null : weightedMean(pulled, ({ waterAtStartMm }) => waterAtStartMm)) ?? 0,
    windMPerS: weightedMean(pulled, ({ windMPerS }) => windMPerS),
  };
}
