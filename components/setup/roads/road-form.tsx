'use client';

import { Checkbox } from '@/components/ui/checkbox';
import { Field } from '@/components/ui/field';
import { Form, type FormSubmission } from '@/components/ui/form';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { type Exposure, exposures } from '@/lib/contracts/network';
import { type RoadSurface, roadSurfaces, type ServiceClass, serviceClasses } from '@/lib/geo/assumed';
import { segmentLimits } from '@/lib/geo/limits';
import { attributeWords, isAssumedAttribute } from './words';

export interface ListedRoad {
  id: number;
  name: string;
  roadClass: string;
  serviceClass: ServiceClass;
  lanes: number;
  surface: RoadSurface;
  exposure: Exposure;
  isOneWay: boolean;
  isBridge: boolean;
  isSensitive: boolean;
  lengthM: number;
  assumed: readonly string[];
  edited: readonly string[];
  source: string | null;
  updatedAt: string;
}

const surfaceWords: Readonly<Record<RoadSurface, string>> = {
  asphalt: 'Asphalt',
  concrete: 'Concrete',
  'open-graded': 'Open-graded asphalt',
  gravel: 'Gravel',
  paving: 'Paving stones',
};
const exposureWords: Readonly<Record<Exposure, string>> = {
  open: 'Open',
  sheltered: 'Sheltered by houses or trees',
  shaded: 'Shaded most of the day',
  ridge: 'Ridge, wind and clear sky',
  shore: 'Shore, mild and damp',
};

export type RoadFormProps = Readonly<{ road: ListedRoad; submission: FormSubmission }>;

/** One road by hand. What is changed here outlives a repeated import of its file. */
export function RoadForm({ road, submission }: RoadFormProps) {
  const { fields } = submission;
  const hint = (attribute: string) => (road.assumed.includes(attribute) ? 'Assumed so far.' : undefined);
  const edited = road.edited.map((name) => (isAssumedAttribute(name) ? attributeWords[name] : 'service class'));
  return (
    <Form
      submission={submission}
      toInput={(values) => ({ ...values, id: road.id, updatedAt: road.updatedAt })}
      submitLabel="Save"
      shownFields={['name', 'serviceClass', 'lanes', 'surface', 'exposure', 'isSensitive']}
    >
      <Field label="Name" error={fields.name} hint={hint('name')}>
        <TextInput name="name" defaultValue={road.name} autoComplete="off" />
      </Field>
      <Field label="Service class" error={fields.serviceClass}>
        <Select
          name="serviceClass"
          defaultValue={road.serviceClass}
          options={serviceClasses.map((value) => ({ value, label: `Class ${value}` }))}
        />
      </Field>
      <Field label="Lanes, both directions together" error={fields.lanes} hint={hint('lanes')}>
        <TextInput
          name="lanes"
          type="number"
          inputMode="numeric"
          min={segmentLimits.lanes.min}
          max={segmentLimits.lanes.max}
          defaultValue={road.lanes}
        />
      </Field>
      <Field label="Surface" error={fields.surface} hint={hint('surface')}>
        <Select
          name="surface"
          defaultValue={road.surface}
          options={roadSurfaces.map((value) => ({ value, label: surfaceWords[value] }))}
        />
      </Field>
      <Field label="Exposure" error={fields.exposure} hint={hint('exposure')}>
        <Select
          name="exposure"
          defaultValue={road.exposure}
          options={exposures.map((value) => ({ value, label: exposureWords[value] }))}
        />
      </Field>
      <Checkbox
        name="isSensitive"
        defaultChecked={road.isSensitive}
        label="Sensitive ground beside it"
        hint="Its chloride is counted apart in the ledger."
      />
      {edited.length > 0 ? <p className="text-sm text-soft">Set by hand before: {edited.join(', ')}.</p> : null}
    </Form>
  );
}
