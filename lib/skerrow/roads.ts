import { type Draft, nodeAt, type Nodes } from './drafts';
import { type Land } from './land';
import { distanceToLineM, kmPoint, lineLengthM, type PlanePoint, pointAlong } from './plane';
import { mergeStreets, nameStreets } from './merge-streets';
import { createRandom, planeNoise } from './random';
import { type Exposure, type RouteName, type ServiceClass, type Surface } from './road-words';
import { layRuralRoads } from './rural-lines';
import { type TownName } from './rural-roads';
import { makeTowns } from './towns';
import { layCloses, layTown } from './town-streets';

export interface RoadNode {
  key: string;
  at: PlanePoint;
}

/** A piece of road between two nodes; `line` runs from `fromNodeKey` to `toNodeKey`. */
export interface RoadSegment {
  key: string;
  fromNodeKey: string;
  toNodeKey: string;
  name: string;
  /** in the words of open road data */
  roadClass: 'primary' | 'secondary' | 'tertiary' | 'residential';
  serviceClass: ServiceClass;
  /** of both directions together */
  lanes: 1 | 2 | 3;
  widthM: number;
  surface: Surface;
  exposure: Exposure;
  isBridge: boolean;
  isOneWay: boolean;
  isSensitive: boolean;
  speedKmPerH: number;
  heightM: number;
  lengthM: number;
  line: PlanePoint[];
  route: RouteName;
}

export interface RoadNetwork {
  nodes: RoadNode[];
  segments: RoadSegment[];
  towns: { name: TownName; labelAt: PlanePoint }[];
}

const roadClasses = { A: 'primary', B: 'secondary', C: 'tertiary', D: 'residential' } as const;
const laneWidthM = { A: 3.65, B: 3.4, C: 3.2, D: 3 } as const;
/** Wells that the towns drink from; roads near them are sensitive. */
const wells = [kmPoint(4.7, -3.6), kmPoint(-6.2, 2.4), kmPoint(5.9, 4.9), kmPoint(-3.9, -3.9)];

const samplesOf = (line: readonly PlanePoint[]) => {
  const lengthM = lineLengthM(line);
  return [0.05, 0.25, 0.5, 0.75, 0.95].map((share) => pointAlong(line, lengthM * share));
};

function isNearWater(line: readonly PlanePoint[], land: Land): boolean {
  return samplesOf(line).some(
    (point) =>
      [...land.rivers, ...land.lakes].some((water) => distanceToLineM(point, water.line) < 190) ||
      wells.some((well) => distanceToLineM(point, [well, well]) < 420),
  );
}

function exposureOf(draft: Draft, land: Land, seed: number): Exposure {
  if (draft.exposure) return draft.exposure;
  const middle = pointAlong(draft.line, lineLengthM(draft.line) / 2);
  const coastM = distanceToLineM(middle, land.coast);
  if (draft.isBridge) return coastM < 60 ? 'shore' : 'open';
  if (draft.isStreet) return coastM < 330 ? 'shore' : draft.serviceClass === 'A' ? 'open' : 'sheltered';
  if (land.heightAt(middle) > 125) return 'ridge';
  if (coastM < 760) return 'shore';
  const fallNorth = land.heightAt(middle) - land.heightAt({ xM: middle.xM, yM: middle.yM + 180 });
  if (fallNorth > 9) return 'shaded';
  return planeNoise(seed + 501, middle.xM / 1300, middle.yM / 1300) > 0.3 ? 'sheltered' : 'open';
}

function meanHeightM(draft: Draft, land: Land): number {
  const samples = samplesOf(draft.line);
  const meanM = samples.reduce((sum, point) => sum + land.heightAt(point), 0) / samples.length;
  return Math.round(draft.isBridge ? Math.max(7, meanM + 3) : meanM);
}

function finished(
  draft: Draft,
  key: string,
  setting: { land: Land; seed: number },
): Omit<RoadSegment, 'fromNodeKey' | 'toNodeKey'> {
  const { land, seed } = setting;
  return {
    key,
    name: draft.name,
    roadClass: roadClasses[draft.serviceClass],
    serviceClass: draft.serviceClass,
    lanes: draft.lanes,
    widthM: Math.round(draft.lanes * laneWidthM[draft.serviceClass] * 100) / 100,
    surface: draft.isBridge ? 'concrete' : (draft.surface ?? 'asphalt'),
    exposure: exposureOf(draft, land, seed),
    isBridge: draft.isBridge,
    isOneWay: draft.isOneWay,
    isSensitive: isNearWater(draft.line, land),
    speedKmPerH: draft.speedKmPerH,
    heightM: meanHeightM(draft, land),
    lengthM: Math.round(lineLengthM(draft.line) * 10) / 10,
    line: draft.line,
    route: draft.route,
  };
}

function allDrafts(land: Land, seed: number): { nodes: Nodes; drafts: Draft[]; towns: RoadNetwork['towns'] } {
  const random = createRandom(seed);
  const nodes: Nodes = new Map();
  const towns = makeTowns(seed, random);
  const streets = towns.flatMap((town) => layTown(town, nodes, random));
  const drafts = [...streets, ...layRuralRoads(nodes, land, seed)];
  for (const town of towns) layCloses(town, { nodes, drafts }, land, random);
  const merged = mergeStreets(drafts);
  nameStreets(merged);
  return { nodes, drafts: merged, towns: towns.map(({ name, labelAt }) => ({ name, labelAt })) };
}

/**
 * The road network of the Isle of Skerrow: one connected network, cut at its junctions, about 340
 * segments and 400 lane-kilometres. The same land and seed give the same network to the last digit.
 */
export function makeRoads(land: Land, seed: number): RoadNetwork {
  const { nodes, drafts, towns } = allDrafts(land, seed);
  const keys = new Map<string, string>();
  for (const { from, to } of drafts) {
    for (const place of [from, to]) {
      if (!keys.has(place)) keys.set(place, `skerrow-n${String(keys.size + 1).padStart(3, '0')}`);
    }
  }
  return {
    towns,
    nodes: [...keys].map(([place, key]) => ({ key, at: nodeAt(nodes, place) })),
    segments: drafts.map((draft, index) => ({
      ...finished(draft, `skerrow-${String(index + 1).padStart(3, '0')}`, { land, seed }),
      fromNodeKey: keys.get(draft.from) ?? '',
      toNodeKey: keys.get(draft.to) ?? '',
    })),
  };
}
