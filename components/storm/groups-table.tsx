'use client';

import { Figure } from '@/components/ui/figure';
import { Table, type Column } from '@/components/ui/table';
import { type PlanSummary } from '@/lib/contracts/plans';
import { formatMoney } from '@/lib/units/money';
import { actionWords } from './storm-words';

type Group = PlanSummary['groups'][number];
export type GroupsTableProps = Readonly<{ groups: readonly Group[]; currency: string }>;

function Rates({ rates }: Readonly<{ rates: Group['ratesGPerM2'] }>) {
  if (!rates) return <span className="text-faint">none</span>;
  const [low, middle, high] = rates;
  if (high - low < 0.05) return <Figure value={middle} quantity="rate" />;
  return (
    <>
      <Figure value={low} quantity="rate" isUnitHidden /> to <Figure value={high} quantity="rate" />
      <span className="block text-sm text-soft">
        middle <Figure value={middle} quantity="rate" size="inline" />
      </span>
    </>
  );
}

/** By class and action: how much road, at what rates, and how much material. */
export function GroupsTable({ groups, currency }: GroupsTableProps) {
  const columns: Column<Group>[] = [
    { key: 'class', head: 'Class', isRowHead: true, cell: ({ serviceClass }) => serviceClass },
    {
      key: 'action',
      head: 'Action',
      cell: ({ action, materialName }) => (
        <>
          <span className="font-semibold">{actionWords[action]}</span>
          {materialName ? <span className="block text-sm text-soft">{materialName}</span> : null}
        </>
      ),
    },
    {
      key: 'roads',
      head: 'Roads',
      isNumber: true,
      cell: ({ roads, shorterCycles }) => (
        <>
          {roads}
          {shorterCycles > 0 ? (
            <span className="block font-sans text-sm text-urgent">
              {shorterCycles === roads ? 'all' : shorterCycles} on a shorter cycle
            </span>
          ) : null}
        </>
      ),
    },
    {
      key: 'lanes',
      head: 'Lanes',
      isNumber: true,
      cell: ({ laneKm }) => <Figure value={laneKm * 1000} quantity="laneDistance" />,
    },
    { key: 'rate', head: 'Rate per lane', isNumber: true, cell: ({ ratesGPerM2 }) => <Rates rates={ratesGPerM2} /> },
    {
      key: 'mass',
      head: 'Material',
      isNumber: true,
      cell: ({ massKg, volumeL }) => (
        <>
          <Figure value={massKg > 0 ? massKg : null} quantity="largeMass" />
          {volumeL === null ? null : (
            <span className="block text-sm text-soft">
              <Figure value={volumeL} quantity="volume" size="inline" />
            </span>
          )}
        </>
      ),
    },
    {
      key: 'cost',
      head: 'Cost',
      isNumber: true,
      cell: ({ costCents }) =>
        costCents > 0 ? formatMoney(costCents, currency, 0) : <span className="text-faint">none</span>,
    },
  ];
  return (
    <Table
      caption="By class and action"
      columns={columns}
      rows={groups}
      rowKey={({ serviceClass, action, materialName }) => `${serviceClass}-${action}-${materialName ?? ''}`}
    />
  );
}
