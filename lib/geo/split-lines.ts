import { type DuplicateFinding, type NetworkWarning, type SourceLine, type ZeroLengthFinding } from './network';
import { lineLengthM, type Position, positionKey, STEPS_PER_DEGREE } from './position';
import { type RoadAttributes } from './road-tags';

/** A line with its attributes, on its way into the network. */
export interface AttributedLine extends SourceLine {
  road: RoadAttributes;
}

/** An unbroken piece of a line after duplicates were taken out: whole vertices by number, in driving order. */
export interface Run {
  line: AttributedLine;
  vertices: readonly number[];
}

export interface SplitLines {
  /** Places by vertex number, on the grid of 10⁻⁷ degree. */
  places: readonly Position[];
  /** Pieces from node to node. */
  pieces: readonly Run[];
  duplicates: DuplicateFinding[];
  zeroLength: ZeroLengthFinding[];
  warnings: NetworkWarning[];
}

/**
 * Cuts lines where they meet. A vertex becomes a node when it ends a line, or when it is passed twice or more: by two
 * lines, or by one line touching itself. Lines that only cross on the map, without a common vertex, do not meet: one
 * is a bridge, or the file has a gap. Edges that an earlier line has already are dropped and reported, unless the two
 * are one-way in opposite directions; a line all of whose vertices are one place is dropped and reported.
 */
export function splitLines(lines: readonly AttributedLine[]): SplitLines {
  const split: SplitLines & { places: Position[] } = {
    places: [],
    pieces: [],
    duplicates: [],
    zeroLength: [],
    warnings: [],
  };
  const indexed = indexVertices(lines, split);
  const runs = dropDuplicateEdges(indexed, split);
  const isNode = findNodes(runs, split.places.length);
  return { ...split, pieces: runs.flatMap((run) => cutAtNodes(run, isNode)) };
}

type Gathering = SplitLines & { places: Position[] };

/** Vertices by number; repeated vertices in a row become one; against-the-line one-ways are turned round. */
function indexVertices(lines: readonly AttributedLine[], split: Gathering): Run[] {
  const numbers = new Map<string, number>();
  const numberOf = (place: Position): number => {
    const key = positionKey(place);
    const known = numbers.get(key);
    if (known !== undefined) return known;
    numbers.set(key, split.places.length);
    split.places.push([
      Math.round(place[0] * STEPS_PER_DEGREE) / STEPS_PER_DEGREE,
      Math.round(place[1] * STEPS_PER_DEGREE) / STEPS_PER_DEGREE,
    ]);
    return split.places.length - 1;
  };
  return lines.flatMap((line) => {
    const vertices = line.positions.map(numberOf).filter((vertex, at, all) => at === 0 || vertex !== all[at - 1]);
    if (line.road.direction.value === 'backward') vertices.reverse();
    if (vertices.length >= 2) return [{ line, vertices }];
    const [at] = line.positions;
    if (at) split.zeroLength.push({ sourceId: line.sourceId, at });
    return [];
  });
}

interface EdgeOwner {
  run: Run;
  isUpwards: boolean;
}

const isOneWay = (run: Run): boolean => run.line.road.direction.value !== 'both';

function dropDuplicateEdges(runs: readonly Run[], split: Gathering): Run[] {
  const owners = new Map<number, EdgeOwner[]>();
  const opposed = new Map<string, NetworkWarning>();
  const kept = runs.flatMap((run) => keepNewEdges(run, { owners, opposed, split }));
  split.warnings.push(...opposed.values());
  return kept;
}

interface EdgeContext {
  owners: Map<number, EdgeOwner[]>;
  opposed: Map<string, NetworkWarning>;
  split: Gathering;
}

interface Overlap {
  vertices: number[];
  owner: EdgeOwner;
  isReversed: boolean;
}

function keepNewEdges(run: Run, context: EdgeContext): Run[] {
  const { owners, split } = context;
  const fresh: number[][] = [];
  const overlaps: Overlap[] = [];
  let previousWasFresh = false;
  for (let at = 1; at < run.vertices.length; at += 1) {
    const [from, to] = [run.vertices[at - 1] ?? 0, run.vertices[at] ?? 0];
    const key = edgeKey(from, to);
    const here = owners.get(key) ?? [];
    const isUpwards = from < to;
    const owner = here.find((other) => !runsAgainst(run, isUpwards, other));
    if (owner) {
      extendOverlap(overlaps, {
        from,
        to,
        owner,
        isReversed: owner.isUpwards !== isUpwards,
        isNext: !previousWasFresh,
      });
    } else {
      if (here[0]) noteOpposed(run, here[0].run, context);
      owners.set(key, [...here, { run, isUpwards }]);
      if (previousWasFresh) fresh.at(-1)?.push(to);
      else fresh.push([from, to]);
    }
    previousWasFresh = !owner;
  }
  for (const overlap of overlaps) split.duplicates.push(describe(run, overlap, fresh.length === 0, split));
  return fresh.map((vertices) => ({ line: run.line, vertices }));
}

