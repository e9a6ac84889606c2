import { fDifferenceToC, fToC, inchToMm, knotsToMPerS, mileToKm } from '@/lib/units/convert';
import { type PartialReading } from './read-row';
import { isWordQuantity, type NumericQuantity, type ReadingQuantity } from './quantities';

/** The tests a value can fail. A flagged value is kept as it came; it is only not trusted without a look. */
export const checkNames = [
  'range',
  'step',
  'stuck',
  'against-air',
  'above-air',
  'against-wind',
  'against-pavement',
  'clock-ahead',
  'time-guessed',
] as const;
export type CheckName = (typeof checkNames)[number];
export type Flags = Partial<Record<ReadingQuantity, CheckName[]>>;

/** What each failed test means, to complete "The value …". */
export const checkWords: Readonly<Record<CheckName, string>> = {
  range: 'is outside what can be',
  step: 'jumps from the one before',
  stuck: 'has not moved for hours',
  'against-air': 'does not fit the air temperature',
  'above-air': 'is above the air temperature',
  'against-wind': 'does not fit the mean wind',
  'against-pavement': 'does not fit the pavement temperature',
  'clock-ahead': 'is of a time that had not come yet',
  'time-guessed': 'is of an hour that the clocks showed twice',
};

/**
 * Lowest and highest credible value, SI. MADIS level 1 validity: air −60 to 130 °F, dew point −90 to 90 °F, soil −40 to
 * 150 °F, direction, visibility to 100 miles, precipitation to 44 in. Washington (after Shafer 2000): humidity to 105 %,
 * wind to 60 m/s, gust to 70 m/s. Freezing point −50 to 0 °C, pavement, sun and film: common practice, no source.
 */
export const rangeLimits: Readonly<Record<NumericQuantity, readonly [number, number]>> = {
  pavementTempC: [-50, 75],
  airTempC: [fToC(-60), fToC(130)],
  dewPointC: [fToC(-90), fToC(90)],
  relativeHumidity: [0, 1.05],
  windSpeedMPerS: [0, 60],
  windGustMPerS: [0, 70],
  windDirectionDeg: [0, 360],
  precipitationMm: [0, inchToMm(44)],
  subsurfaceTempC: [fToC(-40), fToC(150)],
  freezingPointC: [-50, 0],
  solarWPerM2: [-15, 1500],
  visibilityM: [0, mileToKm(100) * 1000],
  waterMm: [0, 100],
};

/**
 * Largest credible change between values at most an hour apart. Washington, "suspect": 10 K, 60 % humidity, 40 m/s
 * wind; the road's temperatures by the same 10 K (common practice, no source; the largest hourly step of a measured
 * Canadian winter is 6.5 K). MADIS allows the air 35 °F in an hour, which is the wider.
 */
export const stepLimits: Partial<Readonly<Record<ReadingQuantity, number>>> = {
  pavementTempC: 10,
  airTempC: 10,
  dewPointC: Math.min(10, fDifferenceToC(35)),
  subsurfaceTempC: 10,
  relativeHumidity: 0.6,
  windSpeedMPerS: 40,
};

const HOUR_MS = 3_600_000;
const STEP_WITHIN_MS = HOUR_MS;
/** No change to 0.1 °C for 3 h, wind at 0 for 6 h: common practice, no source. */
const stuckAfterMs: Partial<Readonly<Record<ReadingQuantity, number>>> = {
  pavementTempC: 3 * HOUR_MS,
  airTempC: 3 * HOUR_MS,
  dewPointC: 3 * HOUR_MS,
  windSpeedMPerS: 6 * HOUR_MS,
};
/** Melting and freezing hold a road here by themselves: no sign of a dead sensor. °C, common practice, no source. */
const HELD_BY_ICE_C = 0.3;
/** A clock this fast is nothing to speak of. */
const CLOCK_SLACK_MS = 5 * 60_000;

/** What one column's values are held against, and what came before. Plain fields: they are touched for every value. */
interface Past {
  readonly quantity: ReadingQuantity;
  readonly lowest: number;
  readonly highest: number;
  readonly step: number;
  readonly stuckAfterMs: number;
  goodMs: number;
  good: number;
  doubtedMs: number;
  doubted: number;
  sameSinceMs: number;
  lastMs: number;
  last: number;
}

export interface Checker {
  /** The tests that the values of a reading fail; null when none. Readings must come in the order of the file. */
  readonly check: (reading: PartialReading) => Flags | null;
}

/** What failed, gathered for one reading. */
class FlagSheet {
  flags: Flags | null = null;
  add(quantity: ReadingQuantity, name: CheckName): void {
    this.flags ??= {};
    (this.flags[quantity] ??= []).push(name);
  }
}

function noPast(quantity: ReadingQuantity): Past {
  const [lowest, highest] = isWordQuantity(quantity) ? [0, 0] : rangeLimits[quantity];
  return {
    quantity,
    lowest,
    highest,
    step: stepLimits[quantity] ?? Infinity,
    stuckAfterMs: stuckAfterMs[quantity] ?? Infinity,
    goodMs: NaN,
    good: 0,
    doubtedMs: NaN,
    doubted: 0,
    sameSinceMs: NaN,
    lastMs: NaN,
    last: NaN,
  };
}

