import { type MapSegment } from './map-content';
import { type Palette } from './palette';
import { classWidthPx, otherClassWidthPx, roadLooks, roadStyles, zoomFactor } from './road-style';
import { type WorldPaths } from './world';

/** Where the glass lies over the world: glass px = world × scale − origin. */
export interface View {
  readonly scale: number;
  readonly originX: number;
  readonly originY: number;
  readonly widthPx: number;
  readonly heightPx: number;
  readonly zoom: number;
}

/** The visible paths in px, without points that would not show: kept until the view changes. */
export interface GlassPaths {
  readonly points: Float32Array;
  /** Path i: `spans[2i]` to `spans[2i + 1]`, in numbers of `points`; equal when out of view. */
  readonly spans: Uint32Array;
}

export function projectPaths(paths: WorldPaths, view: View): GlassPaths {
  const points = new Float32Array(paths.xs.length * 2);
  const spans = new Uint32Array(paths.count * 2);
  const margin = 24;
  let used = 0;
  for (let path = 0; path < paths.count; path += 1) {
    const start = used;
    const inView =
      (paths.boxes[path * 4 + 2] ?? 0) * view.scale - view.originX >= -margin &&
      (paths.boxes[path * 4] ?? 0) * view.scale - view.originX <= view.widthPx + margin &&
      (paths.boxes[path * 4 + 3] ?? 0) * view.scale - view.originY >= -margin &&
      (paths.boxes[path * 4 + 1] ?? 0) * view.scale - view.originY <= view.heightPx + margin;
    if (inView) used = projectPath(paths, view, { path, points, used });
    spans[path * 2] = start;
    spans[path * 2 + 1] = used;
  }
  return { points, spans };
}

/** A line drawn without a point strays this much at most. */
const STRAY_PX = 0.6;

function projectPath(
  paths: WorldPaths,
  view: View,
  into: { path: number; points: Float32Array; used: number },
): number {
  const { points } = into;
  const first = paths.starts[into.path] ?? 0;
  const last = (paths.starts[into.path + 1] ?? 0) - 1;
  let used = into.used;
  for (let index = first; index <= last; index += 1) {
    if ((paths.weights[index] ?? 0) * view.scale < STRAY_PX) continue;
    points[used] = (paths.xs[index] ?? 0) * view.scale - view.originX;
    points[used + 1] = (paths.ys[index] ?? 0) * view.scale - view.originY;
    used += 2;
  }
  return used;
}

/** Service classes as bytes, so that the drawing loop compares numbers. */
export function classCodes(segments: readonly MapSegment[]): { codes: Uint8Array; widths: readonly number[] } {
  const names = [...new Set(segments.map((segment) => segment.serviceClass))].sort();
  const codes = Uint8Array.from(segments, (segment) => names.indexOf(segment.serviceClass));
  return { codes, widths: names.map((name) => classWidthPx[name] ?? otherClassWidthPx) };
}

export interface RoadsToDraw {
  readonly glass: GlassPaths;
  readonly styles: Uint8Array;
  readonly classes: { codes: Uint8Array; widths: readonly number[] };
  readonly selected: number | null;
  readonly highlighted: ReadonlySet<number>;
}

function tracePath(pen: CanvasRenderingContext2D, { points, spans }: GlassPaths, path: number): void {
  const start = spans[path * 2] ?? 0;
  const end = spans[path * 2 + 1] ?? 0;
  if (end - start < 4) return;
  pen.moveTo(points[start] ?? 0, points[start + 1] ?? 0);
  for (let at = start + 2; at < end; at += 2) pen.lineTo(points[at] ?? 0, points[at + 1] ?? 0);
}

/** The paths of each style and class together: `styles × classes` lists of indexes. */
function batches(roads: RoadsToDraw): number[][] {
  const lists: number[][] = [];
  const classCount = Math.max(1, roads.classes.widths.length);
  for (let path = 0; path < roads.classes.codes.length; path += 1) {
    if ((roads.glass.spans[path * 2 + 1] ?? 0) === (roads.glass.spans[path * 2] ?? 0)) continue;
    const key = (roads.styles[path] ?? 0) * classCount + (roads.classes.codes[path] ?? 0);
    (lists[key] ??= []).push(path);
  }
  return lists;
}

