import { type Route } from 'next';
import Link from 'next/link';
import { Figure } from '@/components/ui/figure';
import { Table } from '@/components/ui/table';
import { Tag, type TagTone } from '@/components/ui/tag';
import { type NetworkImportRow } from '@/lib/contracts/network';
import { formatDateTime } from '@/lib/time/format';
import { formatNumber } from '@/lib/units/format';
import { stateWords } from './words';

export type ImportsTableProps = Readonly<{ imports: readonly NetworkImportRow[]; zone: string }>;

const tones: Readonly<Record<NetworkImportRow['state'], TagTone>> = {
  previewed: 'urgent',
  applied: 'closing',
  undone: 'plain',
  discarded: 'plain',
};

function lastStep(row: NetworkImportRow, zone: string): string {
  const [at, name] =
    row.state === 'undone'
      ? [row.undoneAt, row.undoneByName]
      : row.state === 'applied'
        ? [row.appliedAt, row.appliedByName]
        : [row.createdAt, row.createdByName];
  return `${formatDateTime(new Date(at ?? row.createdAt), zone)}, ${name ?? 'someone'}`;
}

/** What was imported, by whom and when, and what became of it. */
export function ImportsTable({ imports, zone }: ImportsTableProps) {
  return (
    <Table
      caption="Imports of the road network, newest first"
      rows={imports}
      rowKey={(row) => row.id}
      rowClassName={(row) => (row.state === 'undone' ? 'text-soft' : undefined)}
      columns={[
        {
          key: 'file',
          head: 'File',
          isRowHead: true,
          className: 'min-w-44',
          cell: (row) => (
            <Link href={`/setup/roads/${row.id}` as Route} className="link wrap-anywhere">
              {row.fileName}
            </Link>
          ),
        },
        { key: 'state', head: 'State', cell: (row) => <Tag tone={tones[row.state]}>{stateWords[row.state]}</Tag> },
        { key: 'when', head: 'When and who', className: 'whitespace-nowrap', cell: (row) => lastStep(row, zone) },
        { key: 'source', head: 'Source', cell: (row) => row.source },
        { key: 'roads', head: 'Roads', isNumber: true, cell: (row) => formatNumber(row.segments, 0) },
        {
          key: 'length',
          head: 'Length',
          isNumber: true,
          cell: (row) => <Figure value={row.lengthKm * 1000} quantity="distance" />,
        },
        {
          key: 'notice',
          head: 'Whose data',
          cell: (row) => row.attribution || <span className="text-faint">none given</span>,
        },
      ]}
    />
  );
}
