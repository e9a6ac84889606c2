'use client';

import { type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { assumedAttributes } from '@/lib/geo/network';
import { serviceClasses } from '@/lib/geo/assumed';
import { attributeWords } from './words';

export interface RoadFilterValues {
  find: string;
  serviceClass: string;
  assumed: string;
}

export type RoadFilterProps = Readonly<{ values: RoadFilterValues; onChange: (values: RoadFilterValues) => void }>;

export function RoadFilter({ values, onChange }: RoadFilterProps) {
  const send = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const find = new FormData(event.currentTarget).get('find');
    onChange({ ...values, find: typeof find === 'string' ? find : '' });
  };
  return (
    <form onSubmit={send} className="mb-4 flex flex-wrap items-end gap-3 print:hidden">
      <Field label="Name" className="w-56 max-w-full">
        <TextInput name="find" type="search" defaultValue={values.find} />
      </Field>
      <Field label="Service class" className="w-36">
        <Select
          value={values.serviceClass}
          onChange={(event) => onChange({ ...values, serviceClass: event.target.value })}
          options={[
            { value: '', label: 'Any' },
            ...serviceClasses.map((value) => ({ value, label: `Class ${value}` })),
          ]}
        />
      </Field>
      <Field label="Assumed" className="w-40">
        <Select
          value={values.assumed}
          onChange={(event) => onChange({ ...values, assumed: event.target.value })}
          options={[
            { value: '', label: 'Any' },
            ...assumedAttributes.map((value) => ({ value, label: attributeWords[value] })),
          ]}
        />
      </Field>
      <Button type="submit">Find</Button>
    </form>
  );
}
