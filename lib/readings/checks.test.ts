import { describe, expect, it } from 'vitest';
import { createChecker } from './checks';
import { type ReadingQuantity } from './quantities';

const nowMs = Date.UTC(2010, 5, 1);
const startMs = Date.UTC(2010, 0, 5);
const minutes = (count: number) => startMs + count * 60_000;

/** The flags of a series, `stepMin` apart. */
function flagsOf(quantity: ReadingQuantity, values: readonly number[], stepMin = 10) {
  const checker = createChecker([quantity], nowMs);
  return values.map(
    (value, index) =>
      checker.check({ atMs: minutes(index * stepMin), isTimeGuessed: false, values: [value] })?.[quantity]?.join() ??
      '',
  );
}

function flagsTogether(values: Partial<Record<ReadingQuantity, number | string>>) {
  const names = Object.keys(values) as ReadingQuantity[];
  return createChecker(names, nowMs).check({
    atMs: startMs,
    isTimeGuessed: false,
    values: names.map((name) => values[name] ?? null),
  });
}

describe('checks', () => {
  it('a value outside the published range is flagged', () => {
    expect(flagsOf('airTempC', [-60, 20])).toEqual(['range', '']);
    expect(flagsOf('relativeHumidity', [1.04, 1.06])).toEqual(['', 'range']);
    expect(flagsOf('freezingPointC', [-51, 0.1, -5])).toEqual(['range', 'range', '']);
  });

  it('a spike is flagged, its return is not', () => {
    expect(flagsOf('pavementTempC', [-3, -3.1, 12, -3.2, -3.3])).toEqual(['', '', 'step', '', '']);
  });

  it('a lasting change is doubted once', () => {
    expect(flagsOf('airTempC', [-3, 9, 9.1, 9])).toEqual(['', 'step', '', '']);
  });

  it('values more than an hour apart are not compared', () => {
    expect(flagsOf('airTempC', [-10, 5], 61)).toEqual(['', '']);
  });

  it('the same in a file with the newest row first', () => {
    expect(flagsOf('pavementTempC', [-3, 12, -3.2], -10)).toEqual(['', 'step', '']);
  });

  it('a temperature that does not move for 3 h is flagged, but not a road held at 0 °C by ice', () => {
    const still = (value: number) => Array.from({ length: 20 }, () => value);
    expect(flagsOf('pavementTempC', still(-3.2)).indexOf('stuck')).toBe(18);
    expect(flagsOf('pavementTempC', still(0.1))).not.toContain('stuck');
    expect(flagsOf('precipitationMm', still(0))).not.toContain('stuck');
  });

  it('wind at 0 is stuck after 6 h, not after 5', () => {
    expect(flagsOf('windSpeedMPerS', [0, 0, 0, 0, 0, 0, 0, 0], 60)).toEqual(['', '', '', '', '', '', 'stuck', 'stuck']);
  });

  it('a reading from the future is flagged, one from four minutes ahead is not', () => {
    const checker = createChecker(['airTempC'], startMs);
    expect(checker.check({ atMs: minutes(4), isTimeGuessed: false, values: [1] })).toBeNull();
    expect(checker.check({ atMs: minutes(30), isTimeGuessed: false, values: [1] })).toEqual({
      airTempC: ['clock-ahead'],
    });
  });

  it('quantities of one instant are held against each other', () => {
    expect(flagsTogether({ airTempC: -3, dewPointC: -2 })).toEqual({ dewPointC: ['above-air'] });
    expect(flagsTogether({ airTempC: -3, dewPointC: -3 })).toBeNull();
    expect(flagsTogether({ windSpeedMPerS: 8, windGustMPerS: 5 })).toEqual({ windGustMPerS: ['against-wind'] });
    expect(flagsTogether({ airTempC: 5, pavementTempC: -16 })).toEqual({ pavementTempC: ['against-air'] });
    expect(flagsTogether({ pavementTempC: 4, surfaceStatus: 'ice' })).toEqual({ surfaceStatus: ['against-pavement'] });
    expect(flagsTogether({ pavementTempC: 2, surfaceStatus: 'ice' })).toBeNull();
  });
});
