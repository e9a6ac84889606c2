import { describe, expect, it } from 'vitest';
import { boundsOf, middleOf } from './extent';
import { distanceM, lineLengthM, metresPerDegree, positionKey, type Position } from './position';

describe('lengths on the ellipsoid', () => {
  it('one degree at 45° is 111,132 m north and 78,847 m east, the published WGS 84 values', () => {
    const { lonM, latM } = metresPerDegree(45);
    expect(latM).toBeCloseTo(111_131.7, 0);
    expect(lonM).toBeCloseTo(78_846.8, 0);
  });

  it('a degree of the equator is 111,319.49 m and of the meridian at the pole 111,693.9 m', () => {
    expect(metresPerDegree(0).lonM).toBeCloseTo(111_319.49, 2);
    expect(metresPerDegree(90).latM).toBeCloseTo(111_693.9, 0);
  });

  it('is the same both ways and takes the short way over the date line', () => {
    const [west, east]: [Position, Position] = [
      [179.999, 10],
      [-179.999, 10.001],
    ];
    expect(distanceM(west, east)).toBe(distanceM(east, west));
    expect(distanceM(west, east)).toBeLessThan(300);
  });

  it('a latitude beyond the pole is a slip of the caller', () => {
    expect(() => metresPerDegree(91)).toThrow(RangeError);
    expect(() => metresPerDegree(Number.NaN)).toThrow(RangeError);
  });

  it('adding a vertex on a short straight edge changes its length by less than a millimetre', () => {
    const whole: Position[] = [
      [11.5, 50.03],
      [11.51, 50.04],
    ];
    const split: Position[] = [
      [11.5, 50.03],
      [11.505, 50.035],
      [11.51, 50.04],
    ];
    expect(Math.abs(lineLengthM(whole) - lineLengthM(split))).toBeLessThan(0.001);
  });
});

describe('places', () => {
  it('two vertices within half of 10⁻⁷ degree have one key, and a whole step apart have two', () => {
    expect(positionKey([11.529894, 50.035859])).toBe('115298940,500358590');
    expect(positionKey([11.52989402, 50.03585898])).toBe(positionKey([11.529894, 50.035859]));
    expect(positionKey([11.5298941, 50.035859])).not.toBe(positionKey([11.529894, 50.035859]));
  });

  it('the middle of a bent line lies on the line, half its length from either end', () => {
    const line: Position[] = [
      [0, 0],
      [0.03, 0],
      [0.03, 0.01],
    ];
    const middle = middleOf(line);
    expect(middle?.[1]).toBeCloseTo(0, 9);
    // halved on the sphere, measured on the ellipsoid: the two differ by up to half a percent
    expect(distanceM([0, 0], middle ?? [9, 9]) / (lineLengthM(line) / 2)).toBeCloseTo(1, 2);
  });

  it('the box of no lines is nothing', () => {
    expect(boundsOf([])).toBeNull();
    expect(
      boundsOf([
        [
          [1, 2],
          [-3, 4],
        ],
      ]),
    ).toEqual([-3, 2, 1, 4]);
  });
});
