import { compileLayout } from './date-layout';
import { type Doubt } from './guess-columns';
import { type TimeLayout } from './mapping';

export interface TimeGuess {
  time: TimeLayout;
  /** usual minutes between rows */
  stepMin: number;
  doubts: Doubt[];
}

const dates = [
  'yyyy-MM-dd',
  'dd.MM.yyyy',
  'MM/dd/yyyy',
  'dd/MM/yyyy',
  'yyyy/MM/dd',
  'dd-MM-yyyy',
  'dd.MM.yy',
  'MM/dd/yy',
  'dd/MM/yy',
  'yyyyMMdd',
];
const times = ['HH:mm:ss', 'HH:mm', 'hh:mm:ss a', 'hh:mm a', 'HHmm', 'HH'];
const whole = [
  'iso',
  ...dates.flatMap((date) => times.map((time) => `${date} ${time}`)),
  'yyyyMMddHHmm',
  'epoch-s',
  'epoch-ms',
];
const MINUTE_MS = 60_000;

type ColumnOf = (index: number) => string[];

/** Nine rows in ten have to fit, and in a short sample all but one: a single bad row must not hide the column of the time. */
const enoughOf = (rows: number) => (rows < 5 ? rows * 0.9 : Math.min(rows * 0.9, rows - 1));

/** The wall times of a pattern, or null when it does not read nearly all of the texts. */
function wallTimes(pattern: string, texts: readonly string[]): number[] | null {
  const compiled = compileLayout(pattern);
  if (!compiled.ok || texts.length === 0) return null;
  const read = texts.map((text) => compiled.layout.read(text.trim())?.wallMs).filter((ms) => ms !== undefined);
  if (read.length < enoughOf(texts.length)) return null;
  // Ten digits are seconds of our time; an eight-digit date is no epoch.
  if (pattern.startsWith('epoch') && read.some((ms) => ms < 6e11 || ms > 4.2e12)) return null;
  return read;
}

const spanOf = (ms: readonly number[]) =>
  ms.slice(1).reduce((sum, each, index) => sum + Math.abs(each - (ms[index] ?? each)), 0);

/** Of the patterns that read everything, the one whose rows lie closest together: 05/01 after 04/01 tells day from month. */
function bestPattern(
  patterns: readonly string[],
  texts: readonly string[],
): { pattern: string; ms: number[]; isSure: boolean } | null {
  const fitting = patterns.flatMap((pattern) => {
    const ms = wallTimes(pattern, texts);
    return ms ? [{ pattern, ms, span: spanOf(ms) }] : [];
  });
  fitting.sort((a, b) => a.span - b.span);
  const [best, next] = fitting;
  if (!best) return null;
  return { ...best, isSure: !next || next.span > best.span };
}

/** The middle of the steps between rows, minutes; an hour when there are too few rows to tell. */
function stepMinOf(ms: readonly number[]): number {
  const steps = ms.slice(1).map((each, index) => Math.abs(each - (ms[index] ?? each)) / MINUTE_MS);
  const sorted = steps.filter((step) => step > 0).sort((a, b) => a - b);
  return Math.min(1440, Math.max(1, Math.round(sorted[Math.floor(sorted.length / 2)] ?? 60)));
}

const partHeads = {
  year: /^(year|yr|jahr|yyyy)$/i,
  month: /^(month|mon|mo|monat|mm)$/i,
  day: /^(day|dy|tag|dd)$/i,
  hour: /^(hour|hr|h|stunde|std|hh)$/i,
  minute: /^(minute|min|mi)$/i,
};

