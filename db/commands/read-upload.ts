import { createHash } from 'node:crypto';
import { readingSchema } from '@/lib/contracts/readings';
import { Problem } from '@/lib/problem';
import { READINGS_FILE_BYTES, whyNoText } from '@/lib/readings/bytes';
import { createChecker } from '@/lib/readings/checks';
import { columnNamesOf, type Mapping } from '@/lib/readings/mapping';
import { isWordQuantity } from '@/lib/readings/quantities';
import { FURTHEST_AHEAD_MS, openRowReader, type PartialReading, type RowReader } from '@/lib/readings/read-row';
import { createRowSplitter } from '@/lib/readings/text-rows';
import { CopyRows } from '../copy-rows';
import { type RejectRecord } from '../queries/uploads';

/** Counts of what has been read so far. */
export interface UploadTally {
  bytes: number;
  rowsRead: number;
  rowsEmpty: number;
  rowsFlagged: number;
  rowsBad: number;
  readings: number;
  /** each reading later than the one before, or each earlier: none can be there twice */
  isStrictlyOrdered: boolean;
  /** first milliseconds of the months that readings are in */
  months: Set<number>;
  firstRejects: RejectRecord[];
}

const FIRST_REJECTS = 5;
const LONGEST_RAW = 2000;
const notText = (line: number) =>
  new Problem('unreadable-file', {
    reason: `From line ${line} on the file holds bytes that no table has.`,
    todo: 'Choose a CSV or text file; a workbook has to be saved as CSV first.',
  });

/** Reads an upload piece by piece into rows for the table `incoming`: line, instant, values, flags, reject and raw text. */
export class UploadReader {
  readonly tally: UploadTally = {
    bytes: 0,
    rowsRead: 0,
    rowsEmpty: 0,
    rowsFlagged: 0,
    rowsBad: 0,
    readings: 0,
    isStrictlyOrdered: true,
    months: new Set(),
    firstRejects: [],
  };
  /** known at the end */
  sha256 = '';
  private readonly hash = createHash('sha256');
  private readonly rows = new CopyRows();
  private readonly decoder: TextDecoder;
  private readonly splitter;
  private readonly checker;
  private readonly schema;
  private readonly isWord: readonly boolean[];
  private reader: RowReader | null = null;
  private line = 1;
  private lastMs = Number.NaN;
  private direction = 0;
  private monthFromMs = 0;
  private monthUntilMs = 0;

  constructor(
    private readonly mapping: Mapping,
    /** `hasReadings`: the station has some, so that any row may turn out to say something else than is stored */
    private readonly given: { nowMs: number; hasReadings: boolean },
  ) {
    const { nowMs } = given;
    const measured = mapping.columns.map(({ quantity }) => quantity);
    this.decoder = new TextDecoder(mapping.encoding, { fatal: true });
    this.splitter = createRowSplitter(mapping, (cells, line) => this.take(cells, line));
    this.checker = createChecker(measured, nowMs);
    this.schema = readingSchema(measured, nowMs + FURTHEST_AHEAD_MS);
    this.isWord = measured.map(isWordQuantity);
  }

  /** The rows that have been completed, ready for COPY; null while they are too few to be worth sending. */
  push(piece: Uint8Array): Buffer | null {
    const { tally, mapping } = this;
    const unreadable = tally.bytes === 0 ? whyNoText(piece) : null;
    if (unreadable) throw new Problem('unreadable-file', unreadable);
    tally.bytes += piece.byteLength;
    if (tally.bytes > READINGS_FILE_BYTES) {
      throw new Problem('too-large', { limit: `${READINGS_FILE_BYTES / 1024 / 1024} MB` });
    }
    if (mapping.encoding !== 'utf-16le' && piece.includes(0)) throw notText(this.line);
    this.hash.update(piece);
    this.split(this.splitter.push(this.decode(piece, true)));
    return this.rows.isWorthSending ? this.rows.take() : null;
  }

  /** The rest. Refuses a file in which nothing was to be read. */
  finish(): Buffer {
    if (this.tally.bytes === 0) throw new Problem('unreadable-file', whyNoText(new Uint8Array()) ?? {});
    this.split(this.splitter.push(this.decode(new Uint8Array(), false)));
    this.split(this.splitter.end());
    if (this.tally.rowsRead === 0) {
      throw new Problem('unreadable-file', {
        reason: 'The file has no rows of readings.',
        todo: 'Choose a file with readings in it, or look at how many lines stand before the table.',
      });
    }
    this.sha256 = this.hash.digest('hex');
    return this.rows.finish();
  }

