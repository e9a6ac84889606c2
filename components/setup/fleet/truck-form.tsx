'use client';

import { Checkbox } from '@/components/ui/checkbox';
import { Field } from '@/components/ui/field';
import { Form, type FormSubmission } from '@/components/ui/form';
import { NumberInput } from '@/components/ui/number-input';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { type ListedTruck, type ListedYard } from './listed-fleet';

export type TruckFormProps = Readonly<{
  truck: ListedTruck | null;
  yards: readonly ListedYard[];
  submission: FormSubmission;
}>;

export function TruckForm({ truck, yards, submission }: TruckFormProps) {
  const { fields } = submission;
  const choices = yards.filter((yard) => yard.isActive || yard.id === truck?.yardId);
  return (
    <Form
      submission={submission}
      toInput={(typed) => ({ ...typed, id: truck?.id ?? null })}
      submitLabel={truck ? 'Save' : 'Add'}
      shownFields={['number', 'name', 'yardId', 'ploughWidthM']}
    >
      <Field label="Number" hint="What the crew calls it by." error={fields.number}>
        <TextInput
          name="number"
          inputMode="numeric"
          className="max-w-28 text-right font-mono"
          defaultValue={truck?.number ?? ''}
        />
      </Field>
      <Field label="Make or name" error={fields.name}>
        <TextInput name="name" defaultValue={truck?.name ?? ''} autoComplete="off" />
      </Field>
      <Field label="Yard" error={fields.yardId}>
        <Select
          name="yardId"
          defaultValue={String(truck?.yardId ?? choices[0]?.id ?? '')}
          options={choices.map((yard) => ({ value: String(yard.id), label: yard.name }))}
        />
      </Field>
      <Field label="Plough width" hint="Nothing typed means it has no plough." error={fields.ploughWidthM}>
        <NumberInput
          name="ploughWidthM"
          quantity="shortDistance"
          defaultValue={truck?.ploughWidthM}
          digits={2}
          className="max-w-40"
        />
      </Field>
      <Checkbox name="isActive" label="In use" defaultChecked={truck?.isActive ?? true} />
    </Form>
  );
}
