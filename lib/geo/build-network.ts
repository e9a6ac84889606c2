import { type ClassMapping, classTarget, isKnownRoadClass } from './assumed';
import { geometryHash } from './geometry-hash';
import { findLooseEnds } from './loose-ends';
import { nameRoads } from './name-roads';
import {
  type AssumedAttribute,
  type Network,
  type NetworkNode,
  type NetworkReport,
  type NetworkSegment,
  type NetworkWarning,
  type SourceLine,
} from './network';
import { boundsOf } from './extent';
import { lineLengthM, type Position, positionKey } from './position';
import { type RoadAttributes, readRoadTags } from './road-tags';
import { type AttributedLine, type Run, splitLines, type SplitLines } from './split-lines';
import { countAssumed, laneKmOf, summariseClasses, summariseComponents, summariseTraps } from './summarise-network';
import { levelWarnings, tagWarnings } from './tag-warnings';

export interface BuildOptions {
  /** Road class → service class, where it departs from the table of `assumed.ts`. */
  mapping?: ClassMapping;
  /** Counted by the reader of the file; passed through into the report. */
  skipped?: Readonly<Record<string, number>>;
  warnings?: readonly NetworkWarning[];
}

/**
 * Lines with tags → a network of nodes and segments, with a report of all that was dropped, assumed or looks wrong.
 * Lines are cut at every vertex that is shared (see `splitLines`), classes are mapped to service classes or left out,
 * silent tags are filled from the class and named in `assumed`. The same lines in the same order always give the
 * same network. Σ segment length = Σ length of the lines used − dropped duplicates.
 */
export function buildNetwork(lines: readonly SourceLine[], options: BuildOptions = {}): Network {
  const mapping = options.mapping ?? {};
  const attributed = lines.map((line): AttributedLine => ({ ...line, road: readRoadTags(line.tags) }));
  const used = attributed.filter(({ road }) => classTarget(road.roadClass.value, mapping) !== 'leave-out');
  const split = splitLines(used);
  const { nodes, segments } = assemble(split, mapping);
  const drawn = segments.map((segment, at) => ({ ...segment, level: split.pieces[at]?.line.road.level ?? 0 }));
  const warnings = [
    ...(options.warnings ?? []),
    ...split.warnings,
    ...tagWarnings(used, isKnownRoadClass),
    ...findLooseEnds(nodes, drawn),
    ...levelWarnings(split),
  ];
  const classLines = attributed.map(({ road, positions }) => ({
    roadClass: road.roadClass.value,
    lengthM: lineLengthM(positions),
  }));
  const report: NetworkReport = {
    linesRead: lines.length,
    linesUsed: new Set(split.pieces.map(({ line }) => line)).size,
    ...measure(nodes, segments),
    skipped: options.skipped ?? {},
    classes: summariseClasses(classLines, segments, mapping),
    assumedCounts: countAssumed(segments),
    duplicates: split.duplicates,
    zeroLength: split.zeroLength,
    components: summariseComponents(nodes, segments),
    traps: summariseTraps(nodes, segments),
    warnings,
    bounds: boundsOf(segments.map(({ positions }) => positions)),
  };
  return { nodes, segments, report };
}

function measure(nodes: readonly NetworkNode[], segments: readonly NetworkSegment[]) {
  return {
    segments: segments.length,
    nodes: nodes.length,
    lengthKm: segments.reduce((total, { lengthM }) => total + lengthM / 1000, 0),
    laneKm: segments.reduce((total, segment) => total + laneKmOf(segment), 0),
    oneWaySegments: segments.filter(({ isOneWay }) => isOneWay).length,
    bridges: segments.filter(({ isBridge }) => isBridge).length,
    deadEnds: nodes.filter(({ degree }) => degree === 1).length,
  };
}

function assemble(split: SplitLines, mapping: ClassMapping): { nodes: NetworkNode[]; segments: NetworkSegment[] } {
  const nodes: (NetworkNode & { degree: number })[] = [];
  const numbers = new Map<number, number>();
  const nodeAt = (vertex: number): number => {
    const number = numbers.get(vertex) ?? nodes.length;
    const node = nodes[number];
    const position = split.places[vertex] ?? [0, 0];
    if (node) node.degree += 1;
    else nodes.push({ sourceKey: positionKey(position), position, degree: 1 });
    numbers.set(vertex, number);
    return number;
  };
  const keys = new Map<string, number>();
  const segments = split.pieces.map((piece): NetworkSegment => {
    const ends = { fromNode: nodeAt(piece.vertices[0] ?? 0), toNode: nodeAt(piece.vertices.at(-1) ?? 0) };
    const positions = piece.vertices.map((vertex): Position => split.places[vertex] ?? [0, 0]);
    return { ...describePiece(piece, mapping, positions), ...ends, sourceKey: uniqueKey(piece, positions, keys) };
  });
  const names = nameRoads(segments);
  return { nodes, segments: segments.map((segment, at) => ({ ...segment, name: names[at] ?? segment.name })) };
}

/** The part's place in its line is left out on purpose: a new side road would otherwise rename all the later parts. */
function uniqueKey(piece: Run, positions: readonly Position[], keys: Map<string, number>): string {
  const key = `${piece.line.sourceId || 'line'}:${geometryHash(positions)}`;
  const times = (keys.get(key) ?? 0) + 1;
  keys.set(key, times);
  return times === 1 ? key : `${key}:${times}`;
}

type Described = Omit<NetworkSegment, 'fromNode' | 'toNode' | 'sourceKey'>;

function describePiece({ line }: Run, mapping: ClassMapping, positions: readonly Position[]): Described {
  const { road } = line;
  const target = classTarget(road.roadClass.value, mapping);
  // turned round with the line
  const isTurned = road.direction.value === 'backward';
  return {
    sourceId: line.sourceId,
    name: road.name.value,
    ref: road.ref,
    roadClass: road.roadClass.value,
    serviceClass: target === 'leave-out' ? 'D' : target,
    lanes: road.lanes.value,
    lanesForward: isTurned ? road.lanesBackward.value : road.lanesForward.value,
    lanesBackward: isTurned ? road.lanesForward.value : road.lanesBackward.value,
    widthM: road.widthM.value,
    surface: road.surface.value,
    isBridge: road.isBridge.value,
    isTunnel: road.isTunnel.value,
    isOneWay: road.direction.value !== 'both',
    speedKmPerH: road.speedKmPerH.value,
    heightM: line.heightM,
    lengthM: lineLengthM(positions),
    positions,
    assumed: assumedOf(road),
    tags: line.tags,
  };
}

/** Exposure is in no tag: it is taken as open until somebody says otherwise. */
function assumedOf(road: RoadAttributes): AssumedAttribute[] {
  const flags: Record<AssumedAttribute, boolean> = {
    name: road.name.isAssumed,
    roadClass: road.roadClass.isAssumed,
    lanes: road.lanes.isAssumed,
    widthM: road.widthM.isAssumed,
    speedKmPerH: road.speedKmPerH.isAssumed,
    surface: road.surface.isAssumed,
    isOneWay: road.direction.isAssumed,
    exposure: true,
  };
  return (Object.keys(flags) as AssumedAttribute[]).filter((name) => flags[name]);
}
