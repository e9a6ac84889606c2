'use client';

import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { Select } from '@/components/ui/select';
import { serviceClasses, type PolicyRules, type ServicePromise } from '@/lib/contracts/policy';
import { type ProblemFields } from '@/lib/problem';

const promiseWords: readonly { value: ServicePromise; label: string }[] = [
  { value: 'bare', label: 'bare: no ice, snow kept loose' },
  { value: 'passable', label: 'passable: a little ice between the tracks' },
  { value: 'low', label: 'low: half the ice, half the looseness' },
];

export type ClassFieldsProps = Readonly<{ rules: PolicyRules | null; fields: ProblemFields }>;

/** What each class of road is promised: one line a class. */
export function ClassFields({ rules, fields }: ClassFieldsProps) {
  return (
    <ul className="border-t">
      {serviceClasses.map((name) => (
        <li
          key={name}
          className="grid items-start gap-x-6 gap-y-2 border-b py-3 sm:grid-cols-[4.5rem_minmax(0,1fr)_10rem]"
        >
          <p className="font-semibold sm:pt-7">Class {name}</p>
          <Field label="Promise" error={fields[`rules.classes.${name}.promise`]}>
            <Select
              name={`promise.${name}`}
              defaultValue={rules?.classes[name].promise ?? 'passable'}
              options={promiseWords}
            />
          </Field>
          <Field label="Truck back within" error={fields[`rules.classes.${name}.cycleMin`]}>
            <NumberInput
              name={`cycle.${name}`}
              quantity="durationHours"
              defaultValue={rules ? rules.classes[name].cycleMin / 60 : null}
            />
          </Field>
        </li>
      ))}
    </ul>
  );
}
