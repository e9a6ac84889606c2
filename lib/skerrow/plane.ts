/** A place on the drawing plane: metres east and north of the middle of the island. */
export interface PlanePoint {
  xM: number;
  yM: number;
}

/** GeoJSON order, degrees, WGS 84. */
export type LonLat = [lon: number, lat: number];

const middle = { lat: 61.4, lon: -10.2 };
const mPerDegreeLat = 111_436;
// The length of a degree of longitude at the middle; over 16 km of latitude it changes by 0.3 %.
const mPerDegreeLon = 53_420;

export const kmPoint = (xKm: number, yKm: number): PlanePoint => ({ xM: xKm * 1000, yM: yKm * 1000 });

/** To the seventh decimal, about a centimetre, so that a drawn place is the same place everywhere. */
const rounded = (degrees: number) => Math.round(degrees * 1e7) / 1e7;

export const toLonLat = ({ xM, yM }: PlanePoint): LonLat => [
  rounded(middle.lon + xM / mPerDegreeLon),
  rounded(middle.lat + yM / mPerDegreeLat),
];

export const fromLatLon = (lat: number, lon: number): PlanePoint => ({
  xM: (lon - middle.lon) * mPerDegreeLon,
  yM: (lat - middle.lat) * mPerDegreeLat,
});

export const distanceM = (a: PlanePoint, b: PlanePoint) => Math.hypot(a.xM - b.xM, a.yM - b.yM);

export const between = (a: PlanePoint, b: PlanePoint, share: number): PlanePoint => ({
  xM: a.xM + (b.xM - a.xM) * share,
  yM: a.yM + (b.yM - a.yM) * share,
});

/** Consecutive pairs of a line. */
export function legsOf(line: readonly PlanePoint[]): [PlanePoint, PlanePoint][] {
  const legs: [PlanePoint, PlanePoint][] = [];
  let previous: PlanePoint | undefined;
  for (const point of line) {
    if (previous) legs.push([previous, point]);
    previous = point;
  }
  return legs;
}

export const lineLengthM = (line: readonly PlanePoint[]) =>
  legsOf(line).reduce((sum, [a, b]) => sum + distanceM(a, b), 0);

function distanceToLegM(point: PlanePoint, a: PlanePoint, b: PlanePoint): number {
  const dx = b.xM - a.xM;
  const dy = b.yM - a.yM;
  const square = dx * dx + dy * dy;
  const share = square === 0 ? 0 : ((point.xM - a.xM) * dx + (point.yM - a.yM) * dy) / square;
  const held = Math.min(1, Math.max(0, share));
  return Math.hypot(point.xM - a.xM - held * dx, point.yM - a.yM - held * dy);
}

export function distanceToLineM(point: PlanePoint, line: readonly PlanePoint[]): number {
  let best = Infinity;
  let previous = line[0];
  for (const next of line.slice(1)) {
    if (previous) best = Math.min(best, distanceToLegM(point, previous, next));
    previous = next;
  }
  return best;
}

/** Whether a closed ring (first point repeated last) surrounds the point, by counting crossings. */
export function isInside(ring: readonly PlanePoint[], point: PlanePoint): boolean {
  let inside = false;
  let previous = ring.at(-1);
  for (const next of ring) {
    if (
      previous &&
      next.yM > point.yM !== previous.yM > point.yM &&
      point.xM < ((previous.xM - next.xM) * (point.yM - next.yM)) / (previous.yM - next.yM) + next.xM
    ) {
      inside = !inside;
    }
    previous = next;
  }
  return inside;
}

/** Where two legs cross, as the share along each; undefined when they do not. */
export function crossing(
  [a, b]: readonly [PlanePoint, PlanePoint],
  [c, d]: readonly [PlanePoint, PlanePoint],
): { alongFirst: number; alongSecond: number } | undefined {
  const rx = b.xM - a.xM;
  const ry = b.yM - a.yM;
  const sx = d.xM - c.xM;
  const sy = d.yM - c.yM;
  const cross = rx * sy - ry * sx;
  if (cross === 0) return undefined;
  const alongFirst = ((c.xM - a.xM) * sy - (c.yM - a.yM) * sx) / cross;
  const alongSecond = ((c.xM - a.xM) * ry - (c.yM - a.yM) * rx) / cross;
  const onBoth = alongFirst >= 0 && alongFirst <= 1 && alongSecond >= 0 && alongSecond <= 1;
  return onBoth ? { alongFirst, alongSecond } : undefined;
}

export function pointAlong(line: readonly PlanePoint[], atM: number): PlanePoint {
  let leftM = atM;
  for (const [a, b] of legsOf(line)) {
    const legM = distanceM(a, b);
    if (leftM <= legM && legM > 0) return between(a, b, Math.max(0, leftM / legM));
    leftM -= legM;
  }
  const last = line.at(-1);
  if (!last) throw new RangeError('a line needs at least one point');
  return last;
}

/** The part of a line between two distances from its start. */
export function cut(line: readonly PlanePoint[], fromM: number, untilM: number): PlanePoint[] {
  const part = [pointAlong(line, fromM)];
  let walkedM = 0;
  for (const [a, b] of legsOf(line)) {
    walkedM += distanceM(a, b);
    if (walkedM > fromM + 1 && walkedM < untilM - 1) part.push(b);
  }
  part.push(pointAlong(line, untilM));
  return part;
}
