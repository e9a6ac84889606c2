'use client';

import { Meter } from '@/components/ui/meter';
import { Table, type Column } from '@/components/ui/table';
import { type CrewView } from '@/lib/contracts/crew';
import { formatDayTime } from '@/lib/time/format';
import { formatDuration } from '@/lib/units/format';

type Truck = CrewView['trucks'][number];

export type CrewTableProps = Readonly<{ trucks: readonly Truck[]; zone: string; now: number | null }>;

/** A truck silent for longer than this is pointed out, min: two roads' worth on most routes (common practice, no source). */
const silentMin = 30;

const minutesSince = (at: string | null, now: number | null) =>
  at === null || now === null ? null : (now - new Date(at).getTime()) / 60_000;

export function CrewTable({ trucks, zone, now }: CrewTableProps) {
  const columns: Column<Truck>[] = [
    {
      key: 'truck',
      head: 'Truck',
      isRowHead: true,
      className: 'whitespace-nowrap',
      cell: (truck) => `Truck ${truck.truckNumber}`,
    },
    {
      key: 'driver',
      head: 'Driver',
      className: 'whitespace-nowrap',
      cell: (truck) => truck.driverName ?? <span className="text-faint">in the yard</span>,
    },
    {
      key: 'route',
      head: 'On',
      cell: (truck) => (truck.runId ? (truck.routeName ?? 'own list of roads') : truck.yardName),
    },
    { key: 'done', head: 'Roads done', className: 'min-w-44', cell: (truck) => <Done truck={truck} /> },
    {
      key: 'out',
      head: 'Out',
      isNumber: true,
      cell: (truck) => {
        const minutes = minutesSince(truck.startedAt, now);
        return minutes === null ? '' : formatDuration(minutes);
      },
    },
    {
      key: 'last',
      head: 'Last logged',
      className: 'min-w-52',
      cell: (truck) => <Last truck={truck} zone={zone} now={now} />,
    },
    {
      key: 'load',
      head: 'Last load',
      className: 'whitespace-nowrap',
      cell: (truck) => (truck.lastLoadAt ? formatDayTime(new Date(truck.lastLoadAt), zone) : ''),
    },
  ];
  return (
    <Table
      caption="Trucks and the runs they are on"
      columns={columns}
      rows={trucks}
      rowKey={(truck) => truck.truckId}
    />
  );
}

function Done({ truck }: Readonly<{ truck: Truck }>) {
  if (!truck.runId) return null;
  const words = `${truck.roadsDone} of ${truck.roadsTotal}`;
  return (
    <span className="flex items-center gap-3">
      <span className="w-20 shrink-0 font-mono">{words}</span>
      <Meter
        label={`Roads done by truck ${truck.truckNumber}`}
        value={truck.roadsDone}
        max={truck.roadsTotal}
        valueText={words}
      />
    </span>
  );
}

function Last({ truck, zone, now }: Readonly<{ truck: Truck; zone: string; now: number | null }>) {
  if (!truck.runId) return null;
  if (!truck.lastLoggedAt) return <span className="text-soft">nothing yet</span>;
  const silent = minutesSince(truck.lastLoggedAt, now);
  return (
    <span>
      {truck.lastRoad} <span className="text-soft">at {formatDayTime(new Date(truck.lastLoggedAt), zone)}</span>
      {silent !== null && silent > silentMin ? (
        <span className="block text-urgent">nothing logged for {formatDuration(silent)}</span>
      ) : null}
    </span>
  );
}
