'use client';

import { useState } from 'react';
import { Field } from '@/components/ui/field';
import { Form, type FormSubmission } from '@/components/ui/form';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { formatDayTime, formatUtcOffset } from '@/lib/time/format';
import { fromLocalField, toLocalField } from './zoned-time';

export type OpenStormFormProps = Readonly<{ submission: FormSubmission; zone: string; nowAt: number }>;

const hourMs = 3_600_000;
const cycles = [1, 1.5, 2, 2.5, 3, 4, 6] as const;
const mostPasses = 60;

function passTimes(given: { firstAt: number | null; untilAt: number | null; everyH: number }): number[] {
  const { firstAt, untilAt, everyH } = given;
  if (firstAt === null || untilAt === null) return [];
  const count = Math.max(0, Math.ceil((untilAt - firstAt) / (everyH * hourMs)));
  return Array.from({ length: Math.min(mostPasses, count) }, (_, index) => firstAt + index * everyH * hourMs);
}

/** A storm's name, span and passes; times as the agency's clock shows them. */
export function OpenStormForm({ submission, zone, nowAt }: OpenStormFormProps) {
  const fromNow = (hours: number) => toLocalField(Math.ceil(nowAt / hourMs) * hourMs + hours * hourMs, zone);
  const [from, setFrom] = useState(() => fromNow(0));
  const [until, setUntil] = useState(() => fromNow(14));
  const [first, setFirst] = useState(() => fromNow(1));
  const [everyH, setEveryH] = useState(3);
  const untilAt = fromLocalField(until, zone);
  const passes = passTimes({ firstAt: fromLocalField(first, zone), untilAt, everyH });
  const iso = (at: number | null) => (at === null ? '' : new Date(at).toISOString());
  const { fields } = submission;
  return (
    <Form
      submission={submission}
      submitLabel="Open the storm"
      busyLabel="Opening"
      shownFields={['name', 'fromAt', 'untilAt', 'passStartsAt']}
      toInput={({ name }) => ({
        name,
        fromAt: iso(fromLocalField(from, zone)),
        untilAt: iso(untilAt),
        passStartsAt: passes.map((at) => new Date(at).toISOString()),
      })}
    >
      <Field label="Name" hint="What is coming: snow turning to freezing drizzle." error={fields.name}>
        <TextInput name="name" autoFocus maxLength={80} />
      </Field>
      <div className="grid gap-4">
        <Field label="From" hint={`Agency time, ${formatUtcOffset(nowAt, zone)}`} error={fields.fromAt}>
          <TextInput type="datetime-local" value={from} onChange={(event) => setFrom(event.target.value)} />
        </Field>
        <Field label="Until" error={fields.untilAt}>
          <TextInput type="datetime-local" value={until} onChange={(event) => setUntil(event.target.value)} />
        </Field>
        <Field label="First pass leaves" error={fields.passStartsAt}>
          <TextInput type="datetime-local" value={first} onChange={(event) => setFirst(event.target.value)} />
        </Field>
        <Field label="Then every">
          <Select
            value={String(everyH)}
            onChange={(event) => setEveryH(Number(event.target.value))}
            options={cycles.map((hours) => ({
              value: String(hours),
              label: hours === 1 ? '1 hour' : `${hours} hours`,
            }))}
          />
        </Field>
      </div>
      <p className="text-sm text-soft">
        {passes.length === 0
          ? 'No pass lies before the end.'
          : `${passes.length} ${passes.length === 1 ? 'pass' : 'passes'}: ${passes
              .slice(0, 8)
              .map((at) => formatDayTime(at, zone))
              .join(', ')}${passes.length > 8 ? ' and so on' : ''}.`}
      </p>
    </Form>
  );
}
