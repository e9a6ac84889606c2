'use client';

import Link from 'next/link';
import { Table, type Column } from '@/components/ui/table';
import { Tag } from '@/components/ui/tag';
import { formatDateTime } from '@/lib/time/format';
import { stormTitle } from './storm-words';

export interface StormRowView {
  id: number;
  number: number;
  name: string;
  fromAt: number;
  untilAt: number;
  openedByName: string;
  closedAt: number | null;
  passes: number;
  publishedPlans: number;
  newestPublishedPass: number | null;
  runs: number;
}

export type StormsTableProps = Readonly<{ storms: readonly StormRowView[]; zone: string }>;

/** Storms, newest first, each a way to its own page. */
export function StormsTable({ storms, zone }: StormsTableProps) {
  const columns: Column<StormRowView>[] = [
    {
      key: 'name',
      head: 'Storm',
      isRowHead: true,
      cell: (storm) => (
        <Link
          href={`/storm/${storm.id}`}
          className="underline decoration-faint underline-offset-4 hover:decoration-ink"
        >
          {stormTitle(storm)}
        </Link>
      ),
    },
    {
      key: 'state',
      head: 'State',
      cell: (storm) =>
        storm.closedAt === null ? (
          <Tag tone="lamp">open</Tag>
        ) : (
          <Tag>closed {formatDateTime(storm.closedAt, zone)}</Tag>
        ),
    },
    { key: 'from', head: 'From', className: 'whitespace-nowrap', cell: (storm) => formatDateTime(storm.fromAt, zone) },
    {
      key: 'until',
      head: 'Until',
      className: 'whitespace-nowrap',
      cell: (storm) => formatDateTime(storm.untilAt, zone),
    },
    { key: 'passes', head: 'Passes', isNumber: true, cell: (storm) => storm.passes },
    {
      key: 'published',
      head: 'Published',
      cell: (storm) =>
        storm.newestPublishedPass === null
          ? 'no plan yet'
          : `pass ${storm.newestPublishedPass}, ${storm.publishedPlans} ${storm.publishedPlans === 1 ? 'plan' : 'plans'} in all`,
    },
    { key: 'runs', head: 'Runs', isNumber: true, cell: (storm) => storm.runs },
    { key: 'by', head: 'Opened by', cell: (storm) => storm.openedByName },
  ];
  return <Table caption="Storms" columns={columns} rows={storms} rowKey={(storm) => storm.id} />;
}
