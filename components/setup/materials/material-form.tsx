'use client';

import { useState } from 'react';
import { Checkbox } from '@/components/ui/checkbox';
import { Field } from '@/components/ui/field';
import { Form, type FormSubmission } from '@/components/ui/form';
import { NumberInput } from '@/components/ui/number-input';
import { Segmented } from '@/components/ui/segmented';
import { TextInput } from '@/components/ui/text-input';
import { useUnits } from '@/components/ui/units';
import { type ListedMaterial, type MaterialForm as MaterialKind } from './listed-material';
import { materialInput } from './material-input';
import { PrewetFields } from './prewet-fields';
import { SingleFields } from './single-fields';

export type MaterialFormProps = Readonly<{
  material: ListedMaterial | null;
  materials: readonly ListedMaterial[];
  currency: string;
  submission: FormSubmission;
}>;

const forms: readonly { value: MaterialKind; label: string }[] = [
  { value: 'solid', label: 'Solid' },
  { value: 'prewet', label: 'Pre-wetted' },
  { value: 'liquid', label: 'Liquid' },
  { value: 'abrasive', label: 'Abrasive' },
];

const shownFields = [
  'name',
  'composition',
  ...['NaCl', 'CaCl2', 'MgCl2', 'KCl'].map((salt) => `composition.${salt}`),
  'waterMassFraction',
  'densityKgPerM3',
  'costCentsPerTonne',
  'practicalMinimumC',
  'solidMaterialId',
  'liquidMaterialId',
  'liquidMassFraction',
];

export function MaterialForm({ material, materials, currency, submission }: MaterialFormProps) {
  const system = useUnits();
  const [form, setForm] = useState<MaterialKind>(material?.form ?? 'solid');
  const { fields } = submission;
  return (
    <Form
      submission={submission}
      toInput={(typed) => materialInput({ typed, form, id: material?.id ?? null, system })}
      submitLabel={material ? 'Save' : 'Add'}
      shownFields={shownFields}
    >
      <Field label="Name" error={fields.name}>
        <TextInput name="name" defaultValue={material?.name ?? ''} autoComplete="off" />
      </Field>
      {material ? null : <Segmented label="Form" options={forms} value={form} onChange={setForm} />}
      {form === 'prewet' ? (
        <PrewetFields material={material} materials={materials} fields={fields} />
      ) : (
        <SingleFields key={form} material={material} currency={currency} fields={fields} />
      )}
      <Field
        label="Works down to, pavement temperature"
        hint="Below it, treatments leave this material out and say so. Nothing typed means no limit of its own."
        error={fields.practicalMinimumC}
      >
        <NumberInput
          name="practicalMinimumC"
          quantity="temperature"
          defaultValue={material?.practicalMinimumC}
          className="max-w-40"
        />
      </Field>
      <Checkbox
        name="isActive"
        label="In use"
        hint="Out of use, it stays in old plans and the ledger but is not offered any more."
        defaultChecked={material?.isActive ?? true}
      />
    </Form>
  );
}