/** One stroke for all paths of a style and class: their number, not the number of roads, is what costs. */
export function drawRoads(
  pen: CanvasRenderingContext2D,
  roads: RoadsToDraw,
  given: { palette: Palette; zoom: number },
) {
  const factor = zoomFactor(given.zoom);
  const classCount = Math.max(1, roads.classes.widths.length);
  pen.lineCap = 'round';
  pen.lineJoin = 'round';
  drawHalo(pen, roads, { ...given, factor });
  const lists = batches(roads);
  const isGlowing = glowingCount(lists, classCount) <= MOST_GLOWING;
  lists.forEach((paths, key) => {
    const style = roadLooks[roadStyles[Math.floor(key / classCount)] ?? 'unknown'];
    const widthPx = (roads.classes.widths[key % classCount] ?? otherClassWidthPx) * style.widthFactor * factor;
    pen.strokeStyle = given.palette[style.token] ?? '';
    if (isGlowing && style.glow > 0) {
      pen.globalAlpha = style.glow;
      pen.lineWidth = widthPx + 7 * factor;
      strokePaths(pen, roads.glass, paths);
      pen.globalAlpha = 1;
    }
    pen.lineWidth = widthPx;
    if (style.isDashed) {
      pen.lineCap = 'butt';
      pen.setLineDash([3.2 + widthPx * 0.9, 1.6 + widthPx * 0.55]);
    }
    strokePaths(pen, roads.glass, paths);
    pen.setLineDash([]);
    pen.lineCap = 'round';
  });
}

/** Where everything is in trouble nothing stands out by a glow, and glow is what costs most to draw. */
const MOST_GLOWING = 120;

function glowingCount(lists: readonly number[][], classCount: number): number {
  let count = 0;
  lists.forEach((paths, key) => {
    if (roadLooks[roadStyles[Math.floor(key / classCount)] ?? 'unknown'].glow > 0) count += paths.length;
  });
  return count;
}

/** A few dozen roads a stroke: one stroke of thousands is slow to fill, thousands of strokes are slow to start. */
const PATHS_PER_STROKE = 32;

function strokePaths(pen: CanvasRenderingContext2D, glass: GlassPaths, paths: readonly number[]): void {
  for (let from = 0; from < paths.length; from += PATHS_PER_STROKE) {
    pen.beginPath();
    const until = Math.min(paths.length, from + PATHS_PER_STROKE);
    for (let at = from; at < until; at += 1) tracePath(pen, glass, paths[at] ?? 0);
    pen.stroke();
  }
}

/** A rim along the chosen road and a faint one under those pointed at. */
function drawHalo(
  pen: CanvasRenderingContext2D,
  roads: RoadsToDraw,
  { palette, factor }: { palette: Palette; factor: number },
): void {
  const ring = (token: string, { path, extraPx, alpha }: { path: number; extraPx: number; alpha: number }) => {
    const widthPx = (roads.classes.widths[roads.classes.codes[path] ?? 0] ?? otherClassWidthPx) * factor;
    pen.globalAlpha = alpha;
    pen.strokeStyle = palette[token] ?? '';
    pen.lineWidth = widthPx + extraPx;
    pen.beginPath();
    tracePath(pen, roads.glass, path);
    pen.stroke();
    pen.globalAlpha = 1;
  };
  for (const path of roads.highlighted) ring('ink', { path, extraPx: 5, alpha: 0.45 });
  if (roads.selected === null) return;
  ring('ink', { path: roads.selected, extraPx: 16, alpha: 0.14 });
  ring('ink', { path: roads.selected, extraPx: 8, alpha: 1 });
  ring('ground', { path: roads.selected, extraPx: 4, alpha: 1 });
}
