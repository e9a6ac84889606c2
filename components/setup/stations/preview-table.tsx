'use client';

import { Figure } from '@/components/ui/figure';
import { Table } from '@/components/ui/table';
import { Tag } from '@/components/ui/tag';
import { type ColumnMapping } from '@/lib/readings/mapping';
import { type PreviewRow } from '@/lib/readings/preview';
import { quantityFacts } from '@/lib/readings/quantities';
import { checkWords } from '@/lib/readings/checks';
import { formatDateTime } from '@/lib/time/format';
import { formatNumber } from '@/lib/units/format';

export type PreviewTableProps = Readonly<{
  rows: readonly PreviewRow[];
  columns: readonly ColumnMapping[];
  /** in which times are shown */
  zone: string;
}>;

type Shown = PreviewRow['result'] & { ok: true };

const goodOf = (row: PreviewRow): Shown | null => (row.result.ok ? row.result : null);

function timeOf(row: PreviewRow, zone: string) {
  const first = goodOf(row)?.readings[0];
  if (!first) return row.result.ok ? <span className="text-faint">nothing measured</span> : null;
  const at = new Date(first.reading.atMs);
  return `${formatDateTime(at, zone)} ${at.getUTCFullYear()}`;
}

type CellProps = Readonly<{ row: PreviewRow; index: number; column: ColumnMapping; zone: string }>;

function Cell({ row, index, column, zone }: CellProps) {
  const good = goodOf(row);
  const found = good?.readings.find(({ reading }) => (reading.values[index] ?? null) !== null);
  if (!good) return null;
  if (!found) return <span className="text-faint">missing</span>;
  const { reading, flags } = found;
  const value = reading.values[index];
  const failed = flags?.[column.quantity] ?? [];
  const otherTime = good.readings[0]?.reading.atMs !== reading.atMs;
  return (
    <span className="grid justify-items-end">
      <Value value={value ?? null} column={column} />
      {otherTime ? (
        <span className="font-sans text-sm text-soft">at {formatDateTime(new Date(reading.atMs), zone)}</span>
      ) : null}
      {failed.map((name) => (
        <span key={name} className="font-sans text-sm text-urgent">
          {checkWords[name]}
        </span>
      ))}
    </span>
  );
}

function Value({ value, column }: Readonly<{ value: number | string | null; column: ColumnMapping }>) {
  const { shownAs } = quantityFacts[column.quantity];
  if (typeof value === 'string') return <span className="font-sans">{value.replaceAll('-', ' ')}</span>;
  if (shownAs) return <Figure value={value} quantity={shownAs} />;
  return value === null ? null : `${formatNumber(value, 0)}°`;
}

/** The first rows as they will be understood: time, values in the reader's units, and which rows are bad and why. */
export function PreviewTable({ rows, columns, zone }: PreviewTableProps) {
  return (
    <Table
      caption="The first rows as they will be understood"
      rows={rows}
      rowKey={(row) => row.line}
      columns={[
        { key: 'line', head: 'Line', isRowHead: true, isNumber: true, className: 'w-12', cell: (row) => row.line },
        {
          key: 'mark',
          head: 'Row',
          className: 'min-w-24 max-w-72',
          cell: (row) =>
            row.result.ok ? (
              <Tag tone="closing">good</Tag>
            ) : (
              <span className="grid">
                <Tag tone="frozen">bad</Tag>
                <span className="text-sm">
                  {row.result.column ? `${row.result.column}: ` : ''}
                  {row.result.reason}
                </span>
              </span>
            ),
        },
        { key: 'time', head: `Time in ${zone}`, className: 'whitespace-nowrap', cell: (row) => timeOf(row, zone) },
        ...columns.map((column, index) => ({
          key: column.column,
          head: quantityFacts[column.quantity].label,
          isNumber: true,
          cell: (row: PreviewRow) => <Cell row={row} index={index} column={column} zone={zone} />,
        })),
      ]}
    />
  );
}
