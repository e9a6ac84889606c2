'use client';

import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { Segmented } from '@/components/ui/segmented';
import { Select } from '@/components/ui/select';
import { saltName, salts, type Salt } from '@/lib/brine/salts';
import { type BenchQuery } from '@/lib/contracts/bench';

export type ReadingFormProps = Readonly<{
  bench: BenchQuery;
  onChange: (change: Partial<BenchQuery>) => void;
}>;

const ways = [
  { value: 'strength', label: 'Strength' },
  { value: 'reading', label: 'Hydrometer' },
] as const;

const asSalt = (value: string): Salt => salts.find((salt) => salt === value) ?? 'NaCl';

/** Which brine, and what is known of it. */
export function ReadingForm({ bench, onChange }: ReadingFormProps) {
  return (
    <div className="grid gap-4">
      <Field label="Brine">
        <Select
          value={bench.salt}
          options={salts.map((salt) => ({ value: salt, label: saltName[salt] }))}
          onChange={(event) => onChange({ salt: asSalt(event.target.value) })}
        />
      </Field>
      <Segmented label="What is known" options={ways} value={bench.by} onChange={(by) => onChange({ by })} />
      {bench.by === 'strength' ? (
        <Field label="Strength" hint="Salt without its water, by mass of the brine">
          <NumberInput
            quantity="percent"
            digits={2}
            defaultValue={bench.strength}
            onValue={(strength) => strength !== null && onChange({ strength })}
          />
        </Field>
      ) : (
        <>
          <Field label="Specific gravity" hint="Hydrometer marked 60/60 °F, as read">
            <NumberInput
              quantity="specificGravity"
              defaultValue={bench.sg}
              onValue={(sg) => sg !== null && onChange({ sg })}
            />
          </Field>
          <Field label="Brine temperature" hint="When it was read; the correction is made here">
            <NumberInput
              quantity="temperature"
              defaultValue={bench.brineC}
              onValue={(brineC) => brineC !== null && onChange({ brineC })}
            />
          </Field>
        </>
      )}
    </div>
  );
}
