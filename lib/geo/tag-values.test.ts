import { describe, expect, it } from 'vitest';
import { readLanes, readSpeed, readWidthM } from './tag-values';

describe('speed tags', () => {
  it.each([
    ['50', 50],
    ['30 mph', 48.28032],
    ['30mph', 48.28032],
    ['80 km/h', 80],
    ['walk', 7],
    ['DE:urban', 50],
    ['DE:rural', 100],
    ['GB:nsl_single', 96.56064],
    ['70;50', 50],
    ['none;120', 120],
  ])('%s is %d km/h', (text, speedKmPerH) => {
    expect(readSpeed(text)).toEqual({ kind: 'speed', speedKmPerH: expect.closeTo(speedKmPerH, 6) as number });
  });

  it('“none” is no limit, and words or zero are unreadable', () => {
    expect(readSpeed('none').kind).toBe('no-limit');
    for (const text of ['signals', 'fast', '', '0', '-50', '5e3']) expect(readSpeed(text).kind).toBe('unreadable');
  });
});

describe('width tags', () => {
  it.each([
    ['3', 3],
    ['3.5 m', 3.5],
    ['3,5', 3.5],
    ['350 cm', 3.5],
    ["12'", 3.6576],
    ['12 ft', 3.6576],
    ['10\'6"', 3.2004],
  ])('%s is %d m', (text, widthM) => {
    expect(readWidthM(text)).toBeCloseTo(widthM, 6);
  });

  it('nothing positive, nothing read', () => {
    for (const text of ['narrow', '0', '-3', '']) expect(readWidthM(text)).toBeNull();
  });
});

describe('lane tags', () => {
  it('reads whole counts, the lowest of a list, and nothing of words or zero', () => {
    expect(readLanes('3')).toBe(3);
    expect(readLanes('2;3')).toBe(2);
    expect(readLanes('1.5')).toBe(1);
    for (const text of ['0', 'two', '', '-1', '2;x']) expect(readLanes(text)).toBeNull();
  });
});
