'use client';

import { type Storm } from '@/components/roads/decode-storm';
import { Notice } from '@/components/ui/notice';
import { formatTime, relativeInWords } from '@/lib/time/format';

type DataNoticeProps = Readonly<{
  storm: Storm | null;
  isError: boolean;
  zone: string;
  nowAt: number;
  updatedAt: number;
}>;

/** What is not current is said before anything is read from it. */
export function DataNotice({ storm, isError, zone, nowAt, updatedAt }: DataNoticeProps) {
  if (isError && storm) {
    return (
      <Notice
        tone="caution"
        title="The server could not be reached."
        kept={`What is shown is from ${formatTime(updatedAt, zone)}.`}
        todo="It is asked again by itself."
      />
    );
  }
  if (!storm || storm.view.isClosed) return null;
  const { stations, forecastIssuedAt } = storm.view;
  const silent = stations.filter((station) => station.status === 'missing');
  if (silent.length === stations.length) {
    return (
      <Notice
        tone="problem"
        title="No current data. Do not treat as clear."
        todo={
          stations.length === 0
            ? 'No station is set up: add one in Set-up, Stations.'
            : `No station has reported for two hours.${forecastIssuedAt === null ? '' : ` The forecast is from ${relativeInWords(forecastIssuedAt, nowAt)}.`}`
        }
      />
    );
  }
  const late = stations.filter((station) => station.status !== 'current' && station.newestAt !== null);
  if (late.length === 0) return null;
  const words = late.map((station) => `${station.name} ${relativeInWords(station.newestAt ?? nowAt, nowAt)}`);
  return <Notice tone="caution" title="Some readings are old." todo={`Last heard: ${words.join(', ')}.`} />;
}
