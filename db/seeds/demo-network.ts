import { type Land } from '@/lib/skerrow/land';
import { type RoadNetwork, type RoadSegment } from '@/lib/skerrow/roads';
import { standingRoutes } from '@/lib/skerrow/standing-routes';
import { type Tx } from '../transaction';
import { idOf, insertKeyed, insertRows } from './insert-rows';
import { lineWkt, pointWkt, polygonWkt } from './wkt';

function baseFeatures(land: Land, network: RoadNetwork) {
  const feature = (kind: string, name: string, geometry: string, heightM: number | null = null) => ({
    kind,
    name,
    heightM,
    geometry,
  });
  return [
    feature('coast', 'Skerrow', polygonWkt(land.coast)),
    ...land.islets.map(({ name, line }) => feature('coast', name, polygonWkt(line))),
    ...land.lakes.map(({ name, line }) => feature('lake', name, polygonWkt(line))),
    ...land.rivers.map(({ name, line }) => feature('river', name, lineWkt(line))),
    ...land.contours.map(({ heightM, line }) => feature('contour', '', lineWkt(line), heightM)),
    ...network.towns.map(({ name, labelAt }) => feature('town', name, pointWkt(labelAt))),
    ...land.seaNames.map(({ name, at }) => feature('water-name', name, pointWkt(at))),
  ];
}

function segmentRow(segment: RoadSegment, nodeIds: ReadonlyMap<string, number>) {
  return {
    sourceKey: segment.key,
    fromNodeId: idOf(nodeIds, segment.fromNodeKey),
    toNodeId: idOf(nodeIds, segment.toNodeKey),
    name: segment.name,
    roadClass: segment.roadClass,
    serviceClass: segment.serviceClass,
    lanes: segment.lanes,
    widthM: segment.widthM,
    surface: segment.surface,
    isBridge: segment.isBridge,
    isTunnel: false,
    exposure: segment.exposure,
    speedKmPerH: segment.speedKmPerH,
    isOneWay: segment.isOneWay,
    isSensitive: segment.isSensitive,
    heightM: segment.heightM,
    lengthM: segment.lengthM,
    geometry: lineWkt(segment.line),
    assumed: [],
    edited: [],
    tags: {},
    updatedAt: new Date(0),
  };
}

/** Ground, nodes and segments; answers the segments' ids by their keys. */
export async function seedNetwork(
  tx: Tx,
  { land, network, anchorAt }: { land: Land; network: RoadNetwork; anchorAt: Date },
): Promise<ReadonlyMap<string, number>> {
  await insertRows(tx, { table: 'base_features', rows: baseFeatures(land, network) });
  const nodeIds = await insertKeyed(tx, {
    table: 'nodes',
    key: 'sourceKey',
    rows: network.nodes.map(({ key, at }) => ({ sourceKey: key, position: pointWkt(at) })),
  });
  return insertKeyed(tx, {
    table: 'segments',
    key: 'sourceKey',
    rows: network.segments.map((segment) => ({ ...segmentRow(segment, nodeIds), updatedAt: anchorAt })),
  });
}

export interface SeededRoute {
  id: number;
  name: string;
  truckNumber: number;
  yardName: string;
  segmentKeys: string[];
}

export async function seedRoutes(
  tx: Tx,
  network: RoadNetwork,
  ids: Record<'segments' | 'yards' | 'trucks', ReadonlyMap<string, number>>,
): Promise<SeededRoute[]> {
  const routes = standingRoutes(network);
  const routeIds = await insertKeyed(tx, {
    table: 'routes',
    key: 'name',
    rows: routes.map(({ name, yard, truckNumber }) => ({
      name,
      yardId: idOf(ids.yards, yard),
      truckId: idOf(ids.trucks, String(truckNumber)),
      isActive: true,
    })),
  });
  await insertRows(tx, {
    table: 'route_segments',
    rows: routes.flatMap(({ name, segmentKeys }) =>
      segmentKeys.map((key, index) => ({
        routeId: idOf(routeIds, name),
        position: index + 1,
        segmentId: idOf(ids.segments, key),
      })),
    ),
  });
  return routes.map(({ name, truckNumber, yard, segmentKeys }) => ({
    id: idOf(routeIds, name),
    name,
    truckNumber,
    yardName: yard,
    segmentKeys,
  }));
}
