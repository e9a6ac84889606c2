'use client';

import { Figure } from '@/components/ui/figure';
import { type RoadOption } from './route-editor';

/** The roads of a route in the order they are treated. */
export function RouteRoads({ roads }: Readonly<{ roads: readonly RoadOption[] }>) {
  return (
    <ol tabIndex={0} aria-label="Roads in order" className="max-h-[60vh] overflow-y-auto">
      {roads.map((road, index) => (
        <li key={`${index}-${road.id}`} className="flex items-baseline gap-3 border-t py-1.5">
          <span className="w-8 shrink-0 text-right font-mono text-soft">{index + 1}</span>
          <span className="min-w-0 flex-1">{road.name}</span>
          <span className="text-soft">{road.serviceClass}</span>
          <Figure value={road.lengthM} quantity="distance" className="w-20 text-right" />
        </li>
      ))}
    </ol>
  );
}
