import { type ClassMapping, classTarget } from './assumed';
import { type Arc, findParts, findReach } from './connectivity';
import {
  type AssumedAttribute,
  assumedAttributes,
  type ClassSummary,
  type ComponentFinding,
  type NetworkNode,
  type NetworkSegment,
  type TrapFinding,
  type TrapKind,
} from './network';
import { boundsOf, middleOf } from './extent';
import { type Position } from './position';

/** Lane-kilometres of a segment: its length times its lanes. */
export function laneKmOf({ lengthM, lanes }: Pick<NetworkSegment, 'lengthM' | 'lanes'>): number {
  return (lengthM / 1000) * lanes;
}

function arcsOf(segments: readonly NetworkSegment[]): Arc[] {
  return segments.map(({ fromNode, toNode, isOneWay }) => ({ from: fromNode, to: toNode, isOneWay }));
}

function placeOn(segments: readonly NetworkSegment[]): Position {
  const longest = segments.reduce<NetworkSegment | undefined>(
    (best, segment) => (best && best.lengthM >= segment.lengthM ? best : segment),
    undefined,
  );
  return (longest && middleOf(longest.positions)) ?? [0, 0];
}

function groupBy<T>(list: readonly T[], keyOf: (entry: T, at: number) => number): Map<number, T[]> {
  const groups = new Map<number, T[]>();
  list.forEach((entry, at) => {
    const key = keyOf(entry, at);
    const group = groups.get(key);
    if (group) group.push(entry);
    else groups.set(key, [entry]);
  });
  return groups;
}

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);

const lengthKmOf = (segments: readonly NetworkSegment[]): number => sum(segments.map(({ lengthM }) => lengthM / 1000));

/** Parts that hang together regardless of direction, the one with most lane-kilometres first. */
export function summariseComponents(
  nodes: readonly NetworkNode[],
  segments: readonly NetworkSegment[],
): ComponentFinding[] {
  const parts = findParts(nodes.length, arcsOf(segments));
  const nodeCounts = groupBy(nodes, (_, node) => parts[node] ?? 0);
  return [...groupBy(segments, ({ fromNode }) => parts[fromNode] ?? 0)]
    .map(([part, members]) => ({
      segments: members.length,
      nodes: nodeCounts.get(part)?.length ?? 0,
      lengthKm: lengthKmOf(members),
      laneKm: sum(members.map(laneKmOf)),
      bounds: boundsOf(members.map(({ positions }) => positions)) ?? [0, 0, 0, 0],
      at: placeOn(members),
    }))
    .sort((one, other) => other.laneKm - one.laneKm);
}

/**
 * Roads that a truck cannot both reach and leave along the one-way directions, grouped where they touch: seen from the
 * largest circle of mutual reach of each part. At the edge of a cut-out map every carriageway ends so.
 */
export function summariseTraps(nodes: readonly NetworkNode[], segments: readonly NetworkSegment[]): TrapFinding[] {
  const reach = findReach(nodes.length, arcsOf(segments));
  const kinds: TrapKind[] = ['no-way-out', 'no-way-in', 'through-only'];
  return kinds.flatMap((kind) => {
    const isTrapped = (node: number) => reach[node] === kind;
    const members = segments.filter(({ fromNode, toNode }) => isTrapped(fromNode) || isTrapped(toNode));
    const own = members.filter((segment) => worseOf(reach[segment.fromNode], reach[segment.toNode]) === kind);
    const inner = own.filter(({ fromNode, toNode }) => isTrapped(fromNode) && isTrapped(toNode));
    const groups = findParts(nodes.length, arcsOf(inner));
    const groupOf = ({ fromNode, toNode }: NetworkSegment) => groups[isTrapped(fromNode) ? fromNode : toNode] ?? 0;
    return [...groupBy(own, groupOf).values()].map((trapped) => ({
      kind,
      nodes: new Set(trapped.flatMap(({ fromNode, toNode }) => [fromNode, toNode].filter(isTrapped))).size,
      segments: trapped.length,
      lengthKm: lengthKmOf(trapped),
      at: placeOn(trapped),
    }));
  });
}

/** Between a trapped node and the core the segment belongs to the trap; between two kinds, to the stricter. */
function worseOf(one: string | undefined, other: string | undefined): string | undefined {
  const order = ['core', 'no-way-in', 'no-way-out', 'through-only'];
  return order.indexOf(one ?? 'core') >= order.indexOf(other ?? 'core') ? one : other;
}

/** How many segments carry each assumed attribute. */
export function countAssumed(segments: readonly NetworkSegment[]): Record<AssumedAttribute, number> {
  const counts = Object.fromEntries(assumedAttributes.map((name) => [name, 0])) as Record<AssumedAttribute, number>;
  for (const { assumed } of segments) for (const name of assumed) counts[name] += 1;
  return counts;
}

/** One row a road class of the file, the longest first; classes that are left out have lines but no segments. */
export function summariseClasses(
  lines: readonly { roadClass: string; lengthM: number }[],
  segments: readonly NetworkSegment[],
  mapping: ClassMapping,
): ClassSummary[] {
  const rows = new Map<string, ClassSummary>();
  for (const { roadClass, lengthM } of lines) {
    const target = classTarget(roadClass, mapping);
    const row = rows.get(roadClass) ?? { roadClass, target, lines: 0, segments: 0, lengthKm: 0, laneKm: 0 };
    row.lines += 1;
    // what is left out shows the length in the file, what is used the length that was built
    if (target === 'leave-out') row.lengthKm += lengthM / 1000;
    rows.set(roadClass, row);
  }
  for (const segment of segments) {
    const row = rows.get(segment.roadClass);
    if (!row) continue;
    row.segments += 1;
    row.lengthKm += segment.lengthM / 1000;
    row.laneKm += laneKmOf(segment);
  }
  return [...rows.values()].sort((one, other) => other.lengthKm - one.lengthKm);
}
