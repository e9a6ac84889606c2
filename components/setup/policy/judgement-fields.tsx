'use client';

import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { TextInput } from '@/components/ui/text-input';
import { type ProblemFields } from '@/lib/problem';
import { type Quantity } from '@/lib/units/format';
import { type Policy } from '@/lib/treatment/policy';

const minuteFields = [
  { name: 'marginMin', label: 'Margin, minutes', hint: 'A road still holds this long after the next pass is due.' },
  { name: 'workInMin', label: 'Time to work in, minutes', hint: 'The promise is judged once the salt had this long.' },
  {
    name: 'shortestCycleMin',
    label: 'Shortest cycle, minutes',
    hint: 'Where a rate is not enough, coming back sooner is offered down to this.',
  },
] as const;

const amountFields: readonly { name: AmountName; label: string; hint: string; quantity: Quantity }[] = [
  {
    name: 'ploughFromMm',
    label: 'Plough from',
    hint: 'Frozen or falling, as depth of water.',
    quantity: 'depth',
  },
  {
    name: 'abrasiveRateGPerM2',
    label: 'Abrasives are spread at',
    hint: 'Where no salt works any more.',
    quantity: 'rate',
  },
  {
    name: 'looseBrineShare',
    label: 'Brine that keeps snow loose',
    hint: 'Share of what lies there, at and above −2 °C (28 °F).',
    quantity: 'percent',
  },
  {
    name: 'blowingFromMPerS',
    label: 'Snow blows from',
    hint: 'On a cold dry road nothing is spread from this wind on.',
    quantity: 'windSpeed',
  },
  {
    name: 'blowingBelowC',
    label: 'and below',
    hint: 'Pavement temperature.',
    quantity: 'temperature',
  },
];
type AmountName = 'ploughFromMm' | 'abrasiveRateGPerM2' | 'looseBrineShare' | 'blowingFromMPerS' | 'blowingBelowC';

export const judgementNames = [...minuteFields, ...amountFields].map(({ name }) => `rules.${name}`);

export type JudgementFieldsProps = Readonly<{ policy: Policy; fields: ProblemFields }>;

/** The numbers by which a treatment is judged and chosen. */
export function JudgementFields({ policy, fields }: JudgementFieldsProps) {
  return (
    <div className="grid gap-x-8 gap-y-5 sm:grid-cols-2">
      {minuteFields.map(({ name, label, hint }) => (
        <Field key={name} label={label} hint={hint} error={fields[`rules.${name}`]}>
          <TextInput
            name={name}
            inputMode="numeric"
            className="max-w-24 text-right font-mono"
            defaultValue={policy[name]}
          />
        </Field>
      ))}
      {amountFields.map(({ name, label, hint, quantity }) => (
        <Field key={name} label={label} hint={hint} error={fields[`rules.${name}`]}>
          <NumberInput name={name} quantity={quantity} digits={2} defaultValue={policy[name]} className="max-w-48" />
        </Field>
      ))}
    </div>
  );
}
