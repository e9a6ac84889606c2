import { type MapBaseFeature, type MapSegment } from '@/components/map/map-content';
import { roadFlags, surfaces, type RoadMapView } from '@/lib/contracts/road-map';
import { decodePolyline } from '@/lib/geo/encoded-polyline';
import { type RoadFacts } from './road-now';

export interface RoadNetwork {
  readonly version: string;
  readonly attribution: string;
  readonly segments: readonly MapSegment[];
  readonly baseFeatures: readonly MapBaseFeature[];
  readonly facts: readonly RoadFacts[];
  readonly indexById: ReadonlyMap<number, number>;
}

function factsOf(view: RoadMapView, index: number): RoadFacts {
  const lengthM = view.lengthsM[index] ?? 0;
  const lanes = view.lanes[index] ?? 1;
  const flags = view.flags[index] ?? 0;
  return {
    lengthM,
    lanes,
    laneM: lengthM * lanes,
    surface: surfaces[view.surfaceOf[index] ?? 0] ?? 'asphalt',
    isBridge: (flags & roadFlags.bridge) !== 0,
    isSensitive: (flags & roadFlags.sensitive) !== 0,
  };
}

/** The network's columns as roads that can be drawn. */
export function decodeRoads(view: RoadMapView): RoadNetwork {
  const segments = view.ids.map((id, index): MapSegment => ({
    id,
    name: view.names[view.nameOf[index] ?? -1] ?? '',
    serviceClass: view.serviceClasses[index] ?? 'D',
    lanes: view.lanes[index] ?? 1,
    path: decodePolyline(view.paths[index] ?? ''),
  }));
  return {
    version: view.version,
    attribution: view.attribution,
    segments,
    baseFeatures: view.baseFeatures.map((feature) => ({ ...feature, parts: feature.parts.map(decodePolyline) })),
    facts: view.ids.map((_, index) => factsOf(view, index)),
    indexById: new Map(view.ids.map((id, index) => [id, index])),
  };
}
