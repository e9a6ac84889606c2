'use client';

import { Field } from '@/components/ui/field';
import { Form, type FormSubmission } from '@/components/ui/form';
import { NumberInput } from '@/components/ui/number-input';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { type ListedSpreader, type ListedTruck } from './listed-fleet';

export type SpreaderFormProps = Readonly<{
  spreader: ListedSpreader | null;
  /** the truck a new one is for */
  truckId: number | null;
  trucks: readonly ListedTruck[];
  submission: FormSubmission;
}>;

const shownFields = [
  'truckId',
  'name',
  'hopperKg',
  'tankL',
  'minRateGPerM2',
  'maxRateGPerM2',
  'maxLiquidRateMlPerM2',
  'calibratedOn',
];

export function SpreaderForm({ spreader, truckId, trucks, submission }: SpreaderFormProps) {
  const { fields } = submission;
  return (
    <Form
      submission={submission}
      toInput={(typed) => ({ ...typed, id: spreader?.id ?? null })}
      submitLabel={spreader ? 'Save' : 'Add'}
      shownFields={shownFields}
    >
      <Field label="On truck" error={fields.truckId}>
        <Select
          name="truckId"
          defaultValue={String(spreader?.truckId ?? truckId ?? '')}
          options={trucks.map((truck) => ({ value: String(truck.id), label: `Truck ${truck.number}, ${truck.name}` }))}
        />
      </Field>
      <Field label="Make or name" error={fields.name}>
        <TextInput name="name" defaultValue={spreader?.name ?? ''} autoComplete="off" />
      </Field>
      <div className="grid grid-cols-2 gap-5">
        <Field label="Hopper" error={fields.hopperKg}>
          <NumberInput name="hopperKg" quantity="largeMass" defaultValue={spreader?.hopperKg} />
        </Field>
        <Field label="Liquid tank" error={fields.tankL}>
          <NumberInput name="tankL" quantity="volume" defaultValue={spreader?.tankL} digits={0} />
        </Field>
        <Field label="Lowest rate" error={fields.minRateGPerM2}>
          <NumberInput name="minRateGPerM2" quantity="rate" defaultValue={spreader?.minRateGPerM2} digits={1} />
        </Field>
        <Field label="Highest rate" error={fields.maxRateGPerM2}>
          <NumberInput name="maxRateGPerM2" quantity="rate" defaultValue={spreader?.maxRateGPerM2} digits={1} />
        </Field>
      </div>
      <Field
        label="Highest liquid rate"
        hint="Nothing typed means it cannot spray."
        error={fields.maxLiquidRateMlPerM2}
      >
        <NumberInput
          name="maxLiquidRateMlPerM2"
          quantity="liquidRate"
          defaultValue={spreader?.maxLiquidRateMlPerM2}
          digits={1}
          className="max-w-52"
        />
      </Field>
      <Field label="Calibrated on" error={fields.calibratedOn}>
        <TextInput name="calibratedOn" type="date" className="max-w-52" defaultValue={spreader?.calibratedOn ?? ''} />
      </Field>
    </Form>
  );
}
