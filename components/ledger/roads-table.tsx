'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Figure } from '@/components/ui/figure';
import { Table, type Column } from '@/components/ui/table';
import { type LedgerRoad } from '@/lib/contracts/ledger';
import { differenceFraction } from '@/lib/ledger/account';
import { formatDayTime } from '@/lib/time/format';
import { Difference } from './difference';

export type RoadsTableProps = Readonly<{ roads: readonly LedgerRoad[]; zone: string; caption: string }>;

const shownAtFirst = 40;

/** Each road as logged: what was asked, what went down, and what the driver said. */
export function RoadsTable({ roads, zone, caption }: RoadsTableProps) {
  const [isAll, setIsAll] = useState(false);
  const columns: Column<LedgerRoad>[] = [
    { key: 'road', head: 'Road', isRowHead: true, cell: (road) => road.roadName },
    { key: 'class', head: 'Class', cell: (road) => road.serviceClass },
    {
      key: 'at',
      head: 'Logged for',
      className: 'whitespace-nowrap',
      cell: (road) => formatDayTime(new Date(road.spreadAt), zone),
    },
    {
      key: 'recommended',
      head: 'Recommended',
      isNumber: true,
      cell: (road) => <Figure value={road.recommendedRateGPerM2} quantity="rate" digits={0} none="none" />,
    },
    {
      key: 'rate',
      head: 'Spread',
      isNumber: true,
      cell: (road) =>
        road.outcome === 'spread' ? (
          <Figure value={road.rateGPerM2} quantity="rate" digits={0} />
        ) : (
          <span className="font-sans text-soft">{road.outcome}</span>
        ),
    },
    {
      key: 'difference',
      head: 'Difference',
      isNumber: true,
      cell: (road) => <Difference fraction={differenceFraction(road)} />,
    },
    { key: 'material', head: 'Material', cell: (road) => road.materialName ?? '' },
    {
      key: 'note',
      head: 'Note',
      className: 'min-w-40 text-soft',
      cell: (road) => [road.isAmendment ? 'Corrected.' : '', road.note].filter(Boolean).join(' '),
    },
  ];
  return (
    <div className="grid gap-3">
      <Table
        caption={caption}
        columns={columns}
        rows={isAll ? roads : roads.slice(0, shownAtFirst)}
        rowKey={(road) => `${road.runId}-${road.segmentId}-${road.spreadAt}`}
      />
      {!isAll && roads.length > shownAtFirst ? (
        <Button className="justify-self-start" onClick={() => setIsAll(true)}>
          Show all {roads.length} roads
        </Button>
      ) : null}
    </div>
  );
}
