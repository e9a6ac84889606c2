import { distanceM, type PlanePoint } from './plane';
import { trucks, yards } from './people';
import { type RoadNetwork, type RoadSegment } from './roads';
import { type RouteName, routeNames } from './road-words';

/** A free list of roads that one truck does in every pass, in driving order. */
export interface StandingRoute {
  name: RouteName;
  yard: string;
  truckNumber: number;
  segmentKeys: string[];
}

/** The middle of the road with this name; for placing yards and stations beside it. */
export function placeBeside(network: RoadNetwork, roadName: string): PlanePoint {
  const segment = network.segments.find(({ name }) => name === roadName);
  const at = segment?.line[Math.floor(segment.line.length / 2)];
  if (!at) throw new RangeError(`no road is named ${roadName}`);
  return at;
}

/** Where a truck would enter the segment coming from `from`, and where it would leave it. */
function entry({ line, isOneWay }: RoadSegment, from: PlanePoint): { awayM: number; exit: PlanePoint } {
  const start = line[0] ?? from;
  const end = line.at(-1) ?? from;
  const startM = distanceM(start, from);
  const endM = distanceM(end, from);
  return isOneWay || startM <= endM ? { awayM: startM, exit: end } : { awayM: endM, exit: start };
}

/** Always on to the nearest road not yet done. */
function nearestFirst(segments: readonly RoadSegment[], start: PlanePoint): string[] {
  const left = new Set(segments);
  const keys: string[] = [];
  let here = start;
  while (left.size > 0) {
    let next: { segment: RoadSegment; awayM: number; exit: PlanePoint } | undefined;
    for (const segment of left) {
      const candidate = entry(segment, here);
      if (!next || candidate.awayM < next.awayM) next = { segment, ...candidate };
    }
    if (!next) break;
    left.delete(next.segment);
    keys.push(next.segment.key);
    here = next.exit;
  }
  return keys;
}

/** The eight standing routes: every segment on exactly one of them, nearest first from the truck's yard. */
export function standingRoutes(network: RoadNetwork): StandingRoute[] {
  return routeNames.map((name) => {
    const truck = trucks.find(({ route }) => route === name);
    const yard = yards.find((candidate) => candidate.name === truck?.yard);
    if (!truck || !yard) throw new RangeError(`no truck or yard for the route ${name}`);
    const segments = network.segments.filter(({ route }) => route === name);
    return {
      name,
      yard: yard.name,
      truckNumber: truck.number,
      segmentKeys: nearestFirst(segments, placeBeside(network, yard.besideRoad)),
    };
  });
}
