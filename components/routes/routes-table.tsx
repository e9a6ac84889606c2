'use client';

import { Figure } from '@/components/ui/figure';
import { Table, type Column } from '@/components/ui/table';

export interface RouteRow {
  id: number;
  name: string;
  yardId: number;
  yardName: string;
  truckId: number | null;
  truckNumber: number | null;
  segmentIds: readonly number[];
  laneKm: number;
  centreKm: number;
  areaM2: number;
}

export type RoutesTableProps = Readonly<{
  routes: readonly RouteRow[];
  chosenId: number | null;
  onChoose: (id: number) => void;
}>;

/** Salt for one treatment of a route at this rate: a size to compare hoppers with. */
const exampleRateGPerM2 = 20;

export function RoutesTable({ routes, chosenId, onChoose }: RoutesTableProps) {
  const columns: Column<RouteRow>[] = [
    {
      key: 'name',
      head: 'Route',
      isRowHead: true,
      cell: (route) => (
        <button
          type="button"
          className="link text-left"
          aria-pressed={route.id === chosenId}
          onClick={() => onChoose(route.id)}
        >
          {route.name}
        </button>
      ),
    },
    { key: 'yard', head: 'From', cell: (route) => route.yardName },
    {
      key: 'truck',
      head: 'Truck',
      isNumber: true,
      cell: (route) => route.truckNumber ?? <span className="font-sans text-faint">any</span>,
    },
    { key: 'roads', head: 'Roads', isNumber: true, cell: (route) => route.segmentIds.length },
    {
      key: 'length',
      head: 'Length',
      isNumber: true,
      cell: (route) => <Figure value={route.centreKm * 1000} quantity="distance" />,
    },
    {
      key: 'lanes',
      head: 'Lanes',
      isNumber: true,
      cell: (route) => <Figure value={route.laneKm * 1000} quantity="laneDistance" />,
    },
    {
      key: 'salt',
      head: (
        <>
          Once at <Figure value={exampleRateGPerM2} quantity="rate" digits={0} size="inline" />
        </>
      ),
      isNumber: true,
      cell: (route) => <Figure value={(route.areaM2 * exampleRateGPerM2) / 1000} quantity="largeMass" />,
    },
  ];
  return (
    <Table
      caption="Standing routes"
      columns={columns}
      rows={routes}
      rowKey={(route) => route.id}
      rowClassName={(route) => (route.id === chosenId ? 'bg-raised' : undefined)}
    />
  );
}
