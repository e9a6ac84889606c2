import { precipitationTypeOf, type PrecipitationType } from '../road/precipitation';
import { timeAt, type StepAxis } from '../time/step-axis';

/** One report of a station; times in ms since 1970. Null where it did not say. */
export interface StationReading {
  readonly at: number;
  readonly pavementTempC: number | null;
  /** since the report before, mm of water */
  readonly precipitationMm: number | null;
  readonly precipitationType: string | null;
  readonly waterMm: number | null;
  readonly windSpeedMPerS: number | null;
  /** a check of the pavement temperature failed: it may not drive a rate */
  readonly isFlagged: boolean;
}

export interface StationForecastHour {
  readonly validAt: number;
  readonly pavementTempC: number | null;
  /** one standard deviation */
  readonly pavementErrorC: number | null;
  /** in the hour that ends at `validAt`, mm of water */
  readonly precipitationMm: number | null;
  readonly precipitationType: string | null;
  readonly windSpeedMPerS: number | null;
}

export interface Station {
  readonly id: number;
  readonly latDeg: number;
  readonly lonDeg: number;
  readonly heightM: number;
  /** in order of time */
  readonly readings: readonly StationReading[];
  /** of one issue, in order of time */
  readonly forecast: readonly StationForecastHour[];
}

/** Of the newest usable pavement temperature: up to 30 min old, up to 2 h, older or none (common practice, no source). */
export type ReadingStatus = 'current' | 'stale' | 'missing';
export const STALE_AFTER_MIN = 30;
export const MISSING_AFTER_MIN = 120;

/** One station on the steps of an axis. Unknown temperatures are NaN. */
export interface StationSeries {
  readonly stationId: number;
  readonly tempsC: Float64Array;
  readonly precipitationMm: Float64Array;
  readonly precipitationTypes: PrecipitationType[];
  /** forecast error, one standard deviation, °C; 0 where measured */
  readonly errorC: Float64Array;
  readonly newestAt: number | null;
  readonly ageMin: number | null;
  readonly status: ReadingStatus;
  /** the newest report was left out, since it failed its checks */
  readonly isNewestFlagged: boolean;
  readonly waterAtStartMm: number | null;
  readonly windMPerS: number | null;
}

const MS_PER_MIN = 60_000;
/** A gap between two readings is bridged up to here, min. */
const LONGEST_BRIDGE_MIN = MISSING_AFTER_MIN;
/** Forecast hours, and the last reading before the first of them, are joined up to here apart. */
const LONGEST_JOIN_MS = 6 * 3_600_000;
/** What the last reading knew better than the forecast fades over this, h; 3 to 6 h is common practice, no source. */
const CORRECTION_FADES_H = 6;
/** A report's precipitation is spread over the time since the report before, up to this, min. */
const LONGEST_AMOUNT_MIN = 60;

interface Knot {
  at: number;
  value: number;
}

export function readingStatus(
  newestAt: number | null,
  nowAt: number,
): { status: ReadingStatus; ageMin: number | null } {
  if (newestAt === null) return { status: 'missing', ageMin: null };
  const ageMin = Math.max(0, (nowAt - newestAt) / MS_PER_MIN);
  if (ageMin > MISSING_AFTER_MIN) return { status: 'missing', ageMin };
  return { status: ageMin > STALE_AFTER_MIN ? 'stale' : 'current', ageMin };
}

/** The value between knots; NaN outside them and in gaps longer than `bridgeMs`. */
function lineThrough(knots: readonly Knot[], bridgeMs: number): (at: number) => number {
  let right = 0;
  return (at) => {
    // Asked in order of time, so that one walk over the knots serves all steps; starts again when it is not.
    if (right > 0 && (knots[right - 1]?.at ?? Infinity) > at) right = 0;
    while (right < knots.length && (knots[right]?.at ?? Infinity) < at) right += 1;
    const after = knots[right];
    if (after?.at === at) return after.value;
    const before = knots[right - 1];
    if (!before || !after || after.at - before.at > bridgeMs) return NaN;
    return before.value + ((after.value - before.value) * (at - before.at)) / (after.at - before.at);
  };
}

function forecastKnots(station: Station, newest: Knot | null): Knot[] {
  const knots = station.forecast.flatMap(({ validAt, pavementTempC }) =>
    pavementTempC === null ? [] : [{ at: validAt, value: pavementTempC }],
  );
  const first = knots[0];
  // Before its first hour a forecast says nothing: it is joined to the last reading.
  return newest && first && newest.at < first.at ? [newest, ...knots] : knots;
}

/** Measured up to the newest reading, then the forecast drawn to it, the difference fading. */
function temperatures(station: Station, axis: StepAxis, { newest, status }: Newest): Float64Array {
  const measured = station.readings.flatMap(({ at, pavementTempC, isFlagged }) =>
    pavementTempC === null || isFlagged ? [] : [{ at, value: pavementTempC }],
  );
  const readAt = lineThrough(measured, LONGEST_BRIDGE_MIN * MS_PER_MIN);
  const predictedAt = lineThrough(forecastKnots(station, newest), LONGEST_JOIN_MS);
  const missed = newest && status !== 'missing' ? newest.value - predictedAt(newest.at) : 0;
  const differenceC = Number.isNaN(missed) ? 0 : missed;
  return Float64Array.from({ length: axis.count }, (_, index) => {
    const at = timeAt(axis, index);
    const read = readAt(at);
    if (!Number.isNaN(read)) return read;
    const ahead = newest && at > newest.at ? (at - newest.at) / 3_600_000 : Infinity;
    return predictedAt(at) + differenceC * Math.max(0, 1 - ahead / CORRECTION_FADES_H);
  });
}

