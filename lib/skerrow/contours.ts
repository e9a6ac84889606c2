import { chaikin, simplify } from './curves';
import { between, lineLengthM, type PlanePoint } from './plane';

const cellM = 160;
const halfWidth = 72;
const halfHeight = 54;

interface Corner {
  at: PlanePoint;
  heightM: number;
}

/** A piece of contour through one cell; ends are named by the cell edge they lie on. */
interface Piece {
  ends: [string, string];
  points: [PlanePoint, PlanePoint];
}

const cornerKey = (i: number, j: number) => `${i},${j}`;

function sampled(heightAt: (point: PlanePoint) => number): Map<string, Corner> {
  const corners = new Map<string, Corner>();
  for (let i = -halfWidth; i <= halfWidth; i += 1) {
    for (let j = -halfHeight; j <= halfHeight; j += 1) {
      const at = { xM: i * cellM, yM: j * cellM };
      corners.set(cornerKey(i, j), { at, heightM: heightAt(at) });
    }
  }
  return corners;
}

/** Marching squares: where the level passes between two corners of different side, one end of a piece. */
function piecesInCell(corners: Map<string, Corner>, [i, j]: readonly [number, number], levelM: number): Piece[] {
  const around = [cornerKey(i, j), cornerKey(i + 1, j), cornerKey(i + 1, j + 1), cornerKey(i, j + 1)];
  const hits: { end: string; point: PlanePoint }[] = [];
  around.forEach((key, side) => {
    const otherKey = around[(side + 1) % 4] ?? key;
    const a = corners.get(key);
    const b = corners.get(otherKey);
    if (!a || !b || a.heightM >= levelM === b.heightM >= levelM) return;
    const share = (levelM - a.heightM) / (b.heightM - a.heightM);
    hits.push({ end: [key, otherKey].sort().join('|'), point: between(a.at, b.at, share) });
  });
  const pieces: Piece[] = [];
  for (let index = 0; index + 1 < hits.length; index += 2) {
    const from = hits[index];
    const to = hits[index + 1];
    if (from && to) pieces.push({ ends: [from.end, to.end], points: [from.point, to.point] });
  }
  return pieces;
}

function joined(pieces: readonly Piece[]): PlanePoint[][] {
  const byEnd = new Map<string, Piece[]>();
  for (const piece of pieces) {
    for (const end of piece.ends) byEnd.set(end, [...(byEnd.get(end) ?? []), piece]);
  }
  const used = new Set<Piece>();
  const lines: PlanePoint[][] = [];
  for (const start of pieces) {
    if (used.has(start)) continue;
    used.add(start);
    const line: PlanePoint[] = [...start.points];
    let end = start.ends[1];
    for (;;) {
      const next = byEnd.get(end)?.find((piece) => !used.has(piece));
      if (!next) break;
      used.add(next);
      const isForward = next.ends[0] === end;
      line.push(next.points[isForward ? 1 : 0]);
      end = next.ends[isForward ? 1 : 0];
    }
    lines.push(line);
  }
  return lines;
}

/** Lines of equal height as closed rings, by marching squares on a 160 m grid, corners cut, short ones left out. */
export function contourLines(heightAt: (point: PlanePoint) => number, levelsM: readonly number[]) {
  const corners = sampled(heightAt);
  return levelsM.flatMap((levelM) => {
    const pieces: Piece[] = [];
    for (let i = -halfWidth; i < halfWidth; i += 1) {
      for (let j = -halfHeight; j < halfHeight; j += 1) pieces.push(...piecesInCell(corners, [i, j], levelM));
    }
    return joined(pieces)
      .filter((line) => lineLengthM(line) > 500)
      .map((line) => ({ heightM: levelM, line: simplify(chaikin(chaikin(line)), 6) }));
  });
}