function edgeKey(from: number, to: number): number {
  return Math.min(from, to) * 2 ** 26 + Math.max(from, to);
}

function runsAgainst(run: Run, isUpwards: boolean, other: EdgeOwner): boolean {
  return isOneWay(run) && isOneWay(other.run) && isUpwards !== other.isUpwards;
}

interface OverlapEdge {
  from: number;
  to: number;
  owner: EdgeOwner;
  isReversed: boolean;
  isNext: boolean;
}

function extendOverlap(overlaps: Overlap[], edge: OverlapEdge): void {
  const last = overlaps.at(-1);
  if (last && edge.isNext && last.owner.run === edge.owner.run && last.vertices.at(-1) === edge.from) {
    last.vertices.push(edge.to);
  } else {
    overlaps.push({ vertices: [edge.from, edge.to], owner: edge.owner, isReversed: edge.isReversed });
  }
}

function describe(run: Run, overlap: Overlap, isWhole: boolean, split: Gathering): DuplicateFinding {
  const places = overlap.vertices.flatMap((vertex) => split.places[vertex] ?? []);
  const line = overlap.vertices.map((vertex): Position => split.places[vertex] ?? [0, 0]);
  return {
    droppedId: run.line.sourceId,
    keptId: overlap.owner.run.line.sourceId,
    extent: isWhole ? 'whole' : 'part',
    isReversed: overlap.isReversed,
    lengthM: lineLengthM(line),
    differsIn: differences(run.line.road, overlap.owner.run.line.road, overlap.isReversed),
    at: [places[0] ?? 0, places[1] ?? 0],
  };
}

function differences(dropped: RoadAttributes, kept: RoadAttributes, isReversed: boolean): string[] {
  const found: string[] = [];
  if (dropped.roadClass.value !== kept.roadClass.value) found.push('class');
  if (!dropped.name.isAssumed && dropped.name.value !== kept.name.value) found.push('name');
  if (!dropped.lanes.isAssumed && dropped.lanes.value !== kept.lanes.value) found.push('lanes');
  const isTurned = isReversed && dropped.direction.value !== 'both';
  if ((dropped.direction.value === 'both') !== (kept.direction.value === 'both') || isTurned) found.push('direction');
  if (!dropped.speedKmPerH.isAssumed && dropped.speedKmPerH.value !== kept.speedKmPerH.value) found.push('speed');
  if (dropped.isBridge.value !== kept.isBridge.value) found.push('bridge');
  return found;
}

function noteOpposed(run: Run, other: Run, { opposed, split }: EdgeContext): void {
  const ids = [other.line.sourceId, run.line.sourceId];
  if (opposed.has(ids.join())) return;
  opposed.set(ids.join(), {
    kind: 'opposed-one-ways',
    sentence: `Lines ${ids.join(' and ')} lie on each other, one-way in opposite directions; both are kept.`,
    sourceIds: ids,
    at: split.places[run.vertices[0] ?? 0] ?? null,
  });
}

function findNodes(runs: readonly Run[], placeCount: number): Uint8Array {
  const isNode = new Uint8Array(placeCount);
  const isPassed = new Uint8Array(placeCount);
  for (const { vertices } of runs) {
    for (const vertex of vertices) {
      if (isPassed[vertex] === 1) isNode[vertex] = 1;
      isPassed[vertex] = 1;
    }
    isNode[vertices[0] ?? 0] = 1;
    isNode[vertices.at(-1) ?? 0] = 1;
  }
  return isNode;
}

function cutAtNodes(run: Run, isNode: Uint8Array): Run[] {
  const pieces: Run[] = [];
  let startsAt = 0;
  for (let at = 1; at < run.vertices.length; at += 1) {
    if (isNode[run.vertices[at] ?? 0] !== 1) continue;
    pieces.push({ line: run.line, vertices: run.vertices.slice(startsAt, at + 1) });
    startsAt = at;
  }
  return pieces;
}
