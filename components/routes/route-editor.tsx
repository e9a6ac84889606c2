'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Sheet } from '@/components/ui/dialog';
import { Field } from '@/components/ui/field';
import { ProblemNotice } from '@/components/ui/notice';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { type ProblemView } from '@/lib/problem';
import { moveTo } from './order';

export interface RoadOption {
  id: number;
  name: string;
  serviceClass: string;
  lengthM: number;
}

export interface EditedRoute {
  id: number | null;
  name: string;
  yardId: number;
  truckId: number | null;
  segmentIds: readonly number[];
}

interface Choice {
  id: number;
  name: string;
}

export type RouteEditorProps = Readonly<{
  route: EditedRoute;
  roads: readonly RoadOption[];
  trucks: readonly Choice[];
  yards: readonly Choice[];
  problem: ProblemView | null;
  isSending: boolean;
  onClose: () => void;
  onSave: (route: EditedRoute) => void;
  onRetire: (id: number) => void;
}>;

export function RouteEditor({
  route,
  roads,
  trucks,
  yards,
  problem,
  isSending,
  onClose,
  onSave,
  onRetire,
}: RouteEditorProps) {
  const [draft, setDraft] = useState(route);
  const change = (part: Partial<EditedRoute>) => setDraft((before) => ({ ...before, ...part }));
  const { id } = draft;
  const save = () =>
    onSave({ id, name: draft.name, yardId: draft.yardId, truckId: draft.truckId, segmentIds: draft.segmentIds });
  return (
    <Sheet isOpen onOpenChange={onClose} title={id === null ? 'New route' : `Change ${route.name}`}>
      <div className="grid gap-4">
        <ProblemNotice problem={problem} />
        <Field label="Name" error={problem?.fields.name}>
          <TextInput value={draft.name} onChange={(event) => change({ name: event.target.value })} />
        </Field>
        <div className="grid grid-cols-2 gap-4">
          <Field label="Starts from" error={problem?.fields.yardId}>
            <Select
              value={String(draft.yardId)}
              onChange={(event) => change({ yardId: Number(event.target.value) })}
              options={yards.map((yard) => ({ value: String(yard.id), label: yard.name }))}
            />
          </Field>
          <Field label="Usual truck">
            <Select
              value={String(draft.truckId ?? '')}
              onChange={(event) => change({ truckId: event.target.value ? Number(event.target.value) : null })}
              options={[
                { value: '', label: 'Any truck' },
                ...trucks.map((truck) => ({ value: String(truck.id), label: truck.name })),
              ]}
            />
          </Field>
        </div>
        <RoadOrder
          roads={roads}
          ids={draft.segmentIds}
          error={problem?.fields.segmentIds}
          onChange={(segmentIds) => change({ segmentIds })}
        />
        <div className="flex flex-wrap justify-between gap-2 border-t pt-4">
          {id === null ? (
            <span />
          ) : (
            <Button variant="danger" isBusy={isSending} onClick={() => onRetire(id)}>
              Take out of use
            </Button>
          )}
          <Button variant="primary" isBusy={isSending} busyLabel="Saving" onClick={save}>
            Save the route
          </Button>
        </div>
      </div>
    </Sheet>
  );
}

type RoadOrderProps = Readonly<{
  roads: readonly RoadOption[];
  ids: readonly number[];
  error: string | undefined;
  onChange: (ids: readonly number[]) => void;
}>;

function RoadOrder({ roads, ids, error, onChange }: RoadOrderProps) {
  const [search, setSearch] = useState('');
  const byId = new Map(roads.map((road) => [road.id, road]));
  const wanted = search.trim().toLowerCase();
  const found = wanted
    ? roads.filter((road) => !ids.includes(road.id) && road.name.toLowerCase().includes(wanted)).slice(0, 6)
    : [];
  return (
    <>
      <Field label="Add a road by its name" error={error}>
        <TextInput value={search} onChange={(event) => setSearch(event.target.value)} />
      </Field>
      {found.length > 0 ? (
        <ul className="-mt-2">
          {found.map((road) => (
            <li key={road.id}>
              <Button
                variant="quiet"
                size="small"
                className="w-full justify-start"
                onClick={() => onChange([...ids, road.id])}
              >
                Add {road.name}
              </Button>
            </li>
          ))}
        </ul>
      ) : null}
      <ol tabIndex={0} aria-label="Roads in order" className="max-h-[45vh] overflow-y-auto border-b">
        {ids.map((id, index) => {
          const name = byId.get(id)?.name ?? 'Road out of use';
          return (
            <li key={id} className="flex items-center gap-2 border-t py-1">
              <span className="w-7 shrink-0 text-right font-mono text-soft">{index + 1}</span>
              <span className="min-w-0 flex-1 truncate">{name}</span>
              <Button
                variant="quiet"
                size="small"
                aria-label={`${name}: earlier`}
                onClick={() => onChange(moveTo(ids, index, index - 1))}
              >
                Up
              </Button>
              <Button
                variant="quiet"
                size="small"
                aria-label={`${name}: later`}
                onClick={() => onChange(moveTo(ids, index, index + 1))}
              >
                Down
              </Button>
              <Button
                variant="quiet"
                size="small"
                aria-label={`${name}: take out`}
                onClick={() => onChange(ids.filter((other) => other !== id))}
              >
                Out
              </Button>
            </li>
          );
        })}
      </ol>
    </>
  );
}
