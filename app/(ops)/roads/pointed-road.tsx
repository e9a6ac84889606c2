'use client';

import { bandWords, holdInFigures } from '@/components/roads/margin-band';
import { type RoadNow } from '@/components/roads/road-now';
import { Button } from '@/components/ui/button';
import { Tag } from '@/components/ui/tag';

type PointedRoadProps = Readonly<{ road: RoadNow; longestMin: number; onOpen: () => void }>;

/** On a phone the map has the window to itself: the chosen road lies over its foot. */
export function PointedRoad({ road, longestMin, onOpen }: PointedRoadProps) {
  return (
    <div className="absolute inset-x-3 bottom-7 z-[500] flex items-center gap-3 rounded-md border bg-panel/95 py-2 pr-2 pl-3 shadow-lg md:hidden">
      <div className="min-w-0 flex-1">
        <p className="truncate font-semibold">{road.name}</p>
        <p className="flex gap-3 text-sm text-soft">
          <Tag tone={road.band === 'unknown' ? 'plain' : road.band}>{bandWords[road.band]}</Tag>
          holds {holdInFigures(road.holdMin, longestMin)}
        </p>
      </div>
      <Button onClick={onOpen}>Open</Button>
    </div>
  );
}
