import { utcOffsetMin } from '@/lib/time/format';

const MS_PER_MIN = 60_000;

/** An instant as a `datetime-local` field wants it, on the agency's clock: `2026-12-01T04:10`. */
export function toLocalField(at: number, zone: string): string {
  return new Date(at + utcOffsetMin(at, zone) * MS_PER_MIN).toISOString().slice(0, 16);
}

/**
 * What was typed on the agency's clock as an instant, ms since 1970; null when it is no time. In the hour that the
 * autumn change repeats it is the first of the two.
 */
export function fromLocalField(text: string, zone: string): number | null {
  const asUtc = Date.parse(`${text}Z`);
  if (Number.isNaN(asUtc)) return null;
  const guess = asUtc - utcOffsetMin(asUtc, zone) * MS_PER_MIN;
  const earlier = asUtc - utcOffsetMin(guess - 3_600_000, zone) * MS_PER_MIN;
  const isEarlierTrue = earlier + utcOffsetMin(earlier, zone) * MS_PER_MIN === asUtc;
  return isEarlierTrue ? Math.min(earlier, guess) : guess;
}
