'use client';

import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { type ProblemFields } from '@/lib/problem';
import { serviceClasses, type Policy } from '@/lib/treatment/policy';
import { type PromiseKind } from '@/lib/treatment/promise';

const promiseWords: readonly { value: PromiseKind; label: string }[] = [
  { value: 'bare', label: 'bare: no ice, snow kept loose' },
  { value: 'passable', label: 'passable: a little ice, snow kept loose' },
  { value: 'low', label: 'low: half the ice may stay' },
];

export type ClassFieldsProps = Readonly<{ policy: Policy; fields: ProblemFields }>;

/** What each class of road is promised: one line a class. */
export function ClassFields({ policy, fields }: ClassFieldsProps) {
  return (
    <ul className="border-t">
      {serviceClasses.map((name) => (
        <li
          key={name}
          className="grid items-start gap-x-6 gap-y-2 border-b py-3 sm:grid-cols-[4.5rem_minmax(0,1fr)_11rem]"
        >
          <p className="font-semibold sm:pt-7">Class {name}</p>
          <Field label="Promise" error={fields[`rules.promises.${name}`]}>
            <Select name={`promises.${name}`} defaultValue={policy.promises[name]} options={promiseWords} />
          </Field>
          <Field label="Vehicles an hour at night" error={fields[`rules.vehiclesPerH.${name}`]}>
            <TextInput
              name={`vehiclesPerH.${name}`}
              inputMode="numeric"
              className="text-right font-mono"
              defaultValue={policy.vehiclesPerH[name]}
            />
          </Field>
        </li>
      ))}
    </ul>
  );
}
