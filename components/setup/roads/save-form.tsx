'use client';

import { Field } from '@/components/ui/field';
import { Form, type FormSubmission } from '@/components/ui/form';
import { TextInput } from '@/components/ui/text-input';
import { type NetworkImportView } from '@/lib/contracts/network';
import { SavingEffects } from './import-figures';
import { counted } from './words';

export type SaveFormProps = Readonly<{ view: NetworkImportView; submission: FormSubmission }>;

/** The last look before roads are written, and whose data they are. */
export function SaveForm({ view, submission }: SaveFormProps) {
  const { fields } = submission;
  return (
    <Form
      submission={submission}
      toInput={(values) => ({ ...values, id: view.id })}
      submitLabel={`Save ${counted(view.report.segments, 'road')}`}
      busyLabel="Saving"
      shownFields={['source', 'attribution']}
    >
      <SavingEffects view={view} />
      <Field
        label="Source"
        error={fields.source}
        hint="A later file under this name changes these roads in place and takes those it lacks out of use."
      >
        <TextInput name="source" defaultValue={view.source} autoComplete="off" />
      </Field>
      <Field
        label="Whose data"
        error={fields.attribution}
        hint="Shown on every map with these roads, as licences of open data ask."
      >
        <TextInput name="attribution" defaultValue={view.attribution} autoComplete="off" />
      </Field>
    </Form>
  );
}
