'use client';

import { useQuery } from '@tanstack/react-query';
import { useDeferredValue, useState } from 'react';
import { RoadMap } from '@/components/map';
import { type RoadNetwork } from '@/components/roads/decode-roads';
import { decodeStorm, stripOf, type Storm } from '@/components/roads/decode-storm';
import { bandWords } from '@/components/roads/margin-band';
import { MarginLegend } from '@/components/roads/margin-legend';
import { RefreezeList } from '@/components/roads/refreeze-list';
import { bandsAt, byUrgency, longestMinAt, roadsAt } from '@/components/roads/roads-at';
import { StormStrip } from '@/components/storm-strip/storm-strip';
import { classNames } from '@/components/ui/class-names';
import { Segmented } from '@/components/ui/segmented';
import { useNow } from '@/components/ui/use-now';
import { stormStateQuery } from '@/lib/client/queries/storm-state';
import { formatTime } from '@/lib/time/format';
import { covers, snapTo } from '@/lib/time/step-axis';
import { ChosenPanel } from './chosen-panel';
import { NoStorm } from './no-storm';
import { PointedRoad } from './pointed-road';
import { type RoadsScreenProps } from './roads-screen';
import { DataNotice } from './data-notice';
import { SpokenState } from './spoken-state';
import { StormHeader } from './storm-header';
import { trucksOf } from './trucks-of';
import { useAddress } from './use-address';

type View = 'map' | 'list' | 'road';
const views = [
  { value: 'map', label: 'Map' },
  { value: 'list', label: 'List' },
  { value: 'road', label: 'Road' },
] as const;

/** A little ahead of the last answer of the server, the browser's clock goes on. */
const clockRunsMs = 15 * 60_000;

function useNowOf(storm: Storm | null): number {
  const clock = useNow();
  if (!storm) return clock ?? 0;
  const { nowAt, isClosed } = storm.view;
  const isRunning = clock !== null && !isClosed && clock > nowAt && clock < nowAt + clockRunsMs;
  return isRunning ? clock : nowAt;
}

/** The newest step that is not ahead of now. */
function lastStepBy({ axis }: Storm, nowAt: number): number {
  const stepMs = axis.stepMin * 60_000;
  return snapTo(axis, Math.floor(nowAt / stepMs) * stepMs);
}

export function RoadsBoard(props: RoadsScreenProps & Readonly<{ network: RoadNetwork }>) {
  const { network, zone, curves } = props;
  const [address, change] = useAddress(props.address);
  const [pointedId, setPointedId] = useState<number | null>(null);
  const [view, setView] = useState<View>('map');
  const { data, isError, dataUpdatedAt } = useQuery({
    ...stormStateQuery(props.storm?.id ?? 0),
    enabled: props.storm !== null,
  });
  const storm = data ? decodeStorm(data) : null;
  const nowAt = useNowOf(storm);
  const nowStep = storm ? lastStepBy(storm, nowAt) : nowAt;
  const isFollowing = address.at === null || !storm || !covers(storm.axis, address.at);
  const cursorAt = isFollowing || address.at === null ? nowStep : address.at;
  const bands = bandsAt(network, storm, cursorAt);
  // While the cursor is dragged the map comes first; the list follows as soon as there is time.
  const listAt = useDeferredValue(cursorAt);
  const roads = roadsAt(network, storm, listAt);
  const sorted = roads.toSorted(byUrgency);
  const longestMin = longestMinAt(storm, listAt);
  const chosen = sorted.find((road) => road.id === address.segmentId) ?? (storm ? sorted[0] : undefined);
  const row = storm && chosen ? storm.rowById.get(chosen.id) : undefined;
  const stationIndex = storm && row !== undefined ? (storm.view.stationOf[row] ?? 0) : 0;
  const time = formatTime(cursorAt, zone);
  const choose = (segmentId: number) => change({ segmentId });
  const describe = (index: number) => {
    const road = roads[index];
    return road ? `${road.name}, ${bandWords[road.band]}` : '';
  };
  const onPhone = (own: View) => (view === own ? '' : 'max-md:hidden');

  return (
    <div className="flex h-[calc(100dvh-3.75rem-env(safe-area-inset-bottom))] min-h-0 flex-col md:h-full">
      <StormHeader {...props} state={data ?? null} nowAt={nowAt} roadCount={network.segments.length} />
      <DataNotice storm={storm} isError={isError} zone={zone} nowAt={nowAt} updatedAt={dataUpdatedAt} />
      <Segmented
        label="Show"
        isLabelHidden
        options={views}
        value={view}
        onChange={setView}
        className="border-b bg-panel px-3 py-1.5 md:hidden"
      />
      <div className="grid min-h-0 flex-1 grid-cols-1 grid-rows-[minmax(0,1fr)] md:max-lg:grid-cols-2 md:max-lg:grid-rows-[minmax(0,1fr)_minmax(0,1fr)] lg:grid-cols-[minmax(0,1fr)_23.5rem] lg:grid-rows-[minmax(16.5rem,1fr)_minmax(0,auto)] xl:grid-cols-[minmax(0,1fr)_27rem]">
        <div className={classNames('relative min-h-0 md:max-lg:col-span-2 lg:row-span-2', onPhone('map'))}>
          <RoadMap
            segments={network.segments}
            styles={bands.styles}
            baseFeatures={network.baseFeatures}
            selectedId={chosen?.id ?? null}
            highlightIds={pointedId === null ? [] : [pointedId]}
            onSelect={choose}
            describe={describe}
            trucks={storm ? trucksOf(storm, zone) : []}
            fitKey={network.version}
            legend={storm ? <MarginLegend time={time} counts={bands.counts} /> : null}
            attribution={network.attribution}
            label={`Roads by freeze margin at ${time}`}
          />
          {chosen && storm ? (
            <PointedRoad road={chosen} longestMin={longestMin} onOpen={() => setView('road')} />
          ) : null}
        </div>
        {storm && chosen ? (
          <>
            <RefreezeList
              className={classNames('bg-panel md:border-l', onPhone('list'))}
              roads={sorted}
              selectedId={chosen.id}
              longestMin={longestMin}
              onSelect={(id) => {
                choose(id);
                setView('road');
              }}
              onPoint={setPointedId}
            />
            <ChosenPanel
              className={classNames(
                'min-h-0 overflow-y-auto border-t-2 border-t-lamp bg-panel md:max-lg:border-t-0 md:border-l',
                onPhone('road'),
              )}
              storm={storm}
              road={chosen}
              facts={network.facts[chosen.index]}
              cursorAt={cursorAt}
              nowAt={nowAt}
              zone={zone}
              curves={curves}
            />
          </>
        ) : (
          <NoStorm
            {...props}
            isLoading={props.storm !== null}
            className={classNames('lg:row-span-2', onPhone('list'))}
          />
        )}
      </div>
      {storm ? (
        <StormStrip
          className="h-[9.25rem] shrink-0 border-t bg-panel md:h-[10rem] xl:h-[11rem] print:hidden"
          content={stripOf(storm, stationIndex)}
          cursorAt={cursorAt}
          isFollowingNow={isFollowing}
          onMove={(at) => change({ at })}
          onNow={() => change({ at: null })}
          zone={zone}
          stationName={storm.view.stations[stationIndex]?.name ?? 'no station'}
          stepMin={storm.axis.stepMin}
        />
      ) : null}
      {storm ? <SpokenState counts={bands.counts} first={sorted[0]} time={time} /> : null}
    </div>
  );
}
