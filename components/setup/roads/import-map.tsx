'use client';

import { RoadMap } from '@/components/map';
import { type MapSegment } from '@/components/map/map-content';
import { type RoadStyle, styleCode } from '@/components/map/road-style';
import { type NetworkImportView, type RoadChange } from '@/lib/contracts/network';
import { type Finding } from './findings';
import { changeWords } from './words';

export type ImportMapProps = Readonly<{
  view: NetworkImportView;
  shown: Finding | null;
  selectedId: number | null;
  onSelect: (id: number) => void;
  className?: string;
}>;

const styleOf: Readonly<Record<RoadChange, RoadStyle>> = {
  added: 'added',
  changed: 'closing',
  same: 'plain',
  retired: 'removed',
};

/** The roads of an import, coloured by what saving does to them. */
export function ImportMap({ view, shown, selectedId, onSelect, className }: ImportMapProps) {
  const { roads } = view;
  const segments: MapSegment[] = roads.map(({ name, serviceClass, lanes, path }, id) => ({
    id,
    name,
    serviceClass,
    lanes,
    path,
  }));
  const styles = Uint8Array.from(roads, ({ change }) => styleCode(styleOf[change]));
  const ids = new Set(shown?.sourceIds);
  return (
    <RoadMap
      label={`Roads of ${view.fileName}`}
      segments={segments}
      styles={styles}
      selectedId={selectedId}
      highlightIds={ids.size === 0 ? [] : roads.flatMap(({ sourceId }, id) => (ids.has(sourceId) ? [id] : []))}
      onSelect={onSelect}
      describe={(index) => {
        const road = roads[index];
        return road ? `${road.name}, class ${road.serviceClass}, ${changeWords[road.change]}` : '';
      }}
      focus={shown?.at ? { at: [shown.at[1], shown.at[0]], key: shown.key } : null}
      attribution={view.attribution}
      {...(className ? { className } : {})}
    />
  );
}
