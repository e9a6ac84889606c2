'use client';

import { type ReactNode } from 'react';
import { type Storm } from '@/components/roads/decode-storm';
import { classNames } from '@/components/ui/class-names';
import { formatTime, relativeInWords } from '@/lib/time/format';

type DataNoticeProps = Readonly<{
  storm: Storm | null;
  isError: boolean;
  zone: string;
  nowAt: number;
  updatedAt: number;
}>;

type BarProps = Readonly<{ isProblem?: boolean; title: string; children: ReactNode }>;

/** One line under the header: the map below keeps its room. */
function Bar({ isProblem = false, title, children }: BarProps) {
  return (
    <p
      role={isProblem ? 'alert' : 'status'}
      className={classNames(
        'shrink-0 border-b border-l-[3px] bg-panel px-4 py-1.5 text-sm',
        isProblem ? 'border-l-frozen' : 'border-l-urgent',
      )}
    >
      <strong className="font-semibold">{title}</strong> <span className="text-soft">{children}</span>
    </p>
  );
}

/** What is not current is said before anything is read from it. */
export function DataNotice({ storm, isError, zone, nowAt, updatedAt }: DataNoticeProps) {
  if (isError && storm) {
    return (
      <Bar title="The server could not be reached.">
        What is shown is from {formatTime(updatedAt, zone)}. It is asked again by itself.
      </Bar>
    );
  }
  if (!storm || storm.view.isClosed) return null;
  const { stations, forecastIssuedAt } = storm.view;
  if (stations.every((station) => station.status === 'missing')) {
    const forecast =
      forecastIssuedAt === null ? '' : ` The forecast was issued ${relativeInWords(forecastIssuedAt, nowAt)}.`;
    return (
      <Bar isProblem title="No current data. Do not treat as clear.">
        {stations.length === 0
          ? 'No station is set up: add one in Set-up, Stations.'
          : `No station has reported for two hours.${forecast}`}
      </Bar>
    );
  }
  const late = stations.filter((station) => station.status !== 'current');
  if (late.length === 0) return null;
  return <Bar title="Some readings are old.">{lateInWords(late, { all: stations.length, nowAt })}</Bar>;
}

type Station = Storm['view']['stations'][number];

function lateInWords(late: readonly Station[], { all, nowAt }: { all: number; nowAt: number }): string {
  const oldest = late.reduce((a, b) => ((b.newestAt ?? -Infinity) < (a.newestAt ?? -Infinity) ? b : a));
  const heard =
    oldest.newestAt === null
      ? 'has not been heard at all'
      : `was last heard ${relativeInWords(oldest.newestAt, nowAt)}`;
  if (late.length === 1) return `${oldest.name} ${heard}.`;
  const who = late.length === all ? `All ${all} stations` : `${late.length} of ${all} stations`;
  return `${who} are silent for over half an hour; ${oldest.name} ${heard}.`;
}
