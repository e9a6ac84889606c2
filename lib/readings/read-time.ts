import { compileLayout, wallMsOf, type WallTime } from './date-layout';
import { type TimeLayout } from './mapping';

export type TimeReading = { ok: true; time: WallTime } | { ok: false; column: string; reason: string };
export type TimeReader = (cells: readonly string[]) => TimeReading;

type IndexOf = (column: string) => number;

const minuteMs = 60_000;
const hourMs = 3_600_000;
const whole = /^\d{1,4}$/;

function byPattern(column: string, pattern: string, textOf: (cells: readonly string[]) => string): TimeReader {
  const compiled = compileLayout(pattern);
  if (!compiled.ok) throw new RangeError(compiled.reason);
  const { read } = compiled.layout;
  const said = pattern === 'iso' ? 'an ISO time such as 2010-01-05T06:30' : `a time laid out as ${pattern}`;
  return (cells) => {
    const text = textOf(cells);
    const time = read(text);
    if (time) return { ok: true, time };
    return { ok: false, column, reason: text === '' ? 'The time is empty.' : `“${text.slice(0, 40)}” is not ${said}.` };
  };
}

function byParts(layout: TimeLayout & { kind: 'parts' }, indexOf: IndexOf): TimeReader {
  const { yearColumn, monthColumn, dayColumn, hourColumn, minuteColumn } = layout;
  const columns = [yearColumn, monthColumn, dayColumn, hourColumn, ...(minuteColumn ? [minuteColumn] : [])];
  const indices = columns.map(indexOf);
  const endsDay = layout.hourZero === 'ends-day';
  return (cells) => {
    const parts = [0, 0, 0, 0, 0];
    for (let each = 0; each < indices.length; each += 1) {
      const text = (cells[indices[each] ?? -1] ?? '').trim();
      if (!whole.test(text)) return { ok: false, column: columns[each] ?? '', reason: notWhole(text) };
      parts[each] = Number(text);
    }
    const [year = 0, month = 0, day = 0, hour = 0, minute = 0] = parts;
    const isEnd = endsDay && hour === 0 && minute === 0;
    const dayMs = isEnd ? 24 * hourMs : hour * hourMs + minute * minuteMs;
    const wallMs = minute > 59 ? null : wallMsOf(year < 100 ? year + 2000 : year, month, day, dayMs);
    if (wallMs !== null) return { ok: true, time: { wallMs, offsetMin: null } };
    const said = `${year}-${month}-${day}, hour ${hour}${minuteColumn ? `, minute ${minute}` : ''}`;
    return { ok: false, column: hourColumn, reason: `There is no time ${said}.` };
  };
}

const notWhole = (text: string) => (text === '' ? 'A part of the time is empty.' : `“${text}” is not a whole number.`);

/** Makes the reader of a row's wall time. Columns must exist: ask `indexOf` first. */
export function createTimeReader(layout: TimeLayout, indexOf: IndexOf): TimeReader {
  if (layout.kind === 'parts') return byParts(layout, indexOf);
  if (layout.kind === 'one') {
    const at = indexOf(layout.column);
    return byPattern(layout.column, layout.pattern, (cells) => (cells[at] ?? '').trim());
  }
  const dateAt = indexOf(layout.dateColumn);
  const timeAt = indexOf(layout.timeColumn);
  return byPattern(layout.dateColumn, `${layout.datePattern} ${layout.timePattern}`, (cells) =>
    `${(cells[dateAt] ?? '').trim()} ${(cells[timeAt] ?? '').trim()}`.trim(),
  );
}
