'use client';

import dynamic from 'next/dynamic';

/** The map, loaded in the browser only: Leaflet cannot be read on a server. */
export const RoadMap = dynamic(() => import('./road-map').then((module) => module.RoadMap), {
  ssr: false,
  loading: () => <p className="grid h-full place-items-center bg-sea text-soft">Drawing the map</p>,
});

export type { RoadMapProps } from './road-map';
