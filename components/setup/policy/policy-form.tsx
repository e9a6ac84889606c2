'use client';

import { Field } from '@/components/ui/field';
import { Form, type FormSubmission } from '@/components/ui/form';
import { NumberInput } from '@/components/ui/number-input';
import { Section } from '@/components/ui/section';
import { TextInput } from '@/components/ui/text-input';
import { serviceClasses, type PolicyRules } from '@/lib/contracts/policy';
import { ClassFields } from './class-fields';
import { policyInput } from './policy-input';

export type PolicyFormProps = Readonly<{
  rules: PolicyRules | null;
  basedOnVersion: number;
  submission: FormSubmission;
}>;

const solids = [
  { form: 'prewet', label: 'Pre-wetted solid' },
  { form: 'solid', label: 'Dry solid' },
  { form: 'abrasive', label: 'Abrasive' },
] as const;

const shownFields = [
  'rules.marginMin',
  'rules.maxLiquidRateMlPerM2',
  ...solids.map(({ form }) => `rules.maxRateGPerM2.${form}`),
  ...serviceClasses.flatMap((name) => [`rules.classes.${name}.promise`, `rules.classes.${name}.cycleMin`]),
];

export function PolicyForm({ rules, basedOnVersion, submission }: PolicyFormProps) {
  const { fields } = submission;
  return (
    <Form
      submission={submission}
      toInput={(typed) => policyInput(typed, basedOnVersion)}
      submitLabel={`Adopt as version ${basedOnVersion + 1}`}
      busyLabel="Adopting"
      shownFields={shownFields}
      className="gap-8"
    >
      <Section title="What each class is promised">
        <ClassFields rules={rules} fields={fields} />
      </Section>
      <Section title="The most in one pass">
        <p className="mb-3 max-w-prose text-soft">
          A rate above these is never cut: the plan names another material, a shorter cycle or abrasives instead.
        </p>
        <div className="grid max-w-xl gap-x-8 gap-y-4 sm:grid-cols-2">
          {solids.map(({ form, label }) => (
            <Field key={form} label={label} error={fields[`rules.maxRateGPerM2.${form}`]}>
              <NumberInput name={form} quantity="rate" digits={1} defaultValue={rules?.maxRateGPerM2[form]} />
            </Field>
          ))}
          <Field label="Liquid" error={fields['rules.maxLiquidRateMlPerM2']}>
            <NumberInput name="liquid" quantity="liquidRate" digits={1} defaultValue={rules?.maxLiquidRateMlPerM2} />
          </Field>
        </div>
      </Section>
      <Section title="Margin">
        <Field
          label="Minutes a road must still hold after the next pass is due"
          error={fields['rules.marginMin']}
          className="max-w-xl"
        >
          <TextInput
            name="marginMin"
            inputMode="numeric"
            className="max-w-24 text-right font-mono"
            defaultValue={rules?.marginMin ?? 15}
          />
        </Field>
      </Section>
    </Form>
  );
}
