import { type Edge, EdgeGrid } from './edge-grid';
import { NEAR_MISS_M } from './limits';
import { type NetworkNode, type NetworkWarning } from './network';
import { distanceM, metresPerDegree, type Position, positionKey } from './position';

/** What the search for gaps needs of a segment. */
export interface DrawnSegment {
  sourceId: string;
  fromNode: number;
  toNode: number;
  level: number;
  positions: readonly Position[];
}

/**
 * Places where a file was probably meant to join and does not: dead ends within a metre of another road, and lines of
 * one level that cross without a common vertex. Nothing is joined; each is reported with its place.
 */
export function findLooseEnds(nodes: readonly NetworkNode[], segments: readonly DrawnSegment[]): NetworkWarning[] {
  const edges = segments.flatMap(({ positions }, segment) =>
    positions.slice(1).map((to, at): Edge => ({ segment, from: positions[at] ?? to, to })),
  );
  const grid = new EdgeGrid(edges);
  return [...nearMisses(nodes, segments, grid), ...bareCrossings(segments, grid)];
}

function nearMisses(
  nodes: readonly NetworkNode[],
  segments: readonly DrawnSegment[],
  grid: EdgeGrid,
): NetworkWarning[] {
  const reported = new Set<string>();
  return segments.flatMap((segment, own) =>
    [segment.fromNode, segment.toNode].flatMap((end): NetworkWarning[] => {
      const node = nodes[end];
      if (node?.degree !== 1) return [];
      const nearest = nearestOther(node.position, own, grid);
      const other = nearest ? segments[nearest.segment] : undefined;
      const pair = [segment.sourceId, other?.sourceId ?? ''].sort().join();
      if (!nearest || !other || reported.has(pair)) return [];
      reported.add(pair);
      const gap = nearest.gapM < 0.1 ? 'less than 0.1' : nearest.gapM.toFixed(1);
      return [
        {
          kind: 'near-miss',
          sentence: `Line ${segment.sourceId} ends ${gap} m from line ${other.sourceId} without joining it.`,
          sourceIds: [segment.sourceId, other.sourceId],
          at: node.position,
        },
      ];
    }),
  );
}

function nearestOther(place: Position, own: number, grid: EdgeGrid): { segment: number; gapM: number } | null {
  const { lonM, latM } = metresPerDegree(place[1]);
  const marginDeg = NEAR_MISS_M / Math.max(Math.min(lonM, latM), 1);
  let best: { segment: number; gapM: number } | null = null;
  for (const edge of grid.near(place, marginDeg)) {
    if (edge.segment === own) continue;
    const gapM = distanceM(place, footOn(edge, place));
    if (gapM < NEAR_MISS_M && gapM < (best?.gapM ?? Infinity)) best = { segment: edge.segment, gapM };
  }
  return best;
}

/** The nearest place on an edge, on the plane that touches the earth at `place`. */
function footOn({ from, to }: Edge, place: Position): Position {
  const { lonM, latM } = metresPerDegree(place[1]);
  const [eastM, northM] = [(to[0] - from[0]) * lonM, (to[1] - from[1]) * latM];
  const alongM2 = (place[0] - from[0]) * lonM * eastM + (place[1] - from[1]) * latM * northM;
  const share = Math.min(Math.max(alongM2 / (eastM * eastM + northM * northM || 1), 0), 1);
  return [from[0] + (to[0] - from[0]) * share, from[1] + (to[1] - from[1]) * share];
}

function bareCrossings(segments: readonly DrawnSegment[], grid: EdgeGrid): NetworkWarning[] {
  const found = new Map<string, NetworkWarning>();
  for (const cell of grid.groups()) {
    cell.forEach((one, at) => {
      for (const other of cell.slice(at + 1)) {
        const at = crossingOf(one, other);
        const [first, second] = [segments[one.segment], segments[other.segment]];
        if (!at || !first || !second || first.level !== second.level) continue;
        const sourceIds = [first.sourceId, second.sourceId];
        found.set(positionKey(at), {
          kind: 'crossing-not-joined',
          sentence: `Lines ${sourceIds.join(' and ')} cross on one level without a common vertex, so they are not joined.`,
          sourceIds,
          at,
        });
      }
    });
  }
  return [...found.values()];
}

/** Where two edges cross in their inner parts, or null; touching ends do not count. */
function crossingOf(one: Edge, other: Edge): Position | null {
  const [eastOne, northOne] = [one.to[0] - one.from[0], one.to[1] - one.from[1]];
  const [eastOther, northOther] = [other.to[0] - other.from[0], other.to[1] - other.from[1]];
  const turn = eastOne * northOther - northOne * eastOther;
  if (turn === 0) return null;
  const [east, north] = [other.from[0] - one.from[0], other.from[1] - one.from[1]];
  const shareOne = (east * northOther - north * eastOther) / turn;
  const shareOther = (east * northOne - north * eastOne) / turn;
  const isInner = (share: number) => share > 1e-9 && share < 1 - 1e-9;
  if (!isInner(shareOne) || !isInner(shareOther)) return null;
  return [one.from[0] + eastOne * shareOne, one.from[1] + northOne * shareOne];
}
