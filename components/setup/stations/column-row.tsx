'use client';

import { type ReactNode } from 'react';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { type ColumnMapping, USUAL_INTERVAL_MIN } from '@/lib/readings/mapping';
import { quantities, quantityFacts, type ReadingQuantity } from '@/lib/readings/quantities';
import { factsOfUnit, type FileUnitName, isOverInterval, unitsOf } from '@/lib/readings/units';
import { ClockField } from './clock-field';
import { codesIn } from './table-fields';

export type ColumnRowProps = Readonly<{
  name: string;
  /** a few cells of it, as they stand in the file */
  samples: readonly string[];
  /** null: it is not read */
  column: ColumnMapping | null;
  stationZone: string;
  error: string | undefined;
  onChange: (column: ColumnMapping | null) => void;
}>;

const quantityOptions = [
  { value: '', label: 'not read' },
  ...quantities.map((quantity) => ({ value: quantity, label: quantityFacts[quantity].label })),
];

function Cell({ label, children }: Readonly<{ label: string; children: ReactNode }>) {
  return (
    <div className="grid min-w-0 content-start gap-1">
      <span aria-hidden className="text-sm text-soft lg:hidden">
        {label}
      </span>
      {children}
    </div>
  );
}

function freshColumn(name: string, quantity: ReadingQuantity): ColumnMapping {
  const unit = unitsOf(quantity)[0] ?? 'word';
  const missing = factsOfUnit(unit)?.missing ?? [];
  return { column: name, quantity, unit, clock: null, missing, intervalMin: USUAL_INTERVAL_MIN, timeIs: 'end' };
}

export const columnGrid =
  'grid grid-cols-2 gap-x-3 gap-y-2 lg:grid-cols-[minmax(7rem,1.1fr)_minmax(9rem,1.3fr)_7rem_minmax(9rem,1.2fr)_minmax(6rem,0.8fr)]';

/** One column of the file: what it measures, in what unit, by whose clock, and what stands for missing. */
export function ColumnRow({ name, samples, column, stationZone, error, onChange }: ColumnRowProps) {
  const chooseQuantity = (value: string) => {
    const quantity = quantities.find((each) => each === value);
    onChange(quantity ? { ...freshColumn(name, quantity), clock: column?.clock ?? null } : null);
  };
  return (
    <li className="grid gap-2 border-b py-3 lg:py-2">
      <div className={columnGrid}>
        <div className="col-span-2 min-w-0 lg:col-span-1">
          <p className="font-semibold wrap-anywhere">{name}</p>
          <p className="truncate font-mono text-sm text-faint" title={samples.join('  ')}>
            {samples.join('  ')}
          </p>
        </div>
        <Cell label="Measures">
          <Select
            aria-label={`What “${name}” measures`}
            value={column?.quantity ?? ''}
            options={quantityOptions}
            onChange={(event) => chooseQuantity(event.target.value)}
          />
        </Cell>
        {column ? <ReadColumn {...{ name, column, stationZone, onChange }} /> : null}
      </div>
      {error ? <p className="text-sm font-semibold text-frozen">{error}</p> : null}
    </li>
  );
}

type ReadColumnProps = Readonly<{
  name: string;
  column: ColumnMapping;
  stationZone: string;
  onChange: (column: ColumnMapping) => void;
}>;

function ReadColumn({ name, column, stationZone, onChange }: ReadColumnProps) {
  const units = unitsOf(column.quantity);
  const chooseUnit = (unit: FileUnitName) => onChange({ ...column, unit, missing: factsOfUnit(unit)?.missing ?? [] });
  const isGathered = isOverInterval(column.quantity) || factsOfUnit(column.unit)?.needsInterval;
  return (
    <>
      <Cell label="Unit">
        {column.unit === 'word' ? (
          <p className="self-center text-soft">words or codes</p>
        ) : (
          <Select
            aria-label={`Unit of “${name}”`}
            value={column.unit}
            options={units.map((unit) => ({ value: unit, label: unit }))}
            onChange={(event) => chooseUnit(units.find((unit) => unit === event.target.value) ?? column.unit)}
          />
        )}
      </Cell>
      <Cell label="Its time is told by">
        <ClockField
          label={`Clock of “${name}”`}
          value={column.clock}
          isOptional
          stationZone={stationZone}
          onChange={(clock) => onChange({ ...column, clock })}
        />
      </Cell>
      <Cell label="Also missing">
        <TextInput
          key={column.unit}
          aria-label={`Codes of “${name}” that mean missing`}
          className="font-mono"
          defaultValue={column.missing.join(', ')}
          onChange={(event) => onChange({ ...column, missing: codesIn(event.target.value) })}
        />
      </Cell>
      {isGathered ? <Interval name={name} column={column} onChange={onChange} /> : null}
    </>
  );
}

function Interval({ name, column, onChange }: Omit<ReadColumnProps, 'stationZone'>) {
  return (
    <div className="flex flex-wrap items-center gap-x-2 gap-y-1.5 text-sm text-soft col-span-2 lg:col-span-4 lg:col-start-2">
      <span>gathered over</span>
      <TextInput
        aria-label={`Minutes over which “${name}” is gathered`}
        inputMode="numeric"
        className="w-20 text-right font-mono"
        value={column.intervalMin || ''}
        onChange={(event) => onChange({ ...column, intervalMin: Number(event.target.value.replace(/\D/g, '')) })}
      />
      <span>min; the time of the row is its</span>
      <Select
        aria-label={`Whether the time of “${name}” is the end or the start of that`}
        className="w-24"
        value={column.timeIs}
        options={[
          { value: 'end', label: 'end' },
          { value: 'start', label: 'start' },
        ]}
        onChange={(event) => onChange({ ...column, timeIs: event.target.value === 'start' ? 'start' : 'end' })}
      />
    </div>
  );
}
