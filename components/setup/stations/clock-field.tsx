'use client';

import { useState } from 'react';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { type Clock } from '@/lib/readings/mapping';

export type ClockFieldProps = Readonly<{
  label: string;
  /** null: the same as the file's; only where `isOptional` */
  value: Clock | null;
  isOptional?: boolean;
  stationZone: string;
  onChange: (clock: Clock | null) => void;
}>;

const offsetsMin = [
  ...Array.from({ length: 27 }, (_, index) => (index - 12) * 60),
  -210,
  210,
  270,
  330,
  345,
  390,
  570,
  630,
].sort((a, b) => a - b);

function offsetWords(offsetMin: number): string {
  if (offsetMin === 0) return 'UTC';
  const absolute = Math.abs(offsetMin);
  const minutes = absolute % 60 === 0 ? '' : `:${absolute % 60}`;
  return `UTC${offsetMin < 0 ? '\u2212' : '+'}${Math.floor(absolute / 60)}${minutes} all year`;
}

const keyOf = (clock: Clock | null) =>
  clock === null ? 'same' : clock.kind === 'zone' ? `zone ${clock.zone}` : `offset ${clock.offsetMin}`;

function clockOf(key: string): Clock | null {
  const [kind, ...rest] = key.split(' ');
  if (kind === 'zone') return { kind: 'zone', zone: rest.join(' ') };
  return kind === 'offset' ? { kind: 'offset', offsetMin: Number(rest[0]) } : null;
}

/** Whose clock a time is told by: the file's, the station's zone, UTC, an offset all year, or any zone by name. */
export function ClockField({ label, value, isOptional = false, stationZone, onChange }: ClockFieldProps) {
  const [isNaming, setIsNaming] = useState(false);
  const zones = new Set([stationZone, ...(value?.kind === 'zone' ? [value.zone] : [])]);
  zones.delete('UTC');
  const options = [
    ...(isOptional ? [{ value: 'same', label: 'as the file' }] : []),
    ...[...zones].map((zone) => ({
      value: `zone ${zone}`,
      label: zone === stationZone ? `${zone}, the station’s` : zone,
    })),
    { value: 'offset 0', label: 'UTC' },
    { value: 'other', label: 'another zone…' },
    ...offsetsMin.filter(Boolean).map((offsetMin) => ({ value: `offset ${offsetMin}`, label: offsetWords(offsetMin) })),
  ];
  const current = value?.kind === 'zone' && value.zone === 'UTC' ? 'offset 0' : keyOf(value);
  const choose = (key: string) => {
    setIsNaming(key === 'other');
    if (key !== 'other') onChange(clockOf(key));
  };
  return (
    <div className="grid min-w-0 gap-1.5">
      <Select
        aria-label={label}
        value={isNaming ? 'other' : current}
        options={options}
        onChange={(event) => choose(event.target.value)}
      />
      {isNaming ? (
        <TextInput
          aria-label={`${label}: name of the zone`}
          placeholder="America/Toronto"
          list="zone-names"
          defaultValue=""
          onChange={(event) => onChange({ kind: 'zone', zone: event.target.value.trim() })}
        />
      ) : null}
    </div>
  );
}
