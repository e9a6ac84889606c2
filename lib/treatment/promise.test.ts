import { describe, expect, it } from 'vitest';
import { looseFactor, targetBrineShare, targetOf, thinFilmPart } from './promise';

const bare = { kind: 'bare', looseBrineShare: 0.1 } as const;

describe('what enough means', () => {
  it('keeping snow loose takes 1.7 times the solution at −6 °C and 5 times at −17 °C', () => {
    expect(looseFactor(0)).toBe(1);
    expect(looseFactor(-2)).toBe(1);
    expect(looseFactor(-6)).toBeCloseTo(1.7, 12);
    expect(looseFactor(-17)).toBeCloseTo(5, 12);
    expect(looseFactor(-11.5)).toBeCloseTo(3.35, 12);
  });

  const snow = { fellMm: 2, fellAsSnowMm: 2, sinceSnowMin: 0 };
  const drizzle = { fellMm: 0.2, fellAsSnowMm: 0, sinceSnowMin: null };

  it('the classes differ by film as the model says', () => {
    const kinds = [bare, { ...bare, kind: 'passable' } as const, { ...bare, kind: 'low' } as const];
    expect(kinds.map((kind) => targetBrineShare(kind, drizzle, -4))).toEqual([1, 0.8, 0.5]);
    expect(kinds.map((kind) => targetBrineShare(kind, snow, -2))).toEqual([0.1, 0.1, 0.05]);
    expect(targetBrineShare(bare, snow, -60)).toBe(1);
  });

  it('snow is kept loose while it falls, for a cycle after, and while it lies unploughed', () => {
    expect(thinFilmPart({ fellMm: 0.1, fellAsSnowMm: 0.1, sinceSnowMin: 0 })).toBe(0);
    expect(thinFilmPart({ fellMm: 2, fellAsSnowMm: 2, sinceSnowMin: 600 })).toBe(0);
    expect(thinFilmPart({ fellMm: 0.3, fellAsSnowMm: 0.3, sinceSnowMin: 170 })).toBe(0);
  });

  it('what a plough left long ago, frost, drizzle and a wet road must not turn to ice', () => {
    expect(thinFilmPart({ fellMm: 0.3, fellAsSnowMm: 0.3, sinceSnowMin: 190 })).toBe(1);
    expect(thinFilmPart(drizzle)).toBe(1);
    expect(thinFilmPart({ fellMm: 0, fellAsSnowMm: 0, sinceSnowMin: null })).toBe(1);
    expect([targetOf(snow), targetOf(drizzle)]).toEqual(['loose-snow', 'no-ice']);
  });

  it('drizzle on slush asks for no ice in its own part, up to 0.3 mm of it', () => {
    const on = (rainMm: number) => ({ fellMm: 0.3 + rainMm, fellAsSnowMm: 0.3, sinceSnowMin: 60 });
    expect(thinFilmPart(on(0.2))).toBeCloseTo(0.4, 12);
    expect(thinFilmPart({ fellMm: 2, fellAsSnowMm: 0, sinceSnowMin: null })).toBe(1);
    // The brine asked for never falls as more rain comes.
    const asked = [0, 0.1, 0.2, 0.3, 0.4, 0.8, 2].map((mm) => targetBrineShare(bare, on(mm), -6) * (0.3 + mm));
    asked.forEach((mm, index) => expect(mm).toBeGreaterThanOrEqual(asked[index - 1] ?? 0));
  });
});
