import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import Papa from 'papaparse';

const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..');

/** The reference collection beside the checkout; not part of the repository, so it may be absent. */
export const referencePath = path.resolve(root, '../shared/reference');
export const hasReference = existsSync(referencePath);
/** For a test's title when it is skipped. */
export const whySkipped = hasReference ? '' : ' (skipped: the reference collection is not beside this checkout)';

/** Rows of a CSV of the reference collection, by column name. */
export function readReference(file: string): readonly Readonly<Record<string, string>>[] {
  const text = readFileSync(path.join(referencePath, file), 'utf8');
  const { data, errors } = Papa.parse<Record<string, string>>(text, { header: true, skipEmptyLines: true });
  if (errors.length > 0) throw new Error(`${file}: ${errors[0]?.message ?? 'unreadable'}`);
  return data;
}

/** A column as a number; an error for what is none, so that a renamed column cannot pass as NaN. */
export function numberIn(row: Readonly<Record<string, string>>, column: string): number {
  const text = row[column];
  const value = text === undefined || text.trim() === '' ? Number.NaN : Number(text);
  if (Number.isNaN(value)) throw new Error(`Column ${column} holds no number: ${text ?? 'absent'}`);
  return value;
}
