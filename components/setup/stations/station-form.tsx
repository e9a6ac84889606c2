'use client';

import { PlaceFields } from '@/components/setup/place-fields';
import { Checkbox } from '@/components/ui/checkbox';
import { Field } from '@/components/ui/field';
import { Form, type FormSubmission } from '@/components/ui/form';
import { NumberInput } from '@/components/ui/number-input';
import { TextInput } from '@/components/ui/text-input';
import { type ListedStation } from './listed-station';
import { ZoneNames } from './zone-names';

export type StationFormProps = Readonly<{
  station: ListedStation | null;
  /** the agency's, for a new one */
  zone: string;
  submission: FormSubmission;
}>;

const shownFields = ['name', 'latitudeDeg', 'longitudeDeg', 'heightM', 'zone'];

export function StationForm({ station, zone, submission }: StationFormProps) {
  const { fields } = submission;
  return (
    <Form
      submission={submission}
      toInput={(typed) => ({ ...typed, id: station?.id ?? null })}
      submitLabel={station ? 'Save' : 'Add'}
      shownFields={shownFields}
    >
      <Field label="Name" error={fields.name}>
        <TextInput name="name" defaultValue={station?.name ?? ''} autoComplete="off" />
      </Field>
      <div className="grid grid-cols-2 gap-5">
        <PlaceFields place={station} fields={fields} />
      </div>
      <Field label="Height above the sea" error={fields.heightM}>
        <NumberInput name="heightM" quantity="shortDistance" defaultValue={station?.heightM ?? 0} digits={0} />
      </Field>
      <Field label="Time zone of its files, unless a file says otherwise" error={fields.zone}>
        <TextInput name="zone" list="zone-names" defaultValue={station?.zone ?? zone} autoComplete="off" />
      </Field>
      <ZoneNames id="zone-names" />
      <Checkbox name="isActive" label="In use" defaultChecked={station?.isActive ?? true} />
    </Form>
  );
}
