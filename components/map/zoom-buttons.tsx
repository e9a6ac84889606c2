'use client';

import L from 'leaflet';
import { useEffect, useRef } from 'react';
import { useMap } from 'react-leaflet';
import { boundsOf } from './bounds';
import { type MapBaseFeature, type MapSegment } from './map-content';

const look =
  'grid size-9 place-items-center bg-panel text-lg font-semibold text-soft transition-colors hover:bg-raised hover:text-ink focus-visible:z-10';

type ZoomButtonsProps = Readonly<{ segments: readonly MapSegment[]; baseFeatures: readonly MapBaseFeature[] }>;

export function ZoomButtons({ segments, baseFeatures }: ZoomButtonsProps) {
  const map = useMap();
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (box.current) L.DomEvent.disableClickPropagation(box.current);
  }, []);
  const fit = () => map.fitBounds(boundsOf(segments, baseFeatures), { padding: [24, 24] });
  return (
    <div
      ref={box}
      className="absolute top-3 right-3 z-[500] md:top-auto md:bottom-7 grid divide-y overflow-hidden rounded-md border shadow-lg"
    >
      <button type="button" className={look} aria-label="Zoom in" onClick={() => map.zoomIn()}>
        +
      </button>
      <button type="button" className={look} aria-label="Zoom out" onClick={() => map.zoomOut()}>
        {'\u2212'}
      </button>
      <button type="button" className={`${look} text-sm`} aria-label="Show all roads" onClick={fit}>
        All
      </button>
    </div>
  );
}
