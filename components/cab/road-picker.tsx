'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Figure } from '@/components/ui/figure';
import { TextInput } from '@/components/ui/text-input';

export interface RoadChoiceView {
  id: number;
  name: string;
  serviceClass: string;
  lengthM: number;
}

export type RoadPickerProps = Readonly<{
  roads: readonly RoadChoiceView[];
  chosen: readonly number[];
  onChange: (ids: readonly number[]) => void;
}>;

/** A free list of roads, found by name, kept in the order they are chosen. */
export function RoadPicker({ roads, chosen, onChange }: RoadPickerProps) {
  const [search, setSearch] = useState('');
  const byId = new Map(roads.map((road) => [road.id, road]));
  const wanted = search.trim().toLowerCase();
  const found = roads
    .filter((road) => !chosen.includes(road.id) && road.name.toLowerCase().includes(wanted))
    .slice(0, 8);
  return (
    <section aria-label="Roads" className="grid gap-4">
      <Field label="Find a road by its name">
        <TextInput value={search} onChange={(event) => setSearch(event.target.value)} className="min-h-16 text-xl" />
      </Field>
      <ul className="grid gap-2 sm:grid-cols-2">
        {found.map((road) => (
          <li key={road.id}>
            <Button size="cab" className="w-full justify-between" onClick={() => onChange([...chosen, road.id])}>
              <span>{road.name}</span>
              <Figure value={road.lengthM} quantity="distance" />
            </Button>
          </li>
        ))}
      </ul>
      {chosen.length > 0 ? (
        <ol className="border-t">
          {chosen.map((id, index) => (
            <li key={id} className="flex items-center justify-between gap-4 border-b py-2 text-xl">
              <span>
                {index + 1}. {byId.get(id)?.name ?? 'Road no longer there'}
              </span>
              <Button size="cab" variant="quiet" onClick={() => onChange(chosen.filter((other) => other !== id))}>
                Take out
              </Button>
            </li>
          ))}
        </ol>
      ) : (
        <p className="text-lg text-soft">No road chosen yet.</p>
      )}
    </section>
  );
}
