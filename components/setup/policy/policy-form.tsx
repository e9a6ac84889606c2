'use client';

import { Form, type FormSubmission } from '@/components/ui/form';
import { Section } from '@/components/ui/section';
import { serviceClasses, type Policy } from '@/lib/treatment/policy';
import { ClassFields } from './class-fields';
import { JudgementFields, judgementNames } from './judgement-fields';
import { policyInput } from './policy-input';
import { RateFields } from './rate-fields';

export type PolicyFormProps = Readonly<{
  policy: Policy;
  basedOnVersion: number;
  submission: FormSubmission;
}>;

const shownFields = [
  ...judgementNames,
  ...serviceClasses.flatMap((name) => [`rules.promises.${name}`, `rules.vehiclesPerH.${name}`]),
  ...['liquid', 'prewet', 'solid'].flatMap((form) => [
    `rules.maxRateGPerM2.${form}`,
    `rules.minRateGPerM2.${form}`,
    `rules.scatter.${form}`,
  ]),
];

export function PolicyForm({ policy, basedOnVersion, submission }: PolicyFormProps) {
  const { fields } = submission;
  return (
    <Form
      submission={submission}
      toInput={(typed) => policyInput(typed, basedOnVersion)}
      submitLabel={`Adopt as version ${basedOnVersion + 1}`}
      busyLabel="Adopting"
      shownFields={shownFields}
      className="gap-9"
    >
      <Section title="What each class is promised">
        <ClassFields policy={policy} fields={fields} />
      </Section>
      <Section title="Rates in one pass">
        <p className="mb-3 max-w-prose text-soft">
          Of product. A rate above the most is never cut: the plan names another material, a shorter cycle or abrasives
          instead.
        </p>
        <RateFields policy={policy} fields={fields} />
      </Section>
      <Section title="How treatments are judged">
        <JudgementFields policy={policy} fields={fields} />
      </Section>
    </Form>
  );
}
