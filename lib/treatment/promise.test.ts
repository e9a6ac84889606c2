import { describe, expect, it } from 'vitest';
import { looseFactor, targetBrineShare, targetOf } from './promise';

const bare = { kind: 'bare', looseBrineShare: 0.1 } as const;

describe('what enough means', () => {
  it('keeping snow loose takes 1.7 times the solution at −6 °C and 5 times at −17 °C', () => {
    expect(looseFactor(0)).toBe(1);
    expect(looseFactor(-2)).toBe(1);
    expect(looseFactor(-6)).toBeCloseTo(1.7, 12);
    expect(looseFactor(-17)).toBeCloseTo(5, 12);
    expect(looseFactor(-11.5)).toBeCloseTo(3.35, 12);
  });

  it('the classes differ by film as the model says', () => {
    const passable = { ...bare, kind: 'passable' } as const;
    const low = { ...bare, kind: 'low' } as const;
    expect([bare, passable, low].map((kind) => targetBrineShare(kind, 'no-ice', -4))).toEqual([1, 0.8, 0.5]);
    expect([bare, passable, low].map((kind) => targetBrineShare(kind, 'loose-snow', -2))).toEqual([0.1, 0.1, 0.05]);
    expect(targetBrineShare(bare, 'loose-snow', -60)).toBe(1);
  });

  it('snow is kept loose while it falls or covers, and what a plough leaves of it must not be ice', () => {
    expect(targetOf({ fellMm: 0.1, fellAsSnowMm: 0.1, sinceSnowMin: 0 })).toBe('loose-snow');
    expect(targetOf({ fellMm: 2, fellAsSnowMm: 1.5, sinceSnowMin: 300 })).toBe('loose-snow');
    expect(targetOf({ fellMm: 0.3, fellAsSnowMm: 0.3, sinceSnowMin: 300 })).toBe('no-ice');
    expect(targetOf({ fellMm: 0.3, fellAsSnowMm: 0, sinceSnowMin: null })).toBe('no-ice');
    expect(targetOf({ fellMm: 2, fellAsSnowMm: 0.6, sinceSnowMin: 10 })).toBe('no-ice');
  });
});