function placesOf(columns: readonly ReadingQuantity[]): Places {
  return {
    air: columns.indexOf('airTempC'),
    dew: columns.indexOf('dewPointC'),
    pavement: columns.indexOf('pavementTempC'),
    wind: columns.indexOf('windSpeedMPerS'),
    gust: columns.indexOf('windGustMPerS'),
    status: columns.indexOf('surfaceStatus'),
  };
}

/**
 * Makes the checker of one upload for columns of these quantities; `nowMs` is what a clock is ahead of. Tests that need
 * two quantities are made where both are of the same row and instant.
 */
export function createChecker(columns: readonly ReadingQuantity[], nowMs: number): Checker {
  const pasts = columns.map(noPast);
  const places = placesOf(columns);
  const check = ({ atMs, isTimeGuessed, values }: PartialReading): Flags | null => {
    const sheet = new FlagSheet();
    const isAhead = atMs > nowMs + CLOCK_SLACK_MS;
    for (let index = 0; index < pasts.length; index += 1) {
      const value = values[index];
      const past = pasts[index];
      if (value === null || value === undefined || past === undefined) continue;
      if (isAhead) sheet.add(past.quantity, 'clock-ahead');
      if (isTimeGuessed) sheet.add(past.quantity, 'time-guessed');
      if (typeof value === 'number') checkAlone(past, { atMs, value }, sheet);
    }
    checkTogether(values, places, sheet);
    return sheet.flags;
  };
  return { check };
}

interface Timed {
  atMs: number;
  value: number;
}

function checkAlone(past: Past, { atMs, value }: Timed, sheet: FlagSheet): void {
  if (value < past.lowest || value > past.highest) sheet.add(past.quantity, 'range');
  else if (isJump(past, atMs, value)) sheet.add(past.quantity, 'step');
  if (past.stuckAfterMs !== Infinity && isStuck(past, atMs, value)) sheet.add(past.quantity, 'stuck');
}

/** A value that agrees with the last good one or with the last doubted one is good: a spike does not taint its return. */
function isJump(past: Past, atMs: number, value: number): boolean {
  const jumps = Math.abs(atMs - past.goodMs) <= STEP_WITHIN_MS && Math.abs(value - past.good) > past.step;
  const isConfirmed =
    jumps && Math.abs(atMs - past.doubtedMs) <= STEP_WITHIN_MS && Math.abs(value - past.doubted) <= past.step;
  if (jumps && !isConfirmed) {
    past.doubtedMs = atMs;
    past.doubted = value;
    return true;
  }
  past.goodMs = atMs;
  past.good = value;
  return false;
}

function isStuck(past: Past, atMs: number, value: number): boolean {
  const isSame = Math.abs(value - past.last) < 0.05 && Math.abs(atMs - past.lastMs) <= STEP_WITHIN_MS;
  past.lastMs = atMs;
  if (!isSame) {
    past.sameSinceMs = atMs;
    past.last = value;
    return false;
  }
  if (past.quantity === 'windSpeedMPerS' && value !== 0) return false;
  if (past.quantity === 'pavementTempC' && Math.abs(value) <= HELD_BY_ICE_C) return false;
  return Math.abs(atMs - past.sameSinceMs) >= past.stuckAfterMs;
}

interface Places {
  air: number;
  dew: number;
  pavement: number;
  wind: number;
  gust: number;
  status: number;
}

const frozenWords: ReadonlySet<unknown> = new Set(['ice', 'snow', 'slush', 'frost']);
const FROZEN_ABOVE_C = 3;
const FURTHEST_GUST_M_PER_S = knotsToMPerS(75);
const ROUNDING = 0.051;

/**
 * Dew point never above air, gust not below the mean nor 75 kt above it (MADIS, University of Utah); pavement 20 °C
 * below to 40 °C above the air, frozen status with the surface above +3 °C (common practice, no source).
 */
function checkTogether(values: PartialReading['values'], places: Places, sheet: FlagSheet): void {
  const air = numberAt(values, places.air);
  const pavement = numberAt(values, places.pavement);
  const wind = numberAt(values, places.wind);
  const gust = numberAt(values, places.gust);
  if (numberAt(values, places.dew) > air + ROUNDING) sheet.add('dewPointC', 'above-air');
  if (gust < wind - ROUNDING || gust > wind + FURTHEST_GUST_M_PER_S) sheet.add('windGustMPerS', 'against-wind');
  if (pavement - air < -20 || pavement - air > 40) sheet.add('pavementTempC', 'against-air');
  if (pavement > FROZEN_ABOVE_C && frozenWords.has(values[places.status])) {
    sheet.add('surfaceStatus', 'against-pavement');
  }
}

/** NaN, which compares with nothing, where there is no number. */
function numberAt(values: PartialReading['values'], index: number): number {
  const value = index < 0 ? null : values[index];
  return typeof value === 'number' ? value : Number.NaN;
}
