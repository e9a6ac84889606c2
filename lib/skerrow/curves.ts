import { distanceM, legsOf, type PlanePoint } from './plane';

function catmullRom(p: readonly [PlanePoint, PlanePoint, PlanePoint, PlanePoint], t: number): PlanePoint {
  const [a, b, c, d] = p;
  const blend = (pa: number, pb: number, pc: number, pd: number) =>
    0.5 * (2 * pb + (pc - pa) * t + (2 * pa - 5 * pb + 4 * pc - pd) * t * t + (3 * pb - pa - 3 * pc + pd) * t ** 3);
  return { xM: blend(a.xM, b.xM, c.xM, d.xM), yM: blend(a.yM, b.yM, c.yM, d.yM) };
}

/** A smooth curve through all points (Catmull–Rom), with a vertex about every `stepM`. */
export function smoothThrough(points: readonly PlanePoint[], stepM: number): PlanePoint[] {
  const first = points[0];
  if (!first) return [];
  const line: PlanePoint[] = [first];
  legsOf(points).forEach(([from, to], index) => {
    const before = points[index - 1] ?? from;
    const after = points[index + 2] ?? to;
    const pieces = Math.max(1, Math.round(distanceM(from, to) / stepM));
    for (let piece = 1; piece <= pieces; piece += 1) {
      line.push(piece === pieces ? to : catmullRom([before, from, to, after], piece / pieces));
    }
  });
  return line;
}

/** The same for a closed ring: `points` does not repeat its first; the result does. */
export function smoothRing(points: readonly PlanePoint[], stepM: number): PlanePoint[] {
  const before = points.at(-1);
  const [first, second] = points;
  if (!before || !first || !second) return [];
  const padded = [before, ...points, first, second];
  const ring: PlanePoint[] = [first];
  for (let index = 1; index <= points.length; index += 1) {
    const [a, b, c, d] = padded.slice(index - 1, index + 3);
    if (!a || !b || !c || !d) continue;
    const pieces = Math.max(1, Math.round(distanceM(b, c) / stepM));
    for (let piece = 1; piece <= pieces; piece += 1) {
      ring.push(piece === pieces ? c : catmullRom([a, b, c, d], piece / pieces));
    }
  }
  return ring;
}

/** Chaikin's corner cutting: each corner becomes two, a quarter in from each side; ends stay. */
export function chaikin(line: readonly PlanePoint[]): PlanePoint[] {
  const first = line[0];
  const last = line.at(-1);
  if (!first || !last || line.length < 3) return [...line];
  const inner = legsOf(line).flatMap(([a, b]) => [
    { xM: 0.75 * a.xM + 0.25 * b.xM, yM: 0.75 * a.yM + 0.25 * b.yM },
    { xM: 0.25 * a.xM + 0.75 * b.xM, yM: 0.25 * a.yM + 0.75 * b.yM },
  ]);
  return [first, ...inner.slice(1, -1), last];
}

/** Moves inner vertices sideways by `offsetM(distance from start)`, less and less towards both ends. */
export function waver(line: readonly PlanePoint[], offsetM: (alongM: number) => number): PlanePoint[] {
  let alongM = 0;
  const alongs = [0, ...legsOf(line).map(([a, b]) => (alongM += distanceM(a, b)))];
  return line.map((point, index) => {
    const before = line[index - 1];
    const after = line[index + 1];
    if (!before || !after) return point;
    const chordM = distanceM(before, after);
    if (chordM === 0) return point;
    const here = alongs[index] ?? 0;
    const taper = Math.min(1, here / 350, (alongM - here) / 350);
    const shift = (offsetM(here) * taper) / chordM;
    return { xM: point.xM - (after.yM - before.yM) * shift, yM: point.yM + (after.xM - before.xM) * shift };
  });
}

function sidewaysM(point: PlanePoint, a: PlanePoint, b: PlanePoint): number {
  const chordM = distanceM(a, b);
  if (chordM === 0) return distanceM(point, a);
  return Math.abs((b.xM - a.xM) * (a.yM - point.yM) - (a.xM - point.xM) * (b.yM - a.yM)) / chordM;
}

/** Leaves out vertices that lie within `toleranceM` of the line without them (Douglas–Peucker). */
export function simplify(line: readonly PlanePoint[], toleranceM: number): PlanePoint[] {
  const first = line[0];
  const last = line.at(-1);
  if (!first || !last || line.length < 3) return [...line];
  let worstM = 0;
  let worst = 0;
  line.forEach((point, index) => {
    const offM = sidewaysM(point, first, last);
    if (index > 0 && index < line.length - 1 && offM > worstM) {
      worstM = offM;
      worst = index;
    }
  });
  if (worstM <= toleranceM) return [first, last];
  return [...simplify(line.slice(0, worst + 1), toleranceM).slice(0, -1), ...simplify(line.slice(worst), toleranceM)];
}
