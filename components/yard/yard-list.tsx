'use client';

import { Figure } from '@/components/ui/figure';
import { Table, type Column } from '@/components/ui/table';

export interface YardRow {
  id: number;
  name: string;
  solidCapacityKg: number;
  brineCapacityL: number;
  trucks: string;
  loadsLastDay: number;
  loadedKgLastDay: number;
}

const columns: Column<YardRow>[] = [
  { key: 'name', head: 'Yard', isRowHead: true, cell: (yard) => yard.name },
  { key: 'trucks', head: 'Trucks', cell: (yard) => yard.trucks || 'none' },
  {
    key: 'solid',
    head: 'Holds',
    isNumber: true,
    cell: (yard) => <Figure value={yard.solidCapacityKg} quantity="largeMass" digits={0} />,
  },
  {
    key: 'brine',
    head: 'Brine tank',
    isNumber: true,
    cell: (yard) => <Figure value={yard.brineCapacityL} quantity="volume" />,
  },
  { key: 'loads', head: 'Loads', isNumber: true, cell: (yard) => yard.loadsLastDay },
  {
    key: 'out',
    head: 'Loaded out',
    isNumber: true,
    cell: (yard) => <Figure value={yard.loadedKgLastDay} quantity="largeMass" />,
  },
];

export function YardList({ yards }: Readonly<{ yards: readonly YardRow[] }>) {
  return <Table caption="Yards" columns={columns} rows={yards} rowKey={(yard) => yard.id} />;
}
