import Papa from 'papaparse';
import { type Delimiter } from './mapping';

/** A row longer than this is no row: a quotation mark was opened and never closed. Characters. */
export const LONGEST_ROW = 1_000_000;

export type RowSink = (cells: readonly string[], line: number) => void;
export type Pushed = { ok: true } | { ok: false; line: number; reason: string };

export interface RowSplitter {
  /** Text as it comes, cut anywhere; rows are handed on as they become whole. */
  readonly push: (text: string) => Pushed;
  /** No more text comes: the last row needs no line end. */
  readonly end: () => Pushed;
}

interface Parsed {
  data: string[][];
  errors: { code: string; row?: number }[];
  meta: { cursor: number };
}

/**
 * Splits a text of any length into rows of cells with their line numbers (1 is the first line of the file), in constant
 * memory. Quoted cells may hold delimiters and line ends. Blank lines are counted and left out, like the first
 * `skipLines`.
 */
export function createRowSplitter(
  given: { delimiter: Delimiter; quote: string; skipLines: number },
  onRow: RowSink,
): RowSplitter {
  const { delimiter, quote, skipLines } = given;
  let parser: Papa.Parser | null = null;
  let pending = '';
  let line = 1;

  const hand = (cells: string[], hasQuotes: boolean) => {
    const at = line;
    line += 1;
    if (hasQuotes) line += lineEndsIn(cells);
    const isBlank = cells.length === 1 && (cells[0] ?? '').trim() === '';
    if (at > skipLines && !isBlank) onRow(cells, at);
  };

  const run = (isLast: boolean): Pushed => {
    parser ??= parserFor(pending, delimiter, quote);
    const { data, errors, meta } = parser.parse(pending, 0, !isLast) as Parsed;
    const isOpen = isLast && errors.some(({ code }) => code === 'MissingQuotes');
    const rows = isOpen ? data.slice(0, -1) : data;
    const hasQuotes = pending.includes(quote);
    for (const cells of rows) hand(cells, hasQuotes);
    if (isOpen) return neverClosed(line);
    pending = isLast ? '' : pending.slice(meta.cursor);
    return pending.length > LONGEST_ROW ? neverClosed(line) : { ok: true };
  };

  return {
    push: (text) => {
      pending += text;
      // Without a line end there is no row yet, nor a way to tell which line end the file uses.
      if (!parser && !/[\r\n]./s.test(pending) && pending.length < LONGEST_ROW) return { ok: true };
      return run(false);
    },
    end: () => (pending === '' ? { ok: true } : run(true)),
  };
}

const neverClosed = (line: number): Pushed => ({
  ok: false,
  line,
  reason: `A quotation mark on line ${line} is never closed, so the rest of the file cannot be read.`,
});

/** `\n` also parts `\r\n`: the rest is trimmed with the cell. Only a file without any `\n` is parted by `\r`. */
function parserFor(text: string, delimiter: string, quoteChar: string): Papa.Parser {
  const newline = text.includes('\n') ? '\n' : text.includes('\r') ? '\r' : '\n';
  return new Papa.Parser({ delimiter, quoteChar, newline });
}

function lineEndsIn(cells: readonly string[]): number {
  let count = 0;
  for (const cell of cells) {
    for (let at = cell.indexOf('\n'); at >= 0; at = cell.indexOf('\n', at + 1)) count += 1;
  }
  return count;
}
