'use client';

import { type ReactNode } from 'react';
import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { type TimeLayout } from '@/lib/readings/mapping';

export type TimeFieldsProps = Readonly<{
  time: TimeLayout;
  columnNames: readonly string[];
  error: string | undefined;
  onChange: (time: TimeLayout) => void;
  /** whose clock it is */
  children: ReactNode;
}>;

const kinds = [
  { value: 'one', label: 'in one column' },
  { value: 'two', label: 'date and time in two columns' },
  { value: 'parts', label: 'year, month, day, hour apart' },
];

const patterns = [
  'iso',
  'yyyy-MM-dd HH:mm',
  'dd.MM.yyyy HH:mm',
  'dd/MM/yyyy HH:mm',
  'MM/dd/yyyy HH:mm',
  'MM/dd/yyyy hh:mm a',
  'yyyyMMddHHmm',
  'epoch-s',
  'epoch-ms',
];

function emptyOf(kind: string, names: readonly string[]): TimeLayout {
  const [first = '', second = '', third = '', fourth = ''] = names;
  if (kind === 'two') {
    return { kind: 'two', dateColumn: first, datePattern: 'yyyy-MM-dd', timeColumn: second, timePattern: 'HH:mm' };
  }
  if (kind === 'parts') {
    return {
      kind: 'parts',
      yearColumn: first,
      monthColumn: second,
      dayColumn: third,
      hourColumn: fourth,
      minuteColumn: null,
      hourZero: 'begins-day',
    };
  }
  return { kind: 'one', column: first, pattern: 'iso' };
}

type Choice = Readonly<{ label: string; value: string; names: readonly string[]; onChange: (column: string) => void }>;

function ColumnChoice({ label, value, names, onChange }: Choice) {
  const options = (names.includes(value) ? names : [value, ...names]).map((name) => ({ value: name, label: name }));
  return (
    <Field label={label}>
      <Select value={value} options={options} onChange={(event) => onChange(event.target.value)} />
    </Field>
  );
}

function PatternInput({
  label,
  value,
  onChange,
}: Readonly<{ label: string; value: string; onChange: (pattern: string) => void }>) {
  return (
    <Field label={label}>
      <TextInput
        value={value}
        list="time-patterns"
        className="font-mono"
        autoComplete="off"
        onChange={(event) => onChange(event.target.value)}
      />
    </Field>
  );
}

/** In which columns a row says its time, and how it is laid out. */
export function TimeFields({ time, columnNames: names, error, onChange, children }: TimeFieldsProps) {
  return (
    <div className="grid gap-3">
      <div className="grid items-start gap-4 sm:grid-cols-2 lg:grid-cols-4">
        <Field label="The time stands" error={error}>
          <Select
            value={time.kind}
            options={kinds}
            onChange={(event) => onChange(emptyOf(event.target.value, names))}
          />
        </Field>
        {time.kind === 'one' ? (
          <>
            <ColumnChoice
              label="Column"
              value={time.column}
              names={names}
              onChange={(column) => onChange({ ...time, column })}
            />
            <PatternInput
              label="Laid out as"
              value={time.pattern}
              onChange={(pattern) => onChange({ ...time, pattern })}
            />
          </>
        ) : null}
        {time.kind === 'two' ? <TwoColumns time={time} names={names} onChange={onChange} /> : null}
        {time.kind === 'parts' ? <Parts time={time} names={names} onChange={onChange} /> : null}
        {children}
      </div>
      <datalist id="time-patterns">
        {patterns.map((pattern) => (
          <option key={pattern} value={pattern} />
        ))}
      </datalist>
    </div>
  );
}

type Inner<Kind extends TimeLayout['kind']> = Readonly<{
  time: TimeLayout & { kind: Kind };
  names: readonly string[];
  onChange: (time: TimeLayout) => void;
}>;

function TwoColumns({ time, names, onChange }: Inner<'two'>) {
  return (
    <>
      <ColumnChoice
        label="Date"
        value={time.dateColumn}
        names={names}
        onChange={(dateColumn) => onChange({ ...time, dateColumn })}
      />
      <PatternInput
        label="Date laid out as"
        value={time.datePattern}
        onChange={(datePattern) => onChange({ ...time, datePattern })}
      />
      <ColumnChoice
        label="Time"
        value={time.timeColumn}
        names={names}
        onChange={(timeColumn) => onChange({ ...time, timeColumn })}
      />
      <PatternInput
        label="Time laid out as"
        value={time.timePattern}
        onChange={(timePattern) => onChange({ ...time, timePattern })}
      />
    </>
  );
}

function Parts({ time, names, onChange }: Inner<'parts'>) {
  const parts = ['year', 'month', 'day', 'hour'] as const;
  return (
    <>
      {parts.map((part) => (
        <ColumnChoice
          key={part}
          label={`Column of the ${part}`}
          value={time[`${part}Column`]}
          names={names}
          onChange={(column) => onChange({ ...time, [`${part}Column`]: column })}
        />
      ))}
      <Field label="Column of the minute">
        <Select
          value={time.minuteColumn ?? ''}
          options={[{ value: '', label: 'none: whole hours' }, ...names.map((name) => ({ value: name, label: name }))]}
          onChange={(event) => onChange({ ...time, minuteColumn: event.target.value || null })}
        />
      </Field>
      <Field label="Hour 0">
        <Select
          value={time.hourZero}
          options={[
            { value: 'begins-day', label: 'begins the day of its date' },
            { value: 'ends-day', label: 'ends it: the midnight after' },
          ]}
          onChange={(event) =>
            onChange({ ...time, hourZero: event.target.value === 'ends-day' ? 'ends-day' : 'begins-day' })
          }
        />
      </Field>
    </>
  );
}
