'use client';

import 'leaflet/dist/leaflet.css';
import { type ReactNode } from 'react';
import { MapContainer, TileLayer } from 'react-leaflet';
import { classNames } from '@/components/ui/class-names';
import { boundsOf } from './bounds';
import { Focus } from './focus';
import { type LatLon, type MapBaseFeature, type MapSegment, type MapTruck } from './map-content';
import { Roads } from './roads';
import { Trucks } from './trucks';
import { ZoomButtons } from './zoom-buttons';

export type RoadMapProps = Readonly<{
  segments: readonly MapSegment[];
  /** A style code (`styleCode` of `road-style.ts`) for each segment, in their order. */
  styles: Uint8Array;
  baseFeatures?: readonly MapBaseFeature[];
  selectedId?: number | null;
  highlightIds?: readonly number[];
  onSelect?: (id: number) => void;
  /** What a pointer resting on a road is told: "Ridge Road, icing". */
  describe?: (index: number) => string;
  trucks?: readonly MapTruck[];
  /** A change of it fits the map to the roads again. */
  fitKey?: string | number;
  /** A place to bring close and ring; another key shows it anew. */
  focus?: Readonly<{ at: LatLon; key: string | number }> | null;
  /** Over the map, in its upper left corner. */
  legend?: ReactNode;
  /** Whose data are shown; nothing when empty. */
  attribution?: string;
  /** An XYZ tile address such as `https://tiles.example/{z}/{x}/{y}.png`; none is needed. */
  tileUrl?: string;
  /** What the map shows, for screen readers. */
  label: string;
  className?: string;
}>;

const quiet: readonly MapBaseFeature[] = [];

/** Roads on one canvas over the land. Props in, the chosen road out; the list beside it is its twin for keyboards. */
export function RoadMap(props: RoadMapProps) {
  const { segments, baseFeatures = quiet, trucks = [], legend, attribution, tileUrl, label, className } = props;
  return (
    <div
      role="region"
      aria-label={label}
      className={classNames(
        'relative isolate h-full overflow-hidden',
        baseFeatures.length > 0 ? 'bg-sea' : 'bg-ground',
        className,
      )}
    >
      <MapContainer
        bounds={boundsOf(segments, baseFeatures)}
        boundsOptions={{ padding: [24, 24] }}
        zoomControl={false}
        attributionControl={false}
        zoomSnap={0.25}
        zoomDelta={0.5}
        wheelPxPerZoomLevel={120}
        minZoom={4}
        maxZoom={19}
        className="size-full"
        style={{ background: 'transparent', font: 'inherit', outlineOffset: '-3px' }}
      >
        {tileUrl ? <TileLayer url={tileUrl} opacity={0.4} /> : null}
        <Roads {...props} baseFeatures={baseFeatures} />
        <Trucks trucks={trucks} />
        {props.focus ? <Focus key={props.focus.key} at={props.focus.at} /> : null}
        <ZoomButtons segments={segments} baseFeatures={baseFeatures} />
      </MapContainer>
      {legend ? <div className="absolute top-3 left-3 z-[500] max-w-[calc(100%-1.5rem)]">{legend}</div> : null}
      {attribution ? (
        <p className="absolute right-0 bottom-0 z-[500] bg-ground/75 px-1.5 text-xs text-soft">{attribution}</p>
      ) : null}
    </div>
  );
}
