'use client';

import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { TextInput } from '@/components/ui/text-input';
import { useUnits } from '@/components/ui/units';
import { salts } from '@/lib/brine/salts';
import { type ProblemFields } from '@/lib/problem';
import { pricePerMass, priceMass } from '@/lib/units/money';
import { formula, type ListedMaterial } from './listed-material';

export type SingleFieldsProps = Readonly<{
  material: ListedMaterial | null;
  currency: string;
  fields: ProblemFields;
}>;

/** What a material is that is not mixed from two others. */
export function SingleFields({ material, currency, fields }: SingleFieldsProps) {
  const system = useUnits();
  const compositionError =
    fields.composition ?? Object.entries(fields).find(([name]) => name.startsWith('composition.'))?.[1];
  return (
    <>
      <fieldset className="grid gap-2">
        <legend className="mb-1 text-sm text-soft">Salts in it, anhydrous, by mass</legend>
        <div className="grid grid-cols-2 gap-x-5 gap-y-2">
          {salts.map((salt) => (
            <Field key={salt} label={formula(salt)}>
              <NumberInput name={`salt.${salt}`} quantity="percent" defaultValue={material?.composition[salt]} />
            </Field>
          ))}
        </div>
        {compositionError ? <p className="text-sm font-semibold text-frozen">{compositionError}</p> : null}
      </fieldset>
      <div className="grid grid-cols-2 gap-5">
        <Field label="Water, by mass" error={fields.waterMassFraction}>
          <NumberInput name="waterMassFraction" quantity="percent" defaultValue={material?.waterMassFraction} />
        </Field>
        <Field label="Density as loaded" error={fields.densityKgPerM3}>
          <NumberInput name="densityKgPerM3" quantity="density" defaultValue={material?.densityKgPerM3} />
        </Field>
      </div>
      <Field label={`Cost per ${priceMass[system]}, ${currency}`} error={fields.costCentsPerTonne}>
        <TextInput
          name="price"
          inputMode="decimal"
          className="max-w-40 text-right font-mono"
          defaultValue={material ? pricePerMass(material.costCentsPerTonne, system).toFixed(2) : ''}
        />
      </Field>
    </>
  );
}
