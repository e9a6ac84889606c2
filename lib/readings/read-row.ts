import { createClockReader, type ClockReader } from './clock';
import { type WallTime } from './date-layout';
import { type Clock, type ColumnMapping, type Mapping, timeColumnsOf } from './mapping';
import { BadCell, createCellReader, type CellReader } from './read-cell';
import { createTimeReader } from './read-time';
import { factsOfUnit, isOverInterval } from './units';

/** What a row says of one instant; a column with a clock of its own speaks of another. */
export interface PartialReading {
  atMs: number;
  /** the clock showed this time twice and nothing tells which */
  isTimeGuessed: boolean;
  /** in the order of the mapping's columns: SI or a word; null where missing or of another instant */
  values: (number | string | null)[];
}

export type RowReading = { ok: true; readings: PartialReading[] } | { ok: false; column: string; reason: string };

export interface RowReader {
  /** Rows must come in the order of the file: a repeated hour is told by the row before. */
  readonly read: (cells: readonly string[]) => RowReading;
  /** All columns share one clock: a row is one reading. */
  readonly isOneClock: boolean;
}

export type OpenedRowReader = { ok: true; reader: RowReader } | { ok: false; lacking: string[] };

/** Before this no road weather station reported. */
export const EARLIEST_MS = Date.UTC(1950, 0, 1);
/** A time further ahead than this is a misread date, not a clock that is fast. */
export const FURTHEST_AHEAD_MS = 366 * 86_400_000;

interface Group {
  clock: ClockReader;
  isFileClock: boolean;
  shiftMs: number;
  columns: { index: number; cellAt: number; name: string; read: CellReader }[];
}

/** Later by its interval when the row's time is the start of it: what is stored is the end. */
const shiftMsOf = ({ quantity, unit, timeIs, intervalMin }: ColumnMapping) =>
  timeIs === 'start' && (isOverInterval(quantity) || factsOfUnit(unit)?.needsInterval) ? intervalMin * 60_000 : 0;

const keyOf = (clock: Clock, shiftMs: number) => `${clock.kind === 'zone' ? clock.zone : clock.offsetMin} ${shiftMs}`;

function groupsOf(mapping: Mapping, indexOf: (column: string) => number): Group[] {
  const groups = new Map<string, Group>();
  mapping.columns.forEach((column, index) => {
    const clock = column.clock ?? mapping.clock;
    const shiftMs = shiftMsOf(column);
    const key = keyOf(clock, shiftMs);
    const group = groups.get(key) ?? {
      clock: createClockReader(clock),
      isFileClock: column.clock === null,
      shiftMs,
      columns: [],
    };
    const read = createCellReader(column, mapping);
    group.columns.push({ index, cellAt: indexOf(column.column), name: column.column, read });
    groups.set(key, group);
  });
  return [...groups.values()];
}

const wallText = (wallMs: number) => new Date(wallMs).toISOString().slice(0, 16).replace('T', ' ');

function instantOf(group: Group, time: WallTime): { ok: true; atMs: number; isGuessed: boolean } | string {
  // A time that names its own offset needs no clock; a column told to be in another zone still reads the wall.
  if (time.offsetMin !== null && group.isFileClock) {
    return { ok: true, atMs: time.wallMs - time.offsetMin * 60_000, isGuessed: false };
  }
  const resolved = group.clock.toInstant(time.wallMs);
  if (resolved.ok) return resolved;
  const { clock } = group.clock;
  const zone = clock.kind === 'zone' ? clock.zone : '';
  return `The clocks in ${zone} went forward over ${wallText(time.wallMs)}, so there was no such time.`;
}

function readGroup(
  group: Group,
  cells: readonly string[],
  count: number,
): PartialReading | { name: string; reason: string } | null {
  let values: (number | string | null)[] | null = null;
  for (const { index, cellAt, name, read } of group.columns) {
    const cell = cells[cellAt];
    if (cell === undefined) continue;
    const value = read(cell);
    if (value === null) continue;
    if (value instanceof BadCell) return { name, reason: value.reason };
    values ??= new Array<number | string | null>(count).fill(null);
    values[index] = value;
  }
  return values && { atMs: 0, isTimeGuessed: false, values };
}

/**
 * Makes the reader of rows of a file whose columns are named `columnNames`; `lacking` are columns the mapping asks for
 * and the file has not. Values become SI and instants UTC. A row is refused, with the column and a sentence, when its
 * time cannot be (nonsense, skipped by the clocks, before 1950 or over a year after `nowMs`) or a cell is neither
 * a value nor missing. A row in which all is missing is fine and gives no reading.
 */
export function openRowReader(mapping: Mapping, columnNames: readonly string[], nowMs: number): OpenedRowReader {
  const wanted = [...timeColumnsOf(mapping.time), ...mapping.columns.map(({ column }) => column)];
  const lacking = [...new Set(wanted.filter((column) => !columnNames.includes(column)))];
  if (lacking.length > 0) return { ok: false, lacking };
  const indexOf = (column: string) => columnNames.indexOf(column);
  const readTime = createTimeReader(mapping.time, indexOf);
  const needed = Math.max(...wanted.map(indexOf)) + 1;
  const plan = {
    groups: groupsOf(mapping, indexOf),
    count: mapping.columns.length,
    latestMs: nowMs + FURTHEST_AHEAD_MS,
    timeColumn: timeColumnsOf(mapping.time)[0] ?? '',
  };
  const read = (cells: readonly string[]): RowReading => {
    if (cells.length < needed) return tooShort(cells, columnNames, needed);
    const timed = readTime(cells);
    if (timed.ok) return readGroups(cells, timed.time, plan);
    return isHeadAgain(cells, columnNames) ? headAgain(timed.column) : timed;
  };
  return { ok: true, reader: { read, isOneClock: plan.groups.length === 1 } };
}

interface Plan {
  groups: readonly Group[];
  count: number;
  latestMs: number;
  timeColumn: string;
}

function readGroups(cells: readonly string[], time: WallTime, plan: Plan): RowReading {
  const { groups, count, latestMs, timeColumn } = plan;
  const readings: PartialReading[] = [];
  for (const group of groups) {
    const reading = readGroup(group, cells, count);
    const instant = instantOf(group, time);
    if (typeof instant === 'string') return { ok: false, column: timeColumn, reason: instant };
    if (reading === null) continue;
    if ('reason' in reading) return { ok: false, column: reading.name, reason: reading.reason };
    reading.atMs = instant.atMs + group.shiftMs;
    reading.isTimeGuessed = instant.isGuessed;
    if (!(reading.atMs >= EARLIEST_MS && reading.atMs <= latestMs)) return outside(timeColumn, reading.atMs);
    readings.push(reading);
  }
  return { ok: true, readings };
}

function tooShort(cells: readonly string[], columnNames: readonly string[], needed: number): RowReading {
  const column = columnNames[cells.length] ?? '';
  return { ok: false, column, reason: `The row has ${cells.length} columns; ${needed} are needed.` };
}

function outside(column: string, atMs: number): RowReading {
  const why = atMs < EARLIEST_MS ? 'before 1950' : 'more than a year ahead';
  return { ok: false, column, reason: `${wallText(atMs)} UTC is ${why}: check how dates are laid out.` };
}

const isHeadAgain = (cells: readonly string[], names: readonly string[]) =>
  cells.every((cell, index) => cell.trim() === '' || cell.trim() === names[index]);
const headAgain = (column: string): RowReading => ({
  ok: false,
  column,
  reason: 'The heads are repeated on this line.',
});
