/** An instant: a `Date`, or milliseconds since 1970-01-01T00:00Z. */
export type Instant = Date | number;

const formatters = new Map<string, Intl.DateTimeFormat>();

function formatter(zone: string, options: Intl.DateTimeFormatOptions): Intl.DateTimeFormat {
  const key = `${zone} ${Object.values(options).join()}`;
  const known = formatters.get(key);
  if (known) return known;
  const made = new Intl.DateTimeFormat('en-GB', { timeZone: zone, hourCycle: 'h23', ...options });
  formatters.set(key, made);
  return made;
}

function partsOf(at: Instant, zone: string, options: Intl.DateTimeFormatOptions): Record<string, string> {
  const parts = formatter(zone, options).formatToParts(at);
  return Object.fromEntries(parts.map((part) => [part.type, part.value]));
}

const clock = { hour: '2-digit', minute: '2-digit' } as const;
const dayClock = { weekday: 'short', ...clock } as const;
const fullDay = { weekday: 'short', day: 'numeric', month: 'short', year: 'numeric' } as const;

/**
 * The wall clock of an instant in an IANA zone, 24 hours: 2026-12-01T03:10Z in `Europe/Oslo` is `04:10`.
 * An unknown zone or an invalid date throws RangeError.
 */
export function formatTime(at: Instant, zone: string): string {
  return formatter(zone, clock).format(at);
}

/** Short weekday and wall clock: `Tue 04:10`. */
export function formatDayTime(at: Instant, zone: string): string {
  const { weekday, hour, minute } = partsOf(at, zone, dayClock);
  return `${weekday} ${hour}:${minute}`;
}

/** The agency's date of an instant: `Tue 1 Dec 2026`. */
export function formatDate(at: Instant, zone: string): string {
  const { weekday, day, month, year } = partsOf(at, zone, fullDay);
  return `${weekday} ${day} ${month} ${year}`;
}

/** Date and wall clock, without the year: `Tue 1 Dec 04:10`. */
export function formatDateTime(at: Instant, zone: string): string {
  const { weekday, day, month } = partsOf(at, zone, fullDay);
  return `${weekday} ${day} ${month} ${formatTime(at, zone)}`;
}

/** Minutes that a zone is ahead of UTC at an instant: 60 for `Europe/Oslo` in winter, −210 for `America/St_Johns`. */
export function utcOffsetMin(at: Instant, zone: string): number {
  const { timeZoneName = '' } = partsOf(at, zone, { timeZoneName: 'longOffset' });
  const [, sign, hours, minutes] = /GMT([+-])(\d\d):(\d\d)/.exec(timeZoneName) ?? [];
  if (!sign) return 0;
  return (sign === '-' ? -1 : 1) * (Number(hours) * 60 + Number(minutes));
}

/** The offset from UTC in words, where it matters which zone a time is in: `UTC+1`, `UTC−3:30`, `UTC`. */
export function formatUtcOffset(at: Instant, zone: string): string {
  const offsetMin = utcOffsetMin(at, zone);
  if (offsetMin === 0) return 'UTC';
  const absolute = Math.abs(offsetMin);
  const minutes = absolute % 60;
  const tail = minutes === 0 ? '' : `:${String(minutes).padStart(2, '0')}`;
  return `UTC${offsetMin < 0 ? '\u2212' : '+'}${Math.floor(absolute / 60)}${tail}`;
}

/** True for a zone that this machine knows by its IANA name. */
export function isKnownZone(zone: string): boolean {
  try {
    formatter(zone, clock);
    return true;
  } catch {
    return false;
  }
}

/**
 * A span of minutes as one says it: `35 min`, `1 h 20 min`, `2 h`. Rounded to the minute; the sign is left out.
 * Not finite throws RangeError.
 */
export function spanInWords(minutes: number): string {
  if (!Number.isFinite(minutes)) throw new RangeError(`A span must be finite, not ${minutes}`);
  const whole = Math.round(Math.abs(minutes));
  const hours = Math.floor(whole / 60);
  const rest = whole % 60;
  if (hours === 0) return `${rest} min`;
  return rest === 0 ? `${hours} h` : `${hours} h ${rest} min`;
}

/** An instant against another, as one says it: `12 min ago`, `in 1 h 30 min`, `now` within half a minute. */
export function relativeInWords(at: Instant, nowAt: Instant): string {
  const minutes = (Number(at) - Number(nowAt)) / 60_000;
  if (Math.abs(minutes) < 0.5) return 'now';
  return minutes < 0 ? `${spanInWords(minutes)} ago` : `in ${spanInWords(minutes)}`;
}
