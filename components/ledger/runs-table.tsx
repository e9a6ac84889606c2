'use client';

import { Figure } from '@/components/ui/figure';
import { Table, type Column } from '@/components/ui/table';
import { type LedgerRun } from '@/lib/contracts/ledger';
import { differenceFraction } from '@/lib/ledger/account';
import { formatDayTime } from '@/lib/time/format';
import { Difference } from './difference';

export type RunsTableProps = Readonly<{
  runs: readonly LedgerRun[];
  zone: string;
  chosenRunId: string | null;
  onChoose: (runId: string | null) => void;
}>;

export function RunsTable({ runs, zone, chosenRunId, onChoose }: RunsTableProps) {
  const columns: Column<LedgerRun>[] = [
    {
      key: 'route',
      head: 'Run',
      isRowHead: true,
      cell: (run) => (
        <button
          type="button"
          className="link text-left"
          aria-pressed={run.runId === chosenRunId}
          onClick={() => onChoose(run.runId === chosenRunId ? null : run.runId)}
        >
          {run.routeName ?? 'Own list of roads'}
          {run.passNumber ? `, pass ${run.passNumber}` : ''}
        </button>
      ),
    },
    {
      key: 'crew',
      head: 'Truck and driver',
      className: 'whitespace-nowrap',
      cell: (run) => `${run.truckNumber}, ${run.driverName}`,
    },
    {
      key: 'from',
      head: 'Out at',
      className: 'whitespace-nowrap',
      cell: (run) => (
        <>
          {formatDayTime(new Date(run.startedAt), zone)}
          {run.finishedAt ? null : <span className="block text-sm text-soft">still out</span>}
        </>
      ),
    },
    { key: 'roads', head: 'Roads', isNumber: true, cell: (run) => `${run.roadsDone} of ${run.roadsTotal}` },
    {
      key: 'recommended',
      head: 'Recommended',
      isNumber: true,
      cell: (run) => <Figure value={run.account.recommendedKg} quantity="largeMass" digits={2} />,
    },
    {
      key: 'spread',
      head: 'Spread',
      isNumber: true,
      cell: (run) => <Figure value={run.account.spreadKg} quantity="largeMass" digits={2} />,
    },
    {
      key: 'difference',
      head: 'Difference',
      isNumber: true,
      cell: (run) => <Difference fraction={differenceFraction(run.account)} />,
    },
    {
      key: 'rate',
      head: 'Rate, median',
      isNumber: true,
      cell: (run) => <Figure value={run.medianRateGPerM2} quantity="rate" digits={0} />,
    },
  ];
  return (
    <Table
      caption="Recommended beside spread, by run"
      columns={columns}
      rows={runs}
      rowKey={(run) => run.runId}
      rowClassName={(run) => (run.runId === chosenRunId ? 'bg-raised' : undefined)}
    />
  );
}
