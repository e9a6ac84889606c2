'use client';

import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { type ProblemFields } from '@/lib/problem';
import { type Policy } from '@/lib/treatment/policy';

const forms = [
  { form: 'liquid', label: 'Liquid' },
  { form: 'prewet', label: 'Pre-wetted' },
  { form: 'solid', label: 'Dry solid' },
] as const;

export type RateFieldsProps = Readonly<{ policy: Policy; fields: ProblemFields }>;

/** Least, most and scatter of each form: one line a form. */
export function RateFields({ policy, fields }: RateFieldsProps) {
  return (
    <ul className="border-t">
      {forms.map(({ form, label }) => (
        <li
          key={form}
          className="grid grid-cols-2 items-start gap-x-6 gap-y-2 border-b py-3 sm:grid-cols-[6rem_repeat(3,minmax(0,1fr))]"
        >
          <p className="col-span-2 font-semibold sm:col-span-1 sm:pt-7">{label}</p>
          <Field label="Least" error={fields[`rules.minRateGPerM2.${form}`]}>
            <NumberInput
              name={`minRateGPerM2.${form}`}
              quantity="rate"
              digits={1}
              defaultValue={policy.minRateGPerM2[form]}
            />
          </Field>
          <Field label="Most" error={fields[`rules.maxRateGPerM2.${form}`]}>
            <NumberInput
              name={`maxRateGPerM2.${form}`}
              quantity="rate"
              digits={1}
              defaultValue={policy.maxRateGPerM2[form]}
            />
          </Field>
          <Field label="Lost to scatter" error={fields[`rules.scatter.${form}`]}>
            <NumberInput name={`scatter.${form}`} quantity="percent" digits={1} defaultValue={policy.scatter[form]} />
          </Field>
        </li>
      ))}
    </ul>
  );
}
