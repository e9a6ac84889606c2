import { describe, expect, it } from 'vitest';
import { classCodes, projectPaths, type View } from './draw-roads';
import { hitGrid } from './hit-grid';
import { roadLooks, roadStyles, styleCode } from './road-style';
import { toWorld, worldX, worldY } from './world';

/*
 *  road 0: along the parallel of 60° from 4.0° to 4.1°, with a bend of 1 cm in its middle
 *  road 1: along the meridian of 4.2° from 60.0° to 60.1°
 */
const level = [
  [60, 4],
  [60.0000001, 4.05],
  [60, 4.1],
] as const;
const upright = [
  [60, 4.2],
  [60.1, 4.2],
] as const;
const world = toWorld([level, upright]);

function viewAt(zoom: number): View {
  const scale = 256 * 2 ** zoom;
  return {
    scale,
    originX: worldX(4.1) * scale - 500,
    originY: worldY(60.05) * scale - 400,
    widthPx: 1000,
    heightPx: 800,
    zoom,
  };
}

describe('the world as a square', () => {
  it('has 0°, 0° in its middle and the north above', () => {
    expect([worldX(0), worldY(0)]).toEqual([0.5, 0.5]);
    expect(worldY(60)).toBeLessThan(worldY(0));
    expect(worldY(60)).toBeCloseTo(0.29, 2);
  });
});

describe('a click', () => {
  const grid = hitGrid(world);
  const px = 1 / (256 * 2 ** 12);

  it('finds the road under it, also far from its ends', () => {
    expect(grid.nearest(worldX(4.03), worldY(60), 8 * px)).toBe(0);
    expect(grid.nearest(worldX(4.2), worldY(60.05), 8 * px)).toBe(1);
  });

  it('finds nothing out of reach, nor outside the map', () => {
    expect(grid.nearest(worldX(4.15), worldY(60.05), 8 * px)).toBeNull();
    expect(grid.nearest(worldX(-100), worldY(10), 8 * px)).toBeNull();
  });

  it('takes the nearer of two within reach', () => {
    const reach = worldX(4.2) - worldX(4.0);
    expect(grid.nearest(worldX(4.19), worldY(60.05), reach)).toBe(1);
  });

  it('finds nothing on a map without roads', () => {
    expect(hitGrid(toWorld([])).nearest(0.5, 0.3, 1)).toBeNull();
  });
});

describe('what is drawn', () => {
  it('leaves out a bend that would not show, and keeps both ends', () => {
    const { spans } = projectPaths(world, viewAt(11));
    expect(((spans[1] ?? 0) - (spans[0] ?? 0)) / 2).toBe(2);
  });

  it('leaves out a road beyond the window', () => {
    const { spans } = projectPaths(world, { ...viewAt(11), originX: 0, originY: 0 });
    expect([...spans]).toEqual([0, 0, 0, 0]);
  });

  it('draws what matters most last, dashes what is frozen and lets only trouble glow', () => {
    expect(styleCode('frozen')).toBeGreaterThan(styleCode('urgent'));
    expect(styleCode('urgent')).toBeGreaterThan(styleCode('safe'));
    expect(roadStyles.filter((style) => roadLooks[style].glow > 0)).toEqual(['urgent', 'frozen']);
    expect(roadLooks.frozen.isDashed).toBe(true);
  });

  it('draws a more important class wider', () => {
    const { codes, widths } = classCodes(
      ['D', 'A', 'D'].map((serviceClass, id) => ({ id, name: '', serviceClass, lanes: 2, path: level })),
    );
    expect([...codes]).toEqual([1, 0, 1]);
    expect(widths[0]).toBeGreaterThan(widths[1] ?? Infinity);
  });
});
