import { type LatLon } from './map-content';

/**
 * Paths flattened into typed arrays, in Web Mercator with the world as the unit square (y down). One multiplication
 * then gives a point on the glass at any zoom.
 */
export interface WorldPaths {
  readonly xs: Float64Array;
  readonly ys: Float64Array;
  /** Points of path i are `starts[i]` up to `starts[i + 1]`. */
  readonly starts: Uint32Array;
  /**
   * How far the line would stray without this point, world units (Douglas and Peucker); Infinity at the ends. What
   * strays less than a pixel need not be drawn.
   */
  readonly weights: Float64Array;
  /** minX, minY, maxX, maxY of each path. */
  readonly boxes: Float64Array;
  readonly count: number;
}

export function worldX(lonDeg: number): number {
  return lonDeg / 360 + 0.5;
}

export function worldY(latDeg: number): number {
  const sine = Math.sin((Math.min(85.05, Math.max(-85.05, latDeg)) * Math.PI) / 180);
  return 0.5 - Math.log((1 + sine) / (1 - sine)) / (4 * Math.PI);
}

export function toWorld(paths: readonly (readonly LatLon[])[]): WorldPaths {
  const starts = new Uint32Array(paths.length + 1);
  paths.forEach((path, index) => (starts[index + 1] = (starts[index] ?? 0) + path.length));
  const total = starts[paths.length] ?? 0;
  const xs = new Float64Array(total);
  const ys = new Float64Array(total);
  const boxes = new Float64Array(paths.length * 4);
  let at = 0;
  paths.forEach((path, index) => {
    const box = [Infinity, Infinity, -Infinity, -Infinity];
    for (const [latDeg, lonDeg] of path) {
      const x = worldX(lonDeg);
      const y = worldY(latDeg);
      xs[at] = x;
      ys[at] = y;
      at += 1;
      box[0] = Math.min(box[0] ?? x, x);
      box[1] = Math.min(box[1] ?? y, y);
      box[2] = Math.max(box[2] ?? x, x);
      box[3] = Math.max(box[3] ?? y, y);
    }
    boxes.set(box, index * 4);
  });
  const weights = new Float64Array(total).fill(Infinity);
  for (let path = 0; path < paths.length; path += 1) {
    weigh({ xs, ys, weights }, starts[path] ?? 0, (starts[path + 1] ?? 0) - 1);
  }
  return { xs, ys, starts, weights, boxes, count: paths.length };
}

/** The point that strays most between two others gets that distance as its weight; then the same on either side. */
function weigh(line: Pick<WorldPaths, 'xs' | 'ys' | 'weights'>, first: number, last: number): void {
  const spans: [number, number, number][] = [[first, last, Infinity]];
  for (let span = spans.pop(); span; span = spans.pop()) {
    const [from, to, most] = span;
    if (to - from < 2) continue;
    const at = (index: number) => [line.xs[index] ?? 0, line.ys[index] ?? 0] as const;
    let farthest = from + 1;
    let best = -1;
    for (let index = from + 1; index < to; index += 1) {
      const distance = squaredDistance(at(index), at(from), at(to));
      if (distance > best) {
        best = distance;
        farthest = index;
      }
    }
    // No point may outweigh the one that parted its span, or it would be drawn without it.
    const weight = Math.min(most, Math.sqrt(best));
    line.weights[farthest] = weight;
    spans.push([from, farthest, weight], [farthest, to, weight]);
  }
}

/** Square of the distance from a point to a stretch of line, in the unit of its arguments. */
export function squaredDistance(point: LatLon, from: LatLon, to: LatLon): number {
  const dx = to[0] - from[0];
  const dy = to[1] - from[1];
  const lengthSquared = dx * dx + dy * dy;
  const along =
    lengthSquared === 0
      ? 0
      : Math.min(1, Math.max(0, ((point[0] - from[0]) * dx + (point[1] - from[1]) * dy) / lengthSquared));
  return (point[0] - from[0] - along * dx) ** 2 + (point[1] - from[1] - along * dy) ** 2;
}
