import L from 'leaflet';
import { type MapBaseFeature, type MapSegment } from './map-content';

/** The rectangle that holds every road (and the coast); the whole world when there is none. */
export function boundsOf(segments: readonly MapSegment[], baseFeatures: readonly MapBaseFeature[]): L.LatLngBounds {
  const bounds = L.latLngBounds([]);
  const extend = (path: readonly (readonly [number, number])[]) => {
    for (const [latDeg, lonDeg] of path) bounds.extend([latDeg, lonDeg]);
  };
  for (const segment of segments) extend(segment.path);
  for (const feature of baseFeatures) if (feature.kind === 'coast') feature.parts.forEach(extend);
  return bounds.isValid() ? bounds : L.latLngBounds([-60, -170], [75, 170]);
}
