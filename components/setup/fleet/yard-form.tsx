'use client';

import { PlaceFields } from '@/components/setup/place-fields';
import { Checkbox } from '@/components/ui/checkbox';
import { Field } from '@/components/ui/field';
import { Form, type FormSubmission } from '@/components/ui/form';
import { NumberInput } from '@/components/ui/number-input';
import { TextInput } from '@/components/ui/text-input';
import { type ListedYard } from './listed-fleet';

export type YardFormProps = Readonly<{ yard: ListedYard | null; submission: FormSubmission }>;

const shownFields = ['name', 'solidCapacityKg', 'brineCapacityL', 'latitudeDeg', 'longitudeDeg'];

export function YardForm({ yard, submission }: YardFormProps) {
  const { fields } = submission;
  return (
    <Form
      submission={submission}
      toInput={(typed) => ({ ...typed, id: yard?.id ?? null })}
      submitLabel={yard ? 'Save' : 'Add'}
      shownFields={shownFields}
    >
      <Field label="Name" error={fields.name}>
        <TextInput name="name" defaultValue={yard?.name ?? ''} autoComplete="off" />
      </Field>
      <div className="grid grid-cols-2 gap-5">
        <Field label="Holds salt" error={fields.solidCapacityKg}>
          <NumberInput name="solidCapacityKg" quantity="largeMass" defaultValue={yard?.solidCapacityKg} />
        </Field>
        <Field label="Holds brine" error={fields.brineCapacityL}>
          <NumberInput name="brineCapacityL" quantity="volume" defaultValue={yard?.brineCapacityL} digits={0} />
        </Field>
        <PlaceFields place={yard} fields={fields} />
      </div>
      <Checkbox name="isActive" label="In use" defaultChecked={yard?.isActive ?? true} />
    </Form>
  );
}
