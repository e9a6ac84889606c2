import { decodeHead } from './bytes';
import { createChecker, type Flags } from './checks';
import { columnNamesOf, type Mapping } from './mapping';
import { openRowReader, type PartialReading } from './read-row';
import { createRowSplitter } from './text-rows';

export interface PreviewRow {
  line: number;
  cells: readonly string[];
  result:
    | { ok: true; readings: { reading: PartialReading; flags: Flags | null }[] }
    | { ok: false; column: string; reason: string };
}

export interface Preview {
  columnNames: string[];
  /** columns the mapping asks for and the file has not */
  lacking: string[];
  rows: PreviewRow[];
  /** of all rows that were looked at */
  goodCount: number;
  badCount: number;
  /** the first bad row, when it is not among `rows` */
  firstBad: PreviewRow | null;
  /** why the lines cannot be parted */
  fault: string | null;
}

interface Wanted {
  bytes: Uint8Array;
  isWhole: boolean;
  nowMs: number;
  rowCount: number;
}

/** Reads the first bytes of a file as a mapping says: the first rows as they will be understood, and how many are good. */
export function previewFile(mapping: Mapping, { bytes, isWhole, nowMs, rowCount }: Wanted): Preview {
  const preview: Preview = {
    columnNames: [],
    lacking: [],
    rows: [],
    goodCount: 0,
    badCount: 0,
    firstBad: null,
    fault: null,
  };
  const checker = createChecker(
    mapping.columns.map(({ quantity }) => quantity),
    nowMs,
  );
  let opened: ReturnType<typeof openRowReader> | null = null;
  const splitter = createRowSplitter(mapping, (cells, line) => {
    if (!opened) {
      preview.columnNames = columnNamesOf(cells, mapping.hasHeader);
      opened = openRowReader(mapping, preview.columnNames, nowMs);
      if (!opened.ok) preview.lacking = opened.lacking;
      if (mapping.hasHeader) return;
    }
    if (!opened.ok) return;
    const read = opened.reader.read(cells);
    const result = read.ok
      ? { ok: true as const, readings: read.readings.map((reading) => ({ reading, flags: checker.check(reading) })) }
      : read;
    const row = { line, cells, result };
    if (result.ok) preview.goodCount += 1;
    else preview.badCount += 1;
    if (preview.rows.length < rowCount) preview.rows.push(row);
    else if (!result.ok && preview.badCount === 1) preview.firstBad = row;
  });
  const pushed = splitter.push(decodeHead(bytes, mapping.encoding, isWhole));
  const ended = pushed.ok ? splitter.end() : pushed;
  if (!ended.ok && isWhole) preview.fault = ended.reason;
  return preview;
}
