'use client';

import { Checkbox } from '@/components/ui/checkbox';
import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { type Delimiter, type Encoding, type Mapping } from '@/lib/readings/mapping';

export type TableFieldsProps = Readonly<{
  mapping: Mapping;
  error: string | undefined;
  onChange: (change: Partial<Mapping>) => void;
}>;

const delimiterWords: Readonly<Record<Delimiter, string>> = {
  ',': 'commas',
  ';': 'semicolons',
  '\t': 'tabs',
  '|': 'bars',
};
const encodingWords: Readonly<Record<Encoding, string>> = {
  'utf-8': 'UTF-8',
  'windows-1252': 'Windows-1252',
  'utf-16le': 'UTF-16',
};
const markWords = { '.': 'point', ',': 'comma' } as const;
const optionsOf = (words: Readonly<Record<string, string>>) =>
  Object.entries(words).map(([value, label]) => ({ value, label }));

/** The make of a file in one line: "Parted by commas, decimal point, UTF-8, heads on line 1". */
export function tableInWords({ delimiter, decimalMark, encoding, hasHeader, skipLines }: Mapping): string {
  const heads = hasHeader ? `heads on line ${skipLines + 1}` : 'no heads';
  return `Parted by ${delimiterWords[delimiter]}, decimal ${markWords[decimalMark]}, ${encodingWords[encoding]}, ${heads}`;
}

/** What the table in the file is made of. */
export function TableFields({ mapping, error, onChange }: TableFieldsProps) {
  return (
    <div className="grid gap-4 pt-3 sm:grid-cols-2 lg:grid-cols-4">
      <Field label="Columns are parted by" error={error}>
        <Select
          value={mapping.delimiter}
          options={optionsOf(delimiterWords)}
          onChange={(event) => onChange({ delimiter: event.target.value as Delimiter })}
        />
      </Field>
      <Field label="Decimal mark">
        <Select
          value={mapping.decimalMark}
          options={optionsOf(markWords)}
          onChange={(event) => onChange({ decimalMark: event.target.value === ',' ? ',' : '.' })}
        />
      </Field>
      <Field label="Quotation mark">
        <Select
          value={mapping.quote}
          options={optionsOf({ '"': 'double (")', "'": "single (')" })}
          onChange={(event) => onChange({ quote: event.target.value === "'" ? "'" : '"' })}
        />
      </Field>
      <Field label="Encoding">
        <Select
          value={mapping.encoding}
          options={optionsOf(encodingWords)}
          onChange={(event) => onChange({ encoding: event.target.value as Encoding })}
        />
      </Field>
      <Field label="Lines before the table">
        <TextInput
          inputMode="numeric"
          className="text-right font-mono"
          value={mapping.skipLines}
          onChange={(event) => onChange({ skipLines: Math.min(100, Number(event.target.value.replace(/\D/g, ''))) })}
        />
      </Field>
      <Field
        label="Also means missing"
        hint="Parted by commas; an empty cell always does."
        className="sm:col-span-2 lg:col-span-3"
      >
        <TextInput
          className="font-mono"
          defaultValue={mapping.missing.join(', ')}
          onChange={(event) => onChange({ missing: codesIn(event.target.value) })}
        />
      </Field>
      <Checkbox
        label="The first line of the table names the columns"
        checked={mapping.hasHeader}
        onChange={(event) => onChange({ hasHeader: event.target.checked })}
        className="sm:col-span-2"
      />
    </div>
  );
}

/** Codes as they are typed, parted by commas. */
export function codesIn(text: string): string[] {
  return text
    .split(',')
    .map((code) => code.trim().slice(0, 40))
    .filter(Boolean)
    .slice(0, 50);
}