function guessParts(names: readonly string[], columnOf: ColumnOf): TimeGuess | null {
  const find = (head: RegExp) => names.findIndex((name) => head.test(name.trim()));
  const [year, month, day, hour, minute] = [
    partHeads.year,
    partHeads.month,
    partHeads.day,
    partHeads.hour,
    partHeads.minute,
  ].map(find) as [number, number, number, number, number];
  if (Math.min(year, month, day, hour) < 0) return null;
  const hours = columnOf(hour).map(Number);
  const days = columnOf(day).map(Number);
  const ends = hours.filter((each, index) => each === 0 && hours[index - 1] === 23 && days[index - 1] === days[index]);
  const name = (index: number) => names[index] ?? '';
  const time: TimeLayout = {
    kind: 'parts',
    yearColumn: name(year),
    monthColumn: name(month),
    dayColumn: name(day),
    hourColumn: name(hour),
    minuteColumn: minute < 0 ? null : name(minute),
    hourZero: ends.length > 0 ? 'ends-day' : 'begins-day',
  };
  const doubts =
    ends.length > 0
      ? [
          {
            part: 'time',
            sentence: 'Hour 0 stands at the end of its day in this file: it is read as the midnight after.',
          },
        ]
      : [];
  const minutes = minute < 0 ? hours.map(() => 0) : columnOf(minute).map(Number);
  const ms = hours.map((each, index) => ((days[index] ?? 0) * 1440 + each * 60 + (minutes[index] ?? 0)) * MINUTE_MS);
  return { time, stepMin: stepMinOf(ms), doubts };
}

/** Heads of a column that can be a clock by its bare numbers; any other must write its times with a colon. */
const clockHead = /time|zeit|uhr|clock|hour|stunde|^(h|hh|hhmm|std)$/i;
const timeHead = /time|date|datum|zeit|stamp|^ts$|utc|valid/i;

function doubtOf(isSure: boolean, pattern: string): Doubt[] {
  return isSure
    ? []
    : [{ part: 'time', sentence: `Day and month cannot be told apart in these rows: ${pattern} is taken.` }];
}

function guessTwo(names: readonly string[], columnOf: ColumnOf): TimeGuess | null {
  const first = Math.min(6, names.length);
  for (let date = 0; date < first; date += 1) {
    for (let time = 0; time < first; time += 1) {
      if (time === date || !timeHead.test(`${names[date]}${names[time]}`)) continue;
      const dateTexts = columnOf(date);
      if (
        !dates.some((pattern) =>
          wallTimes(
            `${pattern} HH`,
            dateTexts.map((text) => `${text} 00`),
          ),
        )
      )
        continue;
      const timeTexts = columnOf(time);
      const hasClockHead = clockHead.test((names[time] ?? '').trim());
      const texts = dateTexts.map((text, index) => `${text.trim()} ${(timeTexts[index] ?? '').trim()}`);
      const best = bestPattern(
        whole.filter((pattern) => pattern.includes(' ') && (hasClockHead || pattern.includes(':'))),
        texts,
      );
      if (!best) continue;
      const datePattern = best.pattern.slice(0, best.pattern.indexOf(' '));
      const timePattern = best.pattern.slice(best.pattern.indexOf(' ') + 1);
      const layout = { dateColumn: names[date] ?? '', datePattern, timeColumn: names[time] ?? '', timePattern };
      return {
        time: { kind: 'two', ...layout },
        stepMin: stepMinOf(best.ms),
        doubts: doubtOf(best.isSure, datePattern),
      };
    }
  }
  return null;
}

function guessOne(names: readonly string[], columnOf: ColumnOf): TimeGuess | null {
  const order = names
    .map((_, index) => index)
    .sort((a, b) => Number(timeHead.test(names[b] ?? '')) - Number(timeHead.test(names[a] ?? '')) || a - b);
  for (const index of order) {
    const best = bestPattern(whole, columnOf(index));
    if (best) {
      const time: TimeLayout = { kind: 'one', column: names[index] ?? '', pattern: best.pattern };
      return { time, stepMin: stepMinOf(best.ms), doubts: doubtOf(best.isSure, best.pattern) };
    }
  }
  return null;
}

/** How the rows say their time, by heads and by trying layouts on the cells; null when nothing fits. */
export function guessTime(names: readonly string[], columnOf: ColumnOf): TimeGuess | null {
  return guessParts(names, columnOf) ?? guessOne(names, columnOf) ?? guessTwo(names, columnOf);
}
