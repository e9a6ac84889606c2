'use client';

import { type Route } from 'next';
import Link from 'next/link';
import { Figure } from '@/components/ui/figure';
import { Table } from '@/components/ui/table';
import { Tag } from '@/components/ui/tag';
import { useUnits } from '@/components/ui/units';
import { useNow } from '@/components/ui/use-now';
import { formatDate, relativeInWords } from '@/lib/time/format';
import { unitLabel } from '@/lib/units/quantity';
import { type StationNow } from './listed-station';

/** Older than this a reading is stale, and older than that it counts as missing for decisions. Common practice, no source. */
const STALE_MIN = 30;
const MISSING_MIN = 120;
/** From here on a date says more than a count of hours. */
const LONG_AGO_MIN = 2 * 1440;

export type StationsTableProps = Readonly<{ stations: readonly StationNow[] }>;

function Age({ observedAt, zone }: Readonly<{ observedAt: string | null; zone: string }>) {
  const now = useNow();
  if (observedAt === null) return <span className="text-faint">no reading yet</span>;
  if (now === null) return null;
  const at = new Date(observedAt);
  const ageMin = (now - at.getTime()) / 60_000;
  if (ageMin > LONG_AGO_MIN) return <Tag tone="frozen">missing since {formatDate(at, zone)}</Tag>;
  const words = relativeInWords(at, now);
  if (ageMin > MISSING_MIN) return <Tag tone="frozen">{words}, missing</Tag>;
  return ageMin > STALE_MIN ? (
    <Tag tone="urgent">{words}, stale</Tag>
  ) : (
    <span className="whitespace-nowrap">{words}</span>
  );
}

const value = (station: StationNow, quantity: 'pavementTempC' | 'airTempC' | 'dewPointC') => (
  <Figure value={station[quantity]} quantity="temperature" isUnitHidden none="" />
);

export function StationsTable({ stations }: StationsTableProps) {
  const system = useUnits();
  const degrees = unitLabel('temperature', system);
  return (
    <Table
      caption="Stations with their newest reading"
      rows={stations}
      rowKey={(station) => station.id}
      rowClassName={(station) => (station.isActive ? undefined : 'text-soft')}
      columns={[
        {
          key: 'name',
          head: 'Station',
          isRowHead: true,
          className: 'min-w-40',
          cell: (station) => (
            <Link href={`/setup/stations/${station.id}` as Route} className="link">
              {station.isActive ? station.name : `${station.name}, out of use`}
            </Link>
          ),
        },
        {
          key: 'age',
          head: 'Last reading',
          cell: (station) => <Age observedAt={station.observedAt} zone={station.zone} />,
        },
        {
          key: 'pavement',
          head: `Pavement, ${degrees}`,
          isNumber: true,
          cell: (station) => value(station, 'pavementTempC'),
        },
        { key: 'air', head: `Air, ${degrees}`, isNumber: true, cell: (station) => value(station, 'airTempC') },
        { key: 'dew', head: `Dew point, ${degrees}`, isNumber: true, cell: (station) => value(station, 'dewPointC') },
        {
          key: 'wind',
          head: `Wind, ${unitLabel('windSpeed', system)}`,
          isNumber: true,
          cell: (station) => <Figure value={station.windSpeedMPerS} quantity="windSpeed" isUnitHidden none="" />,
        },
        { key: 'road', head: 'Road', cell: (station) => station.surfaceStatus?.replaceAll('-', ' ') ?? '' },
        {
          key: 'flagged',
          head: 'Flagged, last 24 h',
          isNumber: true,
          cell: (station) => (station.flaggedCount > 0 ? station.flaggedCount : <span className="text-faint">0</span>),
        },
        {
          key: 'files',
          head: 'Files',
          className: 'whitespace-nowrap',
          cell: (station) => (station.hasMapping ? 'known' : <span className="text-faint">none yet</span>),
        },
      ]}
    />
  );
}
