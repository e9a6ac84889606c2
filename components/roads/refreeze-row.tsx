'use client';

import { classNames } from '@/components/ui/class-names';
import { Figure } from '@/components/ui/figure';
import { formatDuration } from '@/lib/units/format';
import { HoldBar } from './hold-bar';
import { bandWords, holdInFigures } from './margin-band';
import { type RoadNow } from './road-now';

export type RefreezeRowProps = Readonly<{
  road: RoadNow;
  isChosen: boolean;
  longestMin: number;
  onSelect: (id: number) => void;
  onPoint: (id: number | null) => void;
}>;

const barSpanMin = 180;
const figureLook = 'w-[3.1rem] shrink-0 text-right font-mono whitespace-nowrap @[26rem]:w-[3.75rem]';

/** One road: name, hold, next pass and slack; under them the bar and what else tells roads apart. */
export function RefreezeRow({ road, isChosen, longestMin, onSelect, onPoint }: RefreezeRowProps) {
  const isLate = road.slackMin !== null && road.slackMin < 0;
  return (
    <li className="[contain-intrinsic-size:auto_3.75rem] [content-visibility:auto]">
      <button
        type="button"
        aria-pressed={isChosen}
        onClick={() => onSelect(road.id)}
        onPointerEnter={() => onPoint(road.id)}
        onPointerLeave={() => onPoint(null)}
        className={classNames(
          'relative grid w-full grid-cols-[minmax(0,1fr)] gap-1 border-b border-l-[3px] border-l-transparent py-2 pr-4 pl-[0.8125rem] text-left transition-colors hover:bg-raised focus-visible:-outline-offset-2',
          isChosen && 'border-l-lamp bg-raised',
        )}
      >
        <span className="flex items-baseline gap-1.5 @[26rem]:gap-2">
          <span className="min-w-0 flex-1 truncate font-semibold">{road.name}</span>
          <span
            className={classNames(
              figureLook,
              road.band === 'frozen'
                ? 'text-frozen'
                : road.band === 'urgent'
                  ? 'text-urgent'
                  : road.band === 'closing'
                    ? 'text-closing'
                    : '',
            )}
          >
            <span className="sr-only">holds </span>
            {holdInFigures(road.holdMin, longestMin)}
          </span>
          <span className={classNames(figureLook, 'text-soft')}>
            <span className="sr-only">next pass in </span>
            {holdInFigures(road.nextPassMin, longestMin)}
          </span>
          <span className={classNames(figureLook, isLate ? 'font-semibold text-frozen' : 'text-soft')}>
            <span className="sr-only">slack </span>
            {road.slackMin === null || !Number.isFinite(road.slackMin) ? '\u2013' : formatDuration(road.slackMin, true)}
          </span>
        </span>
        <span className="flex items-center gap-3">
          <HoldBar holdMin={road.holdMin} nextPassMin={road.nextPassMin} band={road.band} spanMin={barSpanMin} />
          <span className="text-sm whitespace-nowrap text-soft">
            {bandWords[road.band]}, class {road.serviceClass},{' '}
            <Figure value={road.pavementTempC} quantity="temperature" size="inline" none="no temperature" />
            {road.truckNumber === null ? null : `, truck ${road.truckNumber}`}
          </span>
        </span>
      </button>
    </li>
  );
}
