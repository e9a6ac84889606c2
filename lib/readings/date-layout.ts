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

type Part = 'year' | 'month' | 'day' | 'hour' | 'minute' | 'second' | 'half' | 'offset';

interface Token {
  part: Part;
  source: string;
}

const tokens: Readonly<Record<string, Token>> = {
  yyyy: { part: 'year', source: '(\\d{4})' },
  yy: { part: 'year', source: '(\\d{2})' },
  MM: { part: 'month', source: '(\\d{1,2})' },
  M: { part: 'month', source: '(\\d{1,2})' },
  dd: { part: 'day', source: '(\\d{1,2})' },
  d: { part: 'day', source: '(\\d{1,2})' },
  HH: { part: 'hour', source: '(\\d{1,2})' },
  H: { part: 'hour', source: '(\\d{1,2})' },
  hh: { part: 'hour', source: '(\\d{1,2})' },
  h: { part: 'hour', source: '(\\d{1,2})' },
  mm: { part: 'minute', source: '(\\d{2})' },
  ss: { part: 'second', source: '(\\d{2}(?:\\.\\d+)?)' },
  a: { part: 'half', source: '([AaPp])\\.?[Mm]\\.?' },
};

const iso: Compiled = {
  source:
    '(\\d{4})-(\\d{2})-(\\d{2})(?:[T ](\\d{2})(?::?(\\d{2}))?(?::?(\\d{2}(?:[.,]\\d+)?))?)?\\s*(Z|UTC|[+-]\\d{2}(?::?\\d{2})?)?',
  parts: ['year', 'month', 'day', 'hour', 'minute', 'second', 'offset'],
};

interface Compiled {
  source: string;
  /** what each group of the expression is */
  parts: Part[];
}

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

/** Where in the match each part stands; 0 where the pattern has none. */
type Places = Record<Part, number>;

function readMatch(match: RegExpExecArray, places: Places): WallTime | null {
  const minutes = places.minute === 0 ? 0 : Number(match[places.minute] ?? 0);
  const seconds = places.second === 0 ? 0 : Number((match[places.second] ?? '0').replace(',', '.'));
  if (minutes > 59 || seconds >= 61) return null;
  const half = places.half === 0 ? undefined : match[places.half];
  const hour = hourOf(match[places.hour] ?? '0', half);
  const dayMs = (hour * 60 + minutes) * MINUTE_MS + Math.round(seconds * 1000);
  const year = fullYear(match[places.year] ?? '');
  const wallMs = wallMsOf(year, Number(match[places.month]), Number(match[places.day]), dayMs);
  if (wallMs === null) return null;
  const offset = places.offset === 0 ? undefined : match[places.offset];
  return { wallMs, offsetMin: offset ? offsetMinOf(offset) : null };
}

const epoch = (pattern: string, msPerUnit: number): DateLayout => ({
  pattern,
  read: (text) => {
    const value = /^\d{1,14}(\.\d+)?$/.test(text) ? Number(text) * msPerUnit : Number.NaN;
    // 0 in an epoch means missing, not 1970.
    return value > 0 ? { wallMs: Math.round(value), offsetMin: 0 } : null;
  },
});

function compile(pattern: string): Compiled | null {
  if (pattern === 'iso') return iso;
  const compiled: Compiled = { source: '', parts: [] };
  for (const [letters] of pattern.matchAll(/yyyy|yy|MM|M|dd|d|HH|H|hh|h|mm|ss|a|[^A-Za-z]|[A-Za-z]/g)) {
    const token = tokens[letters];
    if (token) {
      compiled.source += token.source;
      compiled.parts.push(token.part);
    } else if (/[A-SU-Za-z]/.test(letters)) return null;
    else compiled.source += letters === ' ' ? '\\s+' : letters.replace(/[.*+?^${}()|[\]\\/]/, '\\$&');
  }
  return compiled;
}

/**
 * Makes a reader of a pattern of `yyyy yy MM M dd d HH H hh h mm ss a` and literal marks, or of `iso`, `epoch-s`,
 * `epoch-ms`. `dd.MM.yyyy HH:mm` reads `05.01.2010 06:30`. A pattern needs year, month, day and an hour.
 */
export function compileLayout(pattern: string): CompiledLayout {
  if (pattern === 'epoch-s') return { ok: true, layout: epoch(pattern, 1000) };
  if (pattern === 'epoch-ms') return { ok: true, layout: epoch(pattern, 1) };
  const compiled = compile(pattern);
  if (compiled === null) return { ok: false, reason: `“${pattern}” has a letter that is no part of a time.` };
  const { source, parts } = compiled;
  const needed: readonly Part[] = ['year', 'month', 'day', 'hour'];
  const lacking = needed.filter((part) => !parts.includes(part));
  if (lacking.length > 0) return { ok: false, reason: `“${pattern}” says no ${lacking.join(' and no ')}.` };
  if (new Set(parts).size < parts.length) {
    return { ok: false, reason: `“${pattern}” names a part of the time twice.` };
  }
  const expression = new RegExp(`^${source}$`);
  const at = (part: Part) => parts.indexOf(part) + 1;
  const places: Places = {
    year: at('year'),
    month: at('month'),
    day: at('day'),
    hour: at('hour'),
    minute: at('minute'),
    second: at('second'),
    half: at('half'),
    offset: at('offset'),
  };
  const read = (text: string) => {
    const match = expression.exec(text);
    return match && readMatch(match, places);
  };
  return { ok: true, layout: { pattern, read } };
}
