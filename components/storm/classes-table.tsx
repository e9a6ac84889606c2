'use client';

import { Figure } from '@/components/ui/figure';
import { Table, type Column } from '@/components/ui/table';
import { promiseWords } from './storm-words';
import { type ClassView } from './storm-content';

export type ClassesTableProps = Readonly<{ classes: readonly ClassView[] }>;

/** What each class of road was promised. */
export function ClassesTable({ classes }: ClassesTableProps) {
  const columns: Column<ClassView>[] = [
    { key: 'class', head: 'Class', isRowHead: true, cell: ({ serviceClass }) => serviceClass },
    {
      key: 'promise',
      head: 'Promise',
      cell: ({ promise }) => (
        <>
          <span className="font-semibold">{promiseWords[promise].name}</span>
          <span className="block text-sm text-soft">{promiseWords[promise].means}</span>
        </>
      ),
    },
    { key: 'roads', head: 'Roads', isNumber: true, cell: ({ roads }) => roads },
    {
      key: 'lane',
      head: 'Lanes',
      isNumber: true,
      cell: ({ laneKm }) => <Figure value={laneKm * 1000} quantity="laneDistance" digits={0} />,
    },
  ];
  return <Table caption="Promises" columns={columns} rows={classes} rowKey={({ serviceClass }) => serviceClass} />;
}
