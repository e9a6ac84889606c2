'use client';

import { Figure } from '@/components/ui/figure';
import { Table, type Column } from '@/components/ui/table';
import { formatDayTime } from '@/lib/time/format';

export interface LoadRow {
  id: string;
  yardName: string;
  truckNumber: number;
  driverName: string;
  materialName: string;
  massKg: number;
  loadedAt: string;
  recordedBy: string;
}

export type LoadsTableProps = Readonly<{ loads: readonly LoadRow[]; zone: string }>;

export function LoadsTable({ loads, zone }: LoadsTableProps) {
  const columns: Column<LoadRow>[] = [
    {
      key: 'at',
      head: 'Loaded',
      isRowHead: true,
      className: 'whitespace-nowrap',
      cell: (load) => formatDayTime(new Date(load.loadedAt), zone),
    },
    { key: 'yard', head: 'Yard', cell: (load) => load.yardName },
    { key: 'truck', head: 'Truck', isNumber: true, cell: (load) => load.truckNumber },
    { key: 'driver', head: 'Driver', className: 'whitespace-nowrap', cell: (load) => load.driverName },
    { key: 'material', head: 'Material', cell: (load) => load.materialName },
    { key: 'mass', head: 'Mass', isNumber: true, cell: (load) => <Figure value={load.massKg} quantity="largeMass" /> },
    { key: 'by', head: 'Recorded by', cell: (load) => load.recordedBy },
  ];
  return <Table caption="Loads, newest first" columns={columns} rows={loads} rowKey={(load) => load.id} />;
}
