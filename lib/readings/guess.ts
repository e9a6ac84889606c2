import { decodeHead, guessEncoding, whyNoText } from './bytes';
import { type Doubt, guessColumns } from './guess-columns';
import { guessTime } from './guess-time';
import {
  type Clock,
  columnNamesOf,
  type Delimiter,
  delimiters,
  type Mapping,
  timeColumnsOf,
  usualMissing,
} from './mapping';
import { createRowSplitter } from './text-rows';

export type Guess =
  { ok: true; mapping: Mapping; columnNames: string[]; doubts: Doubt[] } | { ok: false; reason: string; todo: string };

interface Head {
  /** the first bytes of the file */
  bytes: Uint8Array;
  isWhole: boolean;
  /** the station's own clock, until a person says otherwise */
  clock: Clock;
}

const SAMPLE_ROWS = 400;
const MOST_SKIPPED = 20;

interface Table {
  delimiter: Delimiter;
  rows: { cells: readonly string[]; line: number }[];
  width: number;
  share: number;
}

function tableBy(delimiter: Delimiter, text: string): Table {
  const rows: Table['rows'] = [];
  const splitter = createRowSplitter({ delimiter, quote: '"', skipLines: 0 }, (cells, line) => {
    if (rows.length < SAMPLE_ROWS) rows.push({ cells, line });
  });
  splitter.push(text);
  splitter.end();
  const widths = new Map<number, number>();
  for (const { cells } of rows) widths.set(cells.length, (widths.get(cells.length) ?? 0) + 1);
  const [width = 1, count = 0] = [...widths].sort((a, b) => b[1] - a[1])[0] ?? [];
  return { delimiter, rows, width, share: count / Math.max(1, rows.length) };
}

/** Semicolon and tab before the comma, which in many files is the decimal mark. */
const preference: readonly Delimiter[] = ['\t', ';', '|', ','];

function bestTable(text: string): Table | null {
  const tables = delimiters.map((delimiter) => tableBy(delimiter, text)).filter(({ width }) => width > 1);
  const steady = tables.filter(({ share }) => share >= 0.8);
  const among = steady.length > 0 ? steady : tables;
  among.sort((a, b) => preference.indexOf(a.delimiter) - preference.indexOf(b.delimiter));
  return among[0] ?? null;
}

const isNumberLike = (cell: string) => /^\s*[-+\u2212]?\d/.test(cell);

function decimalMarkOf(cells: readonly string[], delimiter: Delimiter): '.' | ',' {
  if (delimiter === ',') return cells.some((cell) => /^\s*-?\d+\.\d+\s*$/.test(cell)) ? '.' : quotedComma(cells);
  const commas = cells.filter((cell) => /^\s*-?\d*,\d+\s*$/.test(cell)).length;
  const points = cells.filter((cell) => /^\s*-?\d*\.\d+\s*$/.test(cell)).length;
  return commas > points ? ',' : '.';
}

/** In a file parted by commas a decimal comma stands in quotes. */
const quotedComma = (cells: readonly string[]) => (cells.some((cell) => /^\s*-?\d+,\d+\s*$/.test(cell)) ? ',' : '.');

function numbersIn(texts: readonly string[], decimalMark: '.' | ','): number[] {
  return texts
    .filter((text) => text.trim() !== '')
    .map((text) => Number(decimalMark === ',' ? text.replace(',', '.') : text))
    .filter((value) => Number.isFinite(value) && !usualMissing.includes(String(value)));
}

const noTable: Guess = {
  ok: false,
  reason: 'The file has no columns: no line is parted by commas, semicolons, tabs or bars.',
  todo: 'Choose a CSV file with a time and at least one measured value on each line.',
};

/** The table cut into heads and body, after lines that are none. */
interface Cut {
  columnNames: string[];
  hasHeader: boolean;
  skipLines: number;
  body: (readonly string[])[];
}

function cut({ rows, width }: Table): Cut | null {
  const start = rows.slice(0, MOST_SKIPPED).findIndex(({ cells }) => cells.length === width);
  const [first, ...rest] = rows.slice(Math.max(0, start));
  if (!first) return null;
  const hasHeader = !first.cells.some(isNumberLike);
  const body = (hasHeader ? rest : [first, ...rest]).map(({ cells }) => cells).filter(({ length }) => length === width);
  return { columnNames: columnNamesOf(first.cells, hasHeader), hasHeader, skipLines: first.line - 1, body };
}

const doubtedClock: Doubt = {
  part: 'clock',
  sentence: 'The file does not say by whose clock its times are told, nor whether one column keeps another’s.',
};
const noTime: Doubt = {
  part: 'time',
  sentence: 'No column looks like a time: say which it is and how it is laid out.',
};
const noHeads: Doubt = { part: 'table', sentence: 'No head tells what is measured: say it for each column.' };

/**
 * Proposes how a file is to be read, from its first bytes (64 kB are plenty): encoding, delimiter, decimal mark, heads,
 * time layout, what each column measures and in what unit. `doubts` are what a person should look at. It cannot know
 * whose clock the times are told by: the station's is proposed and doubted.
 */
export function guessMapping({ bytes, isWhole, clock }: Head): Guess {
  const unreadable = whyNoText(bytes);
  if (unreadable) return { ok: false, ...unreadable };
  const encoding = guessEncoding(bytes, isWhole);
  const table = bestTable(decodeHead(bytes, encoding, isWhole));
  const parts = table && cut(table);
  if (!parts) return noTable;
  const { columnNames, body, hasHeader, skipLines } = parts;
  if (body.length === 0) {
    return { ok: false, reason: 'The file has heads and no rows.', todo: 'Choose a file with readings in it.' };
  }
  const columnOf = (index: number) => body.map((cells) => cells[index] ?? '');
  const { delimiter } = table;
  const decimalMark = decimalMarkOf(body.flat(), delimiter);
  const guessed = guessTime(columnNames, columnOf);
  const time = guessed?.time ?? { kind: 'one' as const, column: columnNames[0] ?? '', pattern: 'iso' };
  const taken = new Set(timeColumnsOf(time));
  const { columns, doubts } = guessColumns(
    columnNames.map((name) => (taken.has(name) ? '' : name)),
    (index) => numbersIn(columnOf(index), decimalMark),
    guessed?.stepMin ?? 60,
  );
  const made = { encoding, delimiter, quote: '"' as const, decimalMark, hasHeader, skipLines };
  return {
    ok: true,
    mapping: { version: 1, ...made, clock, time, missing: usualMissing, columns },
    columnNames,
    doubts: [doubtedClock, ...(guessed?.doubts ?? [noTime]), ...(columns.length === 0 ? [noHeads] : []), ...doubts],
  };
}
