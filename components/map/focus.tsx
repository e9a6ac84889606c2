'use client';

import L from 'leaflet';
import { useEffect } from 'react';
import { useMap } from 'react-leaflet';
import { type LatLon } from './map-content';

const closeZoom = 16.5;

/** Brings a place close and puts a ring round it. */
export function Focus({ at: [latDeg, lonDeg] }: Readonly<{ at: LatLon }>) {
  const map = useMap();
  useEffect(() => {
    const isStill = matchMedia('(prefers-reduced-motion: reduce)').matches;
    map.setView([latDeg, lonDeg], Math.max(map.getZoom(), closeZoom), { animate: !isStill });
    const ring = L.circleMarker([latDeg, lonDeg], {
      radius: 18,
      weight: 3,
      fill: false,
      interactive: false,
      className: 'stroke-ink',
    }).addTo(map);
    return () => void ring.remove();
  }, [map, latDeg, lonDeg]);
  return null;
}
