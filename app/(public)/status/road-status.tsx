'use client';

import { useState } from 'react';
import { EmptyState } from '@/components/ui/empty-state';
import { Field } from '@/components/ui/field';
import { Section } from '@/components/ui/section';
import { Table } from '@/components/ui/table';
import { Tag } from '@/components/ui/tag';
import { TextInput } from '@/components/ui/text-input';

export interface StatusRoad {
  name: string;
  serviceClass: 'A' | 'B' | 'C' | 'D';
  parts: number;
  treatedParts: number;
  /** "Tue 02:40", in the agency's zone; null when not treated in this storm */
  lastTreated: string | null;
}

const classWords: Readonly<Record<StatusRoad['serviceClass'], string>> = {
  A: 'Class A, treated first',
  B: 'Class B',
  C: 'Class C',
  D: 'Class D, treated last',
};

function State({ road }: Readonly<{ road: StatusRoad }>) {
  if (road.treatedParts === 0) return <Tag tone="urgent">not yet</Tag>;
  if (road.treatedParts < road.parts) {
    return (
      <Tag tone="closing">
        {road.treatedParts} of {road.parts} parts
      </Tag>
    );
  }
  return <Tag tone="safe">treated</Tag>;
}

function ClassTable({
  serviceClass,
  roads,
}: Readonly<{ serviceClass: StatusRoad['serviceClass']; roads: readonly StatusRoad[] }>) {
  const done = roads.filter((road) => road.treatedParts === road.parts).length;
  return (
    <Section title={classWords[serviceClass]} lead={`${done} of ${roads.length} roads treated`}>
      <Table
        caption={`${classWords[serviceClass]}: roads and when they were last treated`}
        rows={roads}
        rowKey={(road) => road.name}
        columns={[
          { key: 'road', head: 'Road', isRowHead: true, className: 'w-1/2', cell: (road) => road.name },
          { key: 'state', head: 'This storm', cell: (road) => <State road={road} /> },
          {
            key: 'at',
            head: 'Last treated',
            isNumber: true,
            cell: (road) => road.lastTreated ?? <span className="text-faint">none</span>,
          },
        ]}
      />
    </Section>
  );
}

export function RoadStatus({ roads }: Readonly<{ roads: readonly StatusRoad[] }>) {
  const [wanted, setWanted] = useState('');
  const word = wanted.trim().toLowerCase();
  const found = word === '' ? roads : roads.filter((road) => road.name.toLowerCase().includes(word));
  return (
    <>
      <Field label="Find a road" className="max-w-sm print:hidden">
        <TextInput type="search" value={wanted} onChange={(event) => setWanted(event.target.value)} />
      </Field>
      <p aria-live="polite" className="sr-only">
        {found.length} roads listed
      </p>
      {found.length === 0 ? (
        <EmptyState title="No road of that name">
          Try a part of the name; roads outside this storm’s plan are not listed.
        </EmptyState>
      ) : null}
      {(['A', 'B', 'C', 'D'] as const).map((serviceClass) => {
        const ofClass = found.filter((road) => road.serviceClass === serviceClass);
        return ofClass.length > 0 ? (
          <ClassTable key={serviceClass} serviceClass={serviceClass} roads={ofClass} />
        ) : null;
      })}
    </>
  );
}
