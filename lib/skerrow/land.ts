import { contourLines } from './contours';
import { simplify, smoothRing, smoothThrough, waver } from './curves';
import { coastKm, hills, isletsKm, lakesKm, riversKm, seaNames } from './land-outline';
import { distanceToLineM, fromLatLon, isInside, kmPoint, type PlanePoint } from './plane';
import { lineNoise, planeNoise } from './random';

export interface NamedLine {
  name: string;
  line: PlanePoint[];
}

/** The ground of the Isle of Skerrow, on the drawing plane. Rings repeat their first point last. */
export interface Land {
  coast: PlanePoint[];
  islets: NamedLine[];
  rivers: NamedLine[];
  lakes: NamedLine[];
  seaNames: { name: string; at: PlanePoint }[];
  contours: { heightM: number; line: PlanePoint[] }[];
  isLand: (point: PlanePoint) => boolean;
  /** metres above the sea: 0 off the island, smooth, its tops about 420 m */
  heightAt: (point: PlanePoint) => number;
}

const fromKm = ([eastKm, northKm]: readonly [number, number]) => kmPoint(eastKm, northKm);

/** Two layers of sideways noise: headlands of some 900 m and notches of some 300 m. */
const ragged = (seed: number, scaleM: number) => (alongM: number) =>
  scaleM * (lineNoise(seed, alongM / 900) * 1.3 + lineNoise(seed + 1, alongM / 330) * 0.75);

function coastOf(seed: number): PlanePoint[] {
  const ring = waver(smoothRing(coastKm.map(fromKm), 150), ragged(seed + 11, 85));
  const first = ring[0];
  return first ? simplify([...ring.slice(0, -1), first], 12) : ring;
}

function isletOf(islet: (typeof isletsKm)[number], seed: number): NamedLine {
  const around = Array.from({ length: 9 }, (_, step) => {
    const angle = (step / 9) * 2 * Math.PI;
    const reach = 1 + 0.25 * lineNoise(seed, step * 1.7);
    return kmPoint(
      islet.middle[0] + Math.cos(angle) * islet.halfSizeKm[0] * reach,
      islet.middle[1] + Math.sin(angle) * islet.halfSizeKm[1] * reach,
    );
  });
  return { name: islet.name, line: simplify(smoothRing(around, 90), 6) };
}

function bellM(point: PlanePoint, hill: (typeof hills)[number]): number {
  const east = point.xM / 1000 - hill.top[0];
  const north = point.yM / 1000 - hill.top[1];
  const angle = (hill.bearingDeg * Math.PI) / 180;
  const along = (east * Math.sin(angle) + north * Math.cos(angle)) / hill.alongKm;
  const across = (east * Math.cos(angle) - north * Math.sin(angle)) / hill.acrossKm;
  return hill.riseM * Math.exp(-(along * along + across * across));
}

function heightFunction(seed: number, isLand: (point: PlanePoint) => boolean, coast: readonly PlanePoint[]) {
  return (point: PlanePoint): number => {
    if (!isLand(point)) return 0;
    const inland = Math.min(1, distanceToLineM(point, coast) / 1400);
    const rise = inland * inland * (3 - 2 * inland);
    const rolling = 14 * planeNoise(seed + 21, point.xM / 1500, point.yM / 1500);
    const folded =
      1 +
      0.13 * planeNoise(seed + 22, point.xM / 1300, point.yM / 1300) +
      0.07 * planeNoise(seed + 23, point.xM / 480, point.yM / 480);
    const hillsM = hills.reduce((sum, hill) => sum + bellM(point, hill), 0);
    return 4 * Math.min(1, inland * 10) + rise * (28 + rolling + hillsM * folded);
  };
}

/** Draws the island: the same seed gives the same island to the last digit. */
export function makeLand(seed: number): Land {
  const coast = coastOf(seed);
  const isLand = (point: PlanePoint) => isInside(coast, point);
  const heightAt = heightFunction(seed, isLand, coast);
  return {
    coast,
    islets: isletsKm.map((islet, index) => isletOf(islet, seed + 31 + index)),
    rivers: riversKm.map(({ name, line }, index) => ({
      name,
      line: simplify(waver(smoothThrough(line.map(fromKm), 130), ragged(seed + 41 + 2 * index, 30)), 7),
    })),
    lakes: lakesKm.map(({ name, ring }) => ({ name, line: simplify(smoothRing(ring.map(fromKm), 120), 6) })),
    seaNames: seaNames.map(({ name, at }) => ({ name, at: fromKm(at) })),
    contours: contourLines(heightAt, [100, 200, 300, 400]),
    isLand,
    heightAt,
  };
}

/** Height above the sea in metres at a place in WGS 84 degrees; 0 off the island. */
export function heightM(land: Land, lat: number, lon: number): number {
  return land.heightAt(fromLatLon(lat, lon));
}
