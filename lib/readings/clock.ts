import { utcOffsetMin } from '@/lib/time/format';
import { type Clock } from './mapping';

export type Resolved = { ok: true; atMs: number; isGuessed: boolean } | { ok: false; reason: 'skipped-by-the-clocks' };

/** Turns wall times of one clock into instants, row after row: it remembers the last to tell a repeated hour apart. */
export interface ClockReader {
  readonly clock: Clock;
  readonly toInstant: (wallMs: number) => Resolved;
}

const DAY_MS = 86_400_000;
const MINUTE_MS = 60_000;
const NEAR_MS = 3 * 3_600_000;

/**
 * A reader of a fixed offset or an IANA zone. A wall time that the zone skips in spring is refused. One that comes
 * twice in autumn is taken by the order of the rows: the first pass, unless the row before already was at or beyond it;
 * with no row within three hours to tell, the first is taken and `isGuessed` says so.
 * In `America/Toronto` 2009-11-01 01:00 after 00:00 is 05:00Z, and the next 01:00 is 06:00Z.
 */
export function createClockReader(clock: Clock): ClockReader {
  if (clock.kind === 'offset') {
    const shiftMs = clock.offsetMin * MINUTE_MS;
    return { clock, toInstant: (wallMs) => ({ ok: true, atMs: wallMs - shiftMs, isGuessed: false }) };
  }
  const { zone } = clock;
  let day = Number.NaN;
  let dayOffsetMs: number | null = null;
  let lastMs = Number.NaN;
  let isBackward = false;
  const remember = (atMs: number, isGuessed = false): Resolved => {
    if (atMs !== lastMs) isBackward = atMs < lastMs;
    lastMs = atMs;
    return { ok: true, atMs, isGuessed };
  };
  return {
    clock,
    toInstant: (wallMs) => {
      const wallDay = Math.floor(wallMs / DAY_MS);
      if (wallDay !== day) {
        day = wallDay;
        dayOffsetMs = steadyOffsetMs(wallDay, zone);
      }
      if (dayOffsetMs !== null) return remember(wallMs - dayOffsetMs);
      const [first, second] = candidatesMs(wallMs, zone);
      if (first === undefined) return { ok: false, reason: 'skipped-by-the-clocks' };
      if (second === undefined) return remember(first);
      const isTold = Math.abs(lastMs - first) <= NEAR_MS;
      if (!isTold) return remember(first, true);
      if (isBackward) return remember(lastMs <= second ? first : second);
      return remember(lastMs >= first ? second : first);
    },
  };
}

/** The offset of a wall-clock day on which it does not change; null on the two days of the year when it does. */
function steadyOffsetMs(wallDay: number, zone: string): number | null {
  const offsetMs = (atMs: number) => utcOffsetMin(atMs, zone) * MINUTE_MS;
  const before = offsetMs((wallDay - 1) * DAY_MS);
  const after = offsetMs((wallDay + 2) * DAY_MS);
  if (before === after) return before;
  const first = offsetMs(wallDay * DAY_MS - Math.max(before, after));
  const last = offsetMs((wallDay + 1) * DAY_MS - Math.min(before, after));
  return first === last ? first : null;
}

/** The instants at which the wall showed this time, earlier first: none, one or two. */
function candidatesMs(wallMs: number, zone: string): number[] {
  const offsets = new Set([utcOffsetMin(wallMs - DAY_MS, zone), utcOffsetMin(wallMs + DAY_MS, zone)]);
  return [...offsets]
    .map((offsetMin) => ({ offsetMin, atMs: wallMs - offsetMin * MINUTE_MS }))
    .filter(({ offsetMin, atMs }) => utcOffsetMin(atMs, zone) === offsetMin)
    .map(({ atMs }) => atMs)
    .sort((a, b) => a - b);
}
