import { squaredDistance, type WorldPaths } from './world';

const CELLS = 96;

interface Extent {
  readonly minX: number;
  readonly minY: number;
  readonly cell: number;
}

/** Answers "which path is nearest to this point" from a grid of cells, without looking at every path. */
export interface HitGrid {
  /** Index of the nearest path within `reach` (world units), or null. */
  nearest(x: number, y: number, reach: number): number | null;
}

function extentOf(boxes: Float64Array): Extent {
  let minX = Infinity;
  let minY = Infinity;
  let maxX = -Infinity;
  let maxY = -Infinity;
  for (let index = 0; index < boxes.length; index += 4) {
    minX = Math.min(minX, boxes[index] ?? minX);
    minY = Math.min(minY, boxes[index + 1] ?? minY);
    maxX = Math.max(maxX, boxes[index + 2] ?? maxX);
    maxY = Math.max(maxY, boxes[index + 3] ?? maxY);
  }
  return { minX, minY, cell: Math.max(maxX - minX, maxY - minY, 1e-9) / CELLS };
}

/** The path indexes of every cell that the stretches of a path touch (by their boxes). */
function fill(paths: WorldPaths, extent: Extent): Map<number, number[]> {
  const cells = new Map<number, number[]>();
  const cellOf = (x: number, from: number) => Math.min(CELLS - 1, Math.max(0, Math.floor((x - from) / extent.cell)));
  const add = (key: number, path: number) => {
    const known = cells.get(key);
    if (!known) cells.set(key, [path]);
    else if (known.at(-1) !== path) known.push(path);
  };
  for (let path = 0; path < paths.count; path += 1) {
    for (let point = (paths.starts[path] ?? 0) + 1; point < (paths.starts[path + 1] ?? 0); point += 1) {
      const xa = cellOf(paths.xs[point - 1] ?? 0, extent.minX);
      const xb = cellOf(paths.xs[point] ?? 0, extent.minX);
      const ya = cellOf(paths.ys[point - 1] ?? 0, extent.minY);
      const yb = cellOf(paths.ys[point] ?? 0, extent.minY);
      for (let column = Math.min(xa, xb); column <= Math.max(xa, xb); column += 1) {
        for (let row = Math.min(ya, yb); row <= Math.max(ya, yb); row += 1) add(row * CELLS + column, path);
      }
    }
  }
  return cells;
}

function squaredDistanceToPath(paths: WorldPaths, path: number, point: readonly [number, number]): number {
  let best = Infinity;
  for (let index = (paths.starts[path] ?? 0) + 1; index < (paths.starts[path + 1] ?? 0); index += 1) {
    const from = [paths.xs[index - 1] ?? 0, paths.ys[index - 1] ?? 0] as const;
    const to = [paths.xs[index] ?? 0, paths.ys[index] ?? 0] as const;
    best = Math.min(best, squaredDistance(point, from, to));
  }
  return best;
}

export function hitGrid(paths: WorldPaths): HitGrid {
  const extent = extentOf(paths.boxes);
  const cells = fill(paths, extent);
  const columnOf = (value: number, from: number) => Math.floor((value - from) / extent.cell);
  const nearest: HitGrid['nearest'] = (x, y, reach) => {
    let found: number | null = null;
    let best = reach * reach;
    const lastRow = Math.min(CELLS - 1, columnOf(y + reach, extent.minY));
    const lastColumn = Math.min(CELLS - 1, columnOf(x + reach, extent.minX));
    for (let row = Math.max(0, columnOf(y - reach, extent.minY)); row <= lastRow; row += 1) {
      for (let column = Math.max(0, columnOf(x - reach, extent.minX)); column <= lastColumn; column += 1) {
        for (const path of cells.get(row * CELLS + column) ?? []) {
          const distance = squaredDistanceToPath(paths, path, [x, y]);
          if (distance <= best) {
            best = distance;
            found = path;
          }
        }
      }
    }
    return found;
  };
  return { nearest };
}
