'use client';

import { Field } from '@/components/ui/field';
import { TextInput } from '@/components/ui/text-input';
import { type ProblemFields } from '@/lib/problem';

export type PlaceFieldsProps = Readonly<{
  place: { latitudeDeg: number; longitudeDeg: number } | null | undefined;
  fields: ProblemFields;
}>;

/** Where something stands, WGS 84, typed by hand. */
export function PlaceFields({ place, fields }: PlaceFieldsProps) {
  const look = { inputMode: 'decimal', className: 'text-right font-mono' } as const;
  return (
    <>
      <Field label="Latitude, degrees north" error={fields.latitudeDeg}>
        <TextInput name="latitudeDeg" {...look} defaultValue={place?.latitudeDeg ?? ''} />
      </Field>
      <Field label="Longitude, degrees east" error={fields.longitudeDeg}>
        <TextInput name="longitudeDeg" {...look} defaultValue={place?.longitudeDeg ?? ''} />
      </Field>
    </>
  );
}
