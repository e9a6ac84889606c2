import { describe, expect, it } from 'vitest';
import { arrivalOffsetsMin } from './arrival-offsets';

const leg = (segmentId: number, speedKmPerH = 80) => ({ segmentId, lengthM: 1000, speedKmPerH });

describe('arrival along a route', () => {
  it('1 km at 40 km/h before 1 km at 20 km/h are reached after 0.75 and 3 min', () => {
    expect([...arrivalOffsetsMin([leg(7), leg(8, 20)])]).toEqual([
      [7, 0.75],
      [8, 3],
    ]);
  });

  it('a road driven twice counts when first reached, yet takes its time twice', () => {
    const offsets = arrivalOffsetsMin([leg(7), leg(7), leg(8)]);
    expect(offsets.get(7)).toBe(0.75);
    expect(offsets.get(8)).toBeCloseTo(3.75, 9);
  });

  it('refuses a leg that cannot be driven', () => {
    expect(() => arrivalOffsetsMin([leg(7, 0)])).toThrow(RangeError);
  });
});