  private decode(piece: Uint8Array, stream: boolean): string {
    try {
      return this.decoder.decode(piece, { stream });
    } catch {
      throw new Problem('unreadable-file', {
        reason: `After line ${this.line} the file is not ${this.mapping.encoding.toUpperCase()}.`,
        todo: 'Choose another encoding for this station’s files (Windows-1252 for older ones), and load it again.',
      });
    }
  }

  private split(pushed: ReturnType<(typeof this.splitter)['push']>): void {
    if (!pushed.ok)
      throw new Problem('unreadable-file', { reason: pushed.reason, todo: 'Mend that line and load the file again.' });
  }

  private take(cells: readonly string[], line: number): void {
    this.line = line;
    if (!this.reader) {
      this.reader = this.open(cells);
      if (this.mapping.hasHeader) return;
    }
    const { tally } = this;
    tally.rowsRead += 1;
    const row = this.reader.read(cells);
    if (!row.ok) return this.reject(cells, { line, columnName: row.column, reason: row.reason });
    if (row.readings.length === 0) tally.rowsEmpty += 1;
    for (const reading of row.readings) {
      const { success, error } = this.schema.safeParse(reading);
      if (!success)
        return this.reject(cells, { line, columnName: '', reason: error.issues[0]?.message ?? 'No reading.' });
    }
    let isFlagged = false;
    for (const reading of row.readings) {
      const flags = this.checker.check(reading);
      if (flags) isFlagged = true;
      this.write(reading, { line, flags: flags && JSON.stringify(flags), cells });
    }
    if (isFlagged) tally.rowsFlagged += 1;
  }

  private open(firstRow: readonly string[]): RowReader {
    const names = columnNamesOf(firstRow, this.mapping.hasHeader);
    const opened = openRowReader(this.mapping, names, this.given.nowMs);
    if (opened.ok) return opened.reader;
    const list = (columns: readonly string[]) => columns.map((column) => `“${column.slice(0, 60)}”`).join(', ');
    throw new Problem('unreadable-file', {
      reason: `The file has no column ${list(opened.lacking)}.`,
      todo:
        names.length === 1
          ? 'Its lines are not parted as this station’s files are: look at the delimiter.'
          : `It has ${list(names.slice(0, 30))}. Say anew how this station’s files are read, or choose another file.`,
    });
  }

  private write(reading: PartialReading, row: { line: number; flags: string | null; cells: readonly string[] }): void {
    const { rows, isWord } = this;
    rows.begin(isWord.length + 6);
    rows.int(row.line);
    rows.instant(reading.atMs);
    for (const value of reading.values) {
      if (value === null) rows.nothing();
      else if (typeof value === 'number') rows.double(value);
      else rows.text(value);
    }
    if (row.flags === null) rows.nothing();
    else rows.text(row.flags);
    rows.nothing();
    rows.nothing();
    // The text of a good row is asked for only when it speaks of a known instant; while all is new and in order, none does.
    this.count(reading.atMs);
    if (this.given.hasReadings || !this.tally.isStrictlyOrdered) rows.text(this.rawOf(row.cells));
    else rows.nothing();
  }

  private count(atMs: number): void {
    this.tally.readings += 1;
    const direction = Math.sign(atMs - this.lastMs);
    if (this.direction === 0) this.direction = direction || 0;
    if (direction === 0 || (direction !== this.direction && !Number.isNaN(direction))) {
      this.tally.isStrictlyOrdered = false;
    }
    this.lastMs = atMs;
    if (atMs >= this.monthFromMs && atMs < this.monthUntilMs) return;
    const at = new Date(atMs);
    this.monthFromMs = Date.UTC(at.getUTCFullYear(), at.getUTCMonth(), 1);
    this.monthUntilMs = Date.UTC(at.getUTCFullYear(), at.getUTCMonth() + 1, 1);
    this.tally.months.add(this.monthFromMs);
  }

  private reject(cells: readonly string[], { line, columnName, reason }: Omit<RejectRecord, 'raw'>): void {
    const { rows, isWord, tally } = this;
    const raw = this.rawOf(cells);
    tally.rowsBad += 1;
    if (tally.firstRejects.length < FIRST_REJECTS) tally.firstRejects.push({ line, columnName, reason, raw });
    rows.begin(isWord.length + 6);
    rows.int(line);
    for (let field = 0; field < isWord.length + 2; field += 1) rows.nothing();
    rows.text(columnName);
    rows.text(reason);
    rows.text(raw);
  }

  private rawOf(cells: readonly string[]): string {
    const raw = cells.join(this.mapping.delimiter).trimEnd();
    return raw.length > LONGEST_RAW ? `${raw.slice(0, LONGEST_RAW)}…` : raw;
  }
}
