import { isKnownZone } from '@/lib/time/format';
import { compileLayout } from './date-layout';
import { quantityFacts, type ReadingQuantity } from './quantities';
import { factsOfUnit, isOverInterval, type FileUnitName, unitsOf } from './units';

/** Whose clock a time is told by: a zone with its changes of the clocks, or one offset all year (east positive). */
export type Clock = { kind: 'zone'; zone: string } | { kind: 'offset'; offsetMin: number };

/**
 * How a row says its time. `one`: a single column, by a pattern of `yyyy yy MM M dd d HH H hh h mm ss a`, or `iso`,
 * `epoch-s`, `epoch-ms`. `two`: date and time apart. `parts`: numbers in columns of their own; `hourZero` tells whether
 * hour 0 begins the day of its date or ends it.
 */
export type TimeLayout =
  | { kind: 'one'; column: string; pattern: string }
  | { kind: 'two'; dateColumn: string; datePattern: string; timeColumn: string; timePattern: string }
  | {
      kind: 'parts';
      yearColumn: string;
      monthColumn: string;
      dayColumn: string;
      hourColumn: string;
      minuteColumn: string | null;
      hourZero: 'begins-day' | 'ends-day';
    };

export interface ColumnMapping {
  /** its head; `column 3` where the file has no heads */
  column: string;
  quantity: ReadingQuantity;
  unit: FileUnitName;
  /** null: the file's own */
  clock: Clock | null;
  /** what stands for "missing" in this column, beside the file's */
  missing: readonly string[];
  /** of sums and rates: how long they were gathered, minutes */
  intervalMin: number;
  /** of sums and rates: whether the time of the row is when the interval ended or began */
  timeIs: 'end' | 'start';
}

export const encodings = ['utf-8', 'windows-1252', 'utf-16le'] as const;
export type Encoding = (typeof encodings)[number];
export const delimiters = [',', ';', '\t', '|'] as const;
export type Delimiter = (typeof delimiters)[number];

/** How one station's files are read. */
export interface Mapping {
  version: 1;
  encoding: Encoding;
  delimiter: Delimiter;
  quote: '"' | "'";
  decimalMark: '.' | ',';
  hasHeader: boolean;
  /** lines before the heads (or before the first row) that are no table */
  skipLines: number;
  clock: Clock;
  time: TimeLayout;
  missing: readonly string[];
  columns: readonly ColumnMapping[];
}

/**
 * What commonly stands for "missing": an empty cell is always one. `Not Reported` and the rest are seen in exports of
 * road weather stations; the numbers are common practice, no source.
 */
export const usualMissing: readonly string[] = [
  'NA',
  'N/A',
  'NaN',
  'null',
  'none',
  '-',
  '--',
  '///',
  'M',
  'Not Reported',
  '-999',
  '-9999',
  '-999.9',
];

/** Hour sums are the common case. */
export const USUAL_INTERVAL_MIN = 60;
const LONGEST_INTERVAL_MIN = 1440;
/** Zones reach from −12 to +14 h. */
const MOST_OFFSET_MIN = 14 * 60;

/** The columns that a layout takes its time from. */
export function timeColumnsOf(time: TimeLayout): string[] {
  switch (time.kind) {
    case 'one':
      return [time.column];
    case 'two':
      return [time.dateColumn, time.timeColumn];
    case 'parts':
      return [time.yearColumn, time.monthColumn, time.dayColumn, time.hourColumn, time.minuteColumn ?? ''].filter(
        Boolean,
      );
  }
}

/** The names of a file's columns from its first row: heads as they stand, `Temp (2)` for the second of a name. */
export function columnNamesOf(firstRow: readonly string[], hasHeader: boolean): string[] {
  const seen = new Map<string, number>();
  return firstRow.map((cell, index) => {
    const name = (hasHeader ? cell.trim() : '') || `column ${index + 1}`;
    const times = (seen.get(name) ?? 0) + 1;
    seen.set(name, times);
    return times === 1 ? name : `${name} (${times})`;
  });
}

function clockFault(clock: Clock): string | null {
  if (clock.kind === 'zone') return isKnownZone(clock.zone) ? null : `There is no time zone “${clock.zone}”.`;
  return Math.abs(clock.offsetMin) <= MOST_OFFSET_MIN ? null : 'An offset from UTC is at most 14 hours.';
}

function columnFault(column: ColumnMapping): string | null {
  const { quantity, unit, intervalMin } = column;
  const { label } = quantityFacts[quantity];
  if (!unitsOf(quantity).includes(unit)) return `${label} cannot come in ${unit}.`;
  const isGathered = isOverInterval(quantity) || factsOfUnit(unit)?.needsInterval;
  if (isGathered && !(intervalMin > 0 && intervalMin <= LONGEST_INTERVAL_MIN)) {
    return `${label} is gathered over 1 to ${LONGEST_INTERVAL_MIN} minutes.`;
  }
  return column.clock ? clockFault(column.clock) : null;
}

function timeFault(time: TimeLayout): string | null {
  if (time.kind === 'parts') return null;
  const patterns = time.kind === 'one' ? [time.pattern] : [`${time.datePattern} ${time.timePattern}`];
  for (const pattern of patterns) {
    const layout = compileLayout(pattern);
    if (!layout.ok) return layout.reason;
  }
  return null;
}

/**
 * What is wrong with a mapping, by the part it concerns (`clock`, `time`, `columns`, or a column's name), each as a
 * sentence; nothing wrong is an empty record. Whether the file has the columns is asked when it is read.
 */
export function faultsOfMapping(mapping: Mapping): Readonly<Record<string, string>> {
  const faults: Record<string, string> = {};
  const clock = clockFault(mapping.clock);
  if (clock) faults.clock = clock;
  const time = timeColumnsOf(mapping.time).length === 0 ? 'Say which column holds the time.' : timeFault(mapping.time);
  if (time) faults.time = time;
  if (mapping.columns.length === 0) faults.columns = 'Say what at least one column measures.';
  if (mapping.delimiter === mapping.decimalMark) faults.delimiter = 'The comma cannot part columns and decimals both.';
  const columnOf = new Map<ReadingQuantity, string>();
  for (const column of mapping.columns) {
    const fault = columnFault(column);
    if (fault) faults[column.column] = fault;
    const other = columnOf.get(column.quantity);
    if (other !== undefined) {
      faults[column.column] =
        `“${other}” already is ${quantityFacts[column.quantity].label.toLowerCase()}: a second probe is a second station.`;
    }
    columnOf.set(column.quantity, column.column);
  }
  return faults;
}
