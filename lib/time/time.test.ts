import { describe, expect, it } from 'vitest';
import {
  formatDate,
  formatDateTime,
  formatDayTime,
  formatTime,
  formatUtcOffset,
  isKnownZone,
  relativeInWords,
  spanInWords,
  utcOffsetMin,
} from './format';
import { covers, endOf, hourTicks, indexAt, snapTo, stepAxis, timeAt } from './step-axis';

const at = Date.UTC(2026, 11, 1, 3, 10);

describe('times in the agency zone', () => {
  it('03:10 UTC is 04:10 in Oslo and 23:40 the day before in St John’s', () => {
    expect(formatTime(at, 'Europe/Oslo')).toBe('04:10');
    expect(formatDayTime(at, 'Europe/Oslo')).toBe('Tue 04:10');
    expect(formatDayTime(at, 'America/St_Johns')).toBe('Mon 23:40');
    expect(formatDate(at, 'America/St_Johns')).toBe('Mon 30 Nov 2026');
    expect(formatDateTime(new Date(at), 'Europe/Oslo')).toBe('Tue 1 Dec 04:10');
  });

  it('midnight is 00:00, never 24:00', () => {
    expect(formatTime(Date.UTC(2026, 0, 5, 23), 'Europe/Oslo')).toBe('00:00');
  });

  it('an offset is shown with its minutes only where it has some', () => {
    expect(formatUtcOffset(at, 'Europe/Oslo')).toBe('UTC+1');
    expect(formatUtcOffset(Date.UTC(2026, 6, 1), 'Europe/Oslo')).toBe('UTC+2');
    expect(formatUtcOffset(at, 'America/St_Johns')).toBe('UTC\u22123:30');
    expect(formatUtcOffset(at, 'UTC')).toBe('UTC');
    expect(utcOffsetMin(at, 'America/St_Johns')).toBe(-210);
  });

  it('knows a zone from a word', () => {
    expect(isKnownZone('Europe/Oslo')).toBe(true);
    expect(isKnownZone('Skerrow/Brannoch')).toBe(false);
    expect(() => formatTime(at, 'Skerrow/Brannoch')).toThrow(RangeError);
  });

  it('says spans as people do', () => {
    expect(spanInWords(35)).toBe('35 min');
    expect(spanInWords(120)).toBe('2 h');
    expect(spanInWords(80.4)).toBe('1 h 20 min');
    expect(() => spanInWords(Infinity)).toThrow(RangeError);
    expect(relativeInWords(at - 12 * 60_000, at)).toBe('12 min ago');
    expect(relativeInWords(at + 90 * 60_000, at)).toBe('in 1 h 30 min');
    expect(relativeInWords(at + 20_000, at)).toBe('now');
  });
});

describe('a step axis', () => {
  const axis = stepAxis({ fromAt: at + 60_000, untilAt: at + 61 * 60_000, stepMin: 10 });

  it('rounds its ends outwards to whole steps', () => {
    expect(axis).toEqual({ startAt: at, stepMin: 10, count: 8 });
    expect(endOf(axis)).toBe(at + 70 * 60_000);
  });

  it('finds the nearest step and stays inside', () => {
    expect(indexAt(axis, at + 14 * 60_000)).toBe(1);
    expect(indexAt(axis, at - 1e9)).toBe(0);
    expect(indexAt(axis, at + 1e9)).toBe(7);
    expect(snapTo(axis, at + 16 * 60_000)).toBe(timeAt(axis, 2));
    expect(covers(axis, at - 1)).toBe(false);
    expect(covers(axis, at)).toBe(true);
  });

  it('refuses a step of nothing and an end before the start', () => {
    expect(() => stepAxis({ fromAt: 0, untilAt: 1, stepMin: 0 })).toThrow(RangeError);
    expect(() => stepAxis({ fromAt: 1e9, untilAt: 0, stepMin: 10 })).toThrow(RangeError);
  });
});

describe('hour ticks', () => {
  it('thin out on a narrow line', () => {
    const line = { fromAt: at, untilAt: at + 18 * 3_600_000, zone: 'Europe/Oslo', minGapPx: 60 };
    expect(hourTicks({ ...line, widthPx: 1200 })).toHaveLength(18);
    expect(hourTicks({ ...line, widthPx: 300 }).map((tick) => formatTime(tick, 'Europe/Oslo'))).toEqual([
      '06:00',
      '12:00',
      '18:00',
    ]);
  });

  it('stay on whole local hours in a half-hour zone', () => {
    const ticks = hourTicks({
      fromAt: at,
      untilAt: at + 4 * 3_600_000,
      zone: 'America/St_Johns',
      widthPx: 400,
      minGapPx: 40,
    });
    expect(ticks.map((tick) => formatTime(tick, 'America/St_Johns'))).toEqual(['00:00', '01:00', '02:00', '03:00']);
  });
});
