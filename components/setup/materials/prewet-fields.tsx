'use client';

import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { Select } from '@/components/ui/select';
import { type ProblemFields } from '@/lib/problem';
import { type ListedMaterial } from './listed-material';

export type PrewetFieldsProps = Readonly<{
  material: ListedMaterial | null;
  materials: readonly ListedMaterial[];
  fields: ProblemFields;
}>;

const options = (materials: readonly ListedMaterial[], form: 'solid' | 'liquid') =>
  materials.filter((material) => material.form === form).map(({ id, name }) => ({ value: String(id), label: name }));

/** A pre-wetted solid names its two parts; what it is made of and costs follows from them. */
export function PrewetFields({ material, materials, fields }: PrewetFieldsProps) {
  return (
    <>
      <Field label="Solid" error={fields.solidMaterialId}>
        <Select
          name="solidMaterialId"
          options={options(materials, 'solid')}
          defaultValue={String(material?.solidMaterialId ?? '')}
        />
      </Field>
      <Field label="Liquid" error={fields.liquidMaterialId}>
        <Select
          name="liquidMaterialId"
          options={options(materials, 'liquid')}
          defaultValue={String(material?.liquidMaterialId ?? '')}
        />
      </Field>
      <Field
        label="Share of liquid, by mass"
        hint="Composition, water, density and cost follow from the two parts."
        error={fields.liquidMassFraction}
      >
        <NumberInput
          name="liquidMassFraction"
          quantity="percent"
          defaultValue={material?.liquidMassFraction ?? 0.3}
          className="max-w-40"
        />
      </Field>
    </>
  );
}
