import { findAgency } from '@/db/queries/agency';
import {
  findNetworkVersion,
  listBaseFeatures,
  listRoads,
  type NetworkVersionRecord,
  type RoadRecord,
} from '@/db/queries/road-map';
import { exposures, roadFlags, RoadMapView, surfaces } from '@/lib/contracts/road-map';

interface Built {
  version: string;
  text: string;
}

// One copy for pages and route handlers, which the bundler gives a module each.
const kept = globalThis as typeof globalThis & { rimewrightRoadMap?: Built };

function nameVersion({ roads, changedAt, newestId, features }: NetworkVersionRecord, attribution: string): string {
  return [roads, changedAt?.getTime() ?? 0, newestId, features, attribution.length].join('-');
}

/** The network as columns: see `RoadMapView`. */
export function presentRoads(
  roads: readonly RoadRecord[],
): Omit<RoadMapView, 'version' | 'attribution' | 'baseFeatures'> {
  const names = [...new Set(roads.map((road) => road.name))];
  const indexOfName = new Map(names.map((name, index) => [name, index]));
  const placeIn = (words: readonly string[], word: string) => Math.max(0, words.indexOf(word));
  return {
    ids: roads.map((road) => road.id),
    names,
    nameOf: roads.map((road) => indexOfName.get(road.name) ?? 0),
    serviceClasses: roads.map((road) => road.serviceClass).join(''),
    lanes: roads.map((road) => road.lanes),
    lengthsM: roads.map((road) => road.lengthM),
    surfaceOf: roads.map((road) => placeIn(surfaces, road.surface)),
    exposureOf: roads.map((road) => placeIn(exposures, road.exposure)),
    flags: roads.map(
      (road) =>
        (road.isBridge ? roadFlags.bridge : 0) |
        (road.isTunnel ? roadFlags.tunnel : 0) |
        (road.isSensitive ? roadFlags.sensitive : 0) |
        (road.isOneWay ? roadFlags.oneWay : 0),
    ),
    paths: roads.map((road) => road.path),
  };
}

/** The map of roads as JSON text, made once for each version of the network. */
export async function readRoadMapText(): Promise<Built> {
  const [record, agency] = await Promise.all([findNetworkVersion(), findAgency()]);
  const version = nameVersion(record, agency.attribution);
  if (kept.rimewrightRoadMap?.version === version) return kept.rimewrightRoadMap;
  const [roads, baseFeatures] = await Promise.all([listRoads(), listBaseFeatures()]);
  const view = RoadMapView.parse({ version, attribution: agency.attribution, ...presentRoads(roads), baseFeatures });
  kept.rimewrightRoadMap = { version, text: JSON.stringify(view) };
  return kept.rimewrightRoadMap;
}
