'use client';

import { Button } from '@/components/ui/button';
import { Figure } from '@/components/ui/figure';
import { Table } from '@/components/ui/table';
import { attributeWords, classWords, isAssumedAttribute } from './words';
import { type ListedRoad } from './road-form';

export type RoadsTableProps = Readonly<{ roads: readonly ListedRoad[]; onChange: (id: number) => void }>;

/** A value that was filled in is marked by a dotted line and, for those who do not see it, by a word. */
function Value({
  road,
  attribute,
  children,
}: Readonly<{ road: ListedRoad; attribute: string; children: string | number }>) {
  if (!road.assumed.includes(attribute)) return <>{children}</>;
  return (
    <span className="border-b border-dotted border-faint text-soft" title="assumed">
      {children}
      <span className="sr-only"> assumed</span>
    </span>
  );
}

export function RoadsTable({ roads, onChange }: RoadsTableProps) {
  return (
    <Table
      caption="Roads in use"
      rows={roads}
      rowKey={(road) => road.id}
      columns={[
        {
          key: 'name',
          head: 'Road',
          isRowHead: true,
          cell: (road) => (
            <>
              <Value road={road} attribute="name">
                {road.name}
              </Value>
              <span className="block text-sm font-normal text-soft">
                {[
                  classWords(road.roadClass),
                  road.isOneWay && 'one-way',
                  road.isBridge && 'bridge',
                  road.isSensitive && 'sensitive ground',
                ]
                  .filter(Boolean)
                  .join(', ')}
              </span>
            </>
          ),
        },
        { key: 'class', head: 'Class', cell: (road) => road.serviceClass },
        {
          key: 'lanes',
          head: 'Lanes',
          isNumber: true,
          cell: (road) => (
            <Value road={road} attribute="lanes">
              {road.lanes}
            </Value>
          ),
        },
        {
          key: 'length',
          head: 'Length',
          isNumber: true,
          cell: (road) => <Figure value={road.lengthM} quantity="shortDistance" />,
        },
        {
          key: 'surface',
          head: 'Surface',
          cell: (road) => (
            <Value road={road} attribute="surface">
              {road.surface}
            </Value>
          ),
        },
        {
          key: 'exposure',
          head: 'Exposure',
          cell: (road) => (
            <Value road={road} attribute="exposure">
              {road.exposure}
            </Value>
          ),
        },
        {
          key: 'assumed',
          head: 'Assumed',
          className: 'text-sm text-soft max-w-56',
          cell: (road) =>
            road.assumed
              .filter(isAssumedAttribute)
              .map((name) => attributeWords[name])
              .join(', ') || 'nothing',
        },
        {
          key: 'change',
          head: <span className="sr-only">Change</span>,
          className: 'text-right print:hidden',
          cell: (road) => (
            <Button size="small" variant="quiet" onClick={() => onChange(road.id)} aria-label={`Change ${road.name}`}>
              Change
            </Button>
          ),
        },
      ]}
    />
  );
}
