/**
 * A wall-clock time in a file, as if it were UTC: milliseconds since 1970-01-01T00:00 on that wall. `offsetMin` is set
 * when the text itself names its offset from UTC.
 */
export interface WallTime {
  readonly wallMs: number;
  readonly offsetMin: number | null;
}

export interface DateLayout {
  readonly pattern: string;
  /** null when the text does not follow the pattern or names a day or hour that does not exist */
  readonly read: (text: string) => WallTime | null;
}

export type CompiledLayout = { ok: true; layout: DateLayout } | { ok: false; reason: string };

const DAY_MS = 86_400_000;
const MINUTE_MS = 60_000;

const tokens: Readonly<Record<string, string>> = {
  yyyy: '(?<year>\\d{4})',
  yy: '(?<year>\\d{2})',
  MM: '(?<month>\\d{1,2})',
  M: '(?<month>\\d{1,2})',
  dd: '(?<day>\\d{1,2})',
  d: '(?<day>\\d{1,2})',
  HH: '(?<hour>\\d{1,2})',
  H: '(?<hour>\\d{1,2})',
  hh: '(?<hour>\\d{1,2})',
  h: '(?<hour>\\d{1,2})',
  mm: '(?<minute>\\d{2})',
  ss: '(?<second>\\d{2}(?:\\.\\d+)?)',
  a: '(?<half>[AaPp])\\.?[Mm]\\.?',
};

const iso =
  '(?<year>\\d{4})-(?<month>\\d{2})-(?<day>\\d{2})(?:[T ](?<hour>\\d{2})(?::?(?<minute>\\d{2}))?(?::?(?<second>\\d{2}(?:[.,]\\d+)?))?)?\\s*(?<offset>Z|UTC|[+-]\\d{2}(?::?\\d{2})?)?';

const daysInMonth = (year: number, month: number) => new Date(Date.UTC(year, month, 0)).getUTCDate();

/**
 * A date and time of day as a wall clock tells it, in ms as if it were UTC; null for a day or time that no calendar has.
 * Hour 24 is midnight at the end of the day. 2010, 3, 28, 24, 0 is the wall time 2010-03-29T00:00.
 */
export function wallMsOf(year: number, month: number, day: number, dayMs: number): number | null {
  if (!(month >= 1 && month <= 12 && day >= 1 && day <= 31 && dayMs >= 0 && dayMs <= DAY_MS)) return null;
  if (day > 28 && day > daysInMonth(year, month)) return null;
  return Date.UTC(year, month - 1, day) + dayMs;
}

/** The offset of `Z`, `UTC`, `+01`, `-0330` or `+01:00`, minutes. */
function offsetMinOf(text: string): number {
  if (text === 'Z' || text === 'UTC') return 0;
  const hours = Number(text.slice(1, 3));
  const minutes = Number(text.slice(3).replace(':', '') || 0);
  return (text.startsWith('-') ? -1 : 1) * (hours * 60 + minutes);
}

/** Two-digit years are of 1970 to 2069. */
const fullYear = (text: string) =>
  text.length === 2 ? Number(text) + (Number(text) < 70 ? 2000 : 1900) : Number(text);

function hourOf(text: string, half: string | undefined): number {
  const hour = Number(text);
  if (half === undefined) return hour;
  if (hour < 1 || hour > 12) return Number.NaN;
  return (hour % 12) + (half.toLowerCase() === 'p' ? 12 : 0);
}

function readParts(parts: Record<string, string | undefined>): WallTime | null {
  const { year = '', month = '', day = '', hour = '0', minute = '0', second = '0', half, offset } = parts;
  const minutes = Number(minute);
  const seconds = Number(second.replace(',', '.'));
  if (minutes > 59 || seconds >= 61) return null;
  const dayMs = (hourOf(hour, half) * 60 + minutes) * MINUTE_MS + Math.round(seconds * 1000);
  const wallMs = wallMsOf(fullYear(year), Number(month), Number(day), dayMs);
  return wallMs === null ? null : { wallMs, offsetMin: offset ? offsetMinOf(offset) : null };
}

const epoch = (pattern: string, msPerUnit: number): DateLayout => ({
  pattern,
  read: (text) => {
    const value = /^\d{1,14}(\.\d+)?$/.test(text) ? Number(text) * msPerUnit : Number.NaN;
    // 0 in an epoch means missing, not 1970.
    return value > 0 ? { wallMs: Math.round(value), offsetMin: 0 } : null;
  },
});

function sourceOf(pattern: string): string | null {
  if (pattern === 'iso') return iso;
  let source = '';
  for (const [part] of pattern.matchAll(/yyyy|yy|MM|M|dd|d|HH|H|hh|h|mm|ss|a|[^A-Za-z]|[A-Za-z]/g)) {
    const token = tokens[part];
    if (token) source += token;
    else if (part === 'T') source += 'T';
    else if (/[A-Za-z]/.test(part)) return null;
    else source += part === ' ' ? '\\s+' : part.replace(/[.*+?^${}()|[\]\\/]/, '\\$&');
  }
  return source;
}

/**
 * Makes a reader of a pattern of `yyyy yy MM M dd d HH H hh h mm ss a` and literal marks, or of `iso`, `epoch-s`,
 * `epoch-ms`. `dd.MM.yyyy HH:mm` reads `05.01.2010 06:30`. A pattern needs year, month, day and an hour.
 */
export function compileLayout(pattern: string): CompiledLayout {
  if (pattern === 'epoch-s') return { ok: true, layout: epoch(pattern, 1000) };
  if (pattern === 'epoch-ms') return { ok: true, layout: epoch(pattern, 1) };
  const source = sourceOf(pattern);
  if (source === null) return { ok: false, reason: `“${pattern}” has a letter that is no part of a time.` };
  const lacking = ['year', 'month', 'day', 'hour'].filter((part) => !source.includes(`<${part}>`));
  if (lacking.length > 0) return { ok: false, reason: `“${pattern}” says no ${lacking.join(' and no ')}.` };
  let expression: RegExp;
  try {
    expression = new RegExp(`^${source}$`);
  } catch {
    return { ok: false, reason: `“${pattern}” names a part of the time twice.` };
  }
  return {
    ok: true,
    layout: {
      pattern,
      read: (text) => {
        const groups = expression.exec(text)?.groups;
        return groups ? readParts(groups) : null;
      },
    },
  };
}