interface Newest {
  newest: Knot | null;
  status: ReadingStatus;
}

interface Amount {
  fromAt: number;
  untilAt: number;
  mm: number;
  type: PrecipitationType;
}

/** Measured amounts to the newest report that has one, forecast amounts after it. */
function amountsOf(station: Station): Amount[] {
  const measured: Amount[] = [];
  let before: number | null = null;
  for (const { at, precipitationMm, precipitationType } of station.readings) {
    if (precipitationMm === null) continue;
    const fromAt = Math.max(at - LONGEST_AMOUNT_MIN * MS_PER_MIN, before ?? at - 10 * MS_PER_MIN);
    measured.push({ fromAt, untilAt: at, mm: precipitationMm, type: precipitationTypeOf(precipitationType) });
    before = at;
  }
  const lastAt = before ?? -Infinity;
  const forecast = station.forecast.flatMap(({ validAt, precipitationMm, precipitationType }): Amount[] => {
    if (precipitationMm === null || validAt <= lastAt) return [];
    const hourFromAt = validAt - 3_600_000;
    const fromAt = Math.max(hourFromAt, lastAt);
    const mm = (precipitationMm * (validAt - fromAt)) / 3_600_000;
    return [{ fromAt, untilAt: validAt, mm, type: precipitationTypeOf(precipitationType) }];
  });
  return [...measured, ...forecast];
}

/** Amounts over any intervals, shared out among the steps that end at the entries of the axis. */
function precipitation(station: Station, axis: StepAxis): { mm: Float64Array; types: PrecipitationType[] } {
  const mm = new Float64Array(axis.count);
  const types = Array.from({ length: axis.count }, (): PrecipitationType => 'none');
  const most = new Float64Array(axis.count);
  const stepMs = axis.stepMin * MS_PER_MIN;
  for (const amount of amountsOf(station)) {
    if (!(amount.mm > 0) || amount.untilAt <= amount.fromAt) continue;
    const type = amount.type === 'none' ? 'unknown' : amount.type;
    const first = Math.max(0, Math.floor((amount.fromAt - axis.startAt) / stepMs));
    for (let index = first; index < axis.count; index += 1) {
      const endAt = timeAt(axis, index);
      const overlapMs = Math.min(endAt, amount.untilAt) - Math.max(endAt - stepMs, amount.fromAt);
      if (endAt - stepMs >= amount.untilAt) break;
      if (overlapMs <= 0) continue;
      const part = (amount.mm * overlapMs) / (amount.untilAt - amount.fromAt);
      mm[index] = (mm[index] ?? 0) + part;
      if (part > (most[index] ?? 0)) {
        most[index] = part;
        types[index] = type;
      }
    }
  }
  return { mm, types };
}

function errors(station: Station, axis: StepAxis, newestAt: number | null): Float64Array {
  const knots = station.forecast.flatMap(({ validAt, pavementErrorC }) =>
    pavementErrorC === null ? [] : [{ at: validAt, value: pavementErrorC }],
  );
  const first = knots[0];
  if (newestAt !== null && first && newestAt < first.at) knots.unshift({ at: newestAt, value: 0 });
  const errorAt = lineThrough(knots, LONGEST_JOIN_MS);
  return Float64Array.from({ length: axis.count }, (_, index) => {
    const at = timeAt(axis, index);
    if (newestAt !== null && at <= newestAt) return 0;
    const error = errorAt(at);
    return Number.isNaN(error) ? 0 : error;
  });
}

/**
 * A station's pavement temperature (°C) and precipitation (mm a step) on an axis: measured where there are readings no
 * more than 2 h apart, then the forecast, drawn to the newest reading with a difference that fades over 6 h. Readings
 * that failed a check are left out. A station silent for over 2 h is `missing`: the forecast stands alone.
 */
export function stationSeries(station: Station, axis: StepAxis, nowAt: number): StationSeries {
  const heard = station.readings.filter(({ at }) => at <= nowAt);
  const usable = heard.filter(({ pavementTempC, isFlagged }) => pavementTempC !== null && !isFlagged);
  const newest = usable.at(-1);
  const newestAt = newest?.at ?? null;
  const knot = newest ? { at: newest.at, value: newest.pavementTempC ?? NaN } : null;
  const { status, ageMin } = readingStatus(newestAt, nowAt);
  const known = { ...station, readings: heard };
  const { mm, types } = precipitation(known, axis);
  const nearStart = heard.filter(({ at, waterMm }) => waterMm !== null && Math.abs(at - axis.startAt) <= 1_800_000);
  const hourNow = station.forecast.find(({ validAt }) => validAt >= nowAt);
  return {
    stationId: station.id,
    tempsC: temperatures(known, axis, { newest: knot, status }),
    precipitationMm: mm,
    precipitationTypes: types,
    errorC: errors(station, axis, newestAt),
    newestAt,
    ageMin,
    status,
    isNewestFlagged: heard.at(-1)?.isFlagged ?? false,
    waterAtStartMm: nearStart[0]?.waterMm ?? null,
    windMPerS: heard.at(-1)?.windSpeedMPerS ?? hourNow?.windSpeedMPerS ?? null,
  };
}
