import { z } from 'zod';

/** A number that a form sends as text; nothing typed is "missing", not 0. */
export const typedNumber = (schema: z.ZodNumber) =>
  z.preprocess((value) => {
    if (typeof value !== 'string') return value;
    const text = value.trim();
    return text === '' ? undefined : Number(text);
  }, schema);

/** The same where nothing typed means "none". */
export const typedNumberOrNone = (schema: z.ZodNumber) =>
  z.preprocess((value) => {
    if (typeof value !== 'string') return value ?? null;
    const text = value.trim();
    return text === '' ? null : Number(text);
  }, schema.nullable());

/** A checkbox: `on` when ticked, absent when not. */
export const typedBoolean = z.preprocess(
  (value) => (value === 'on' || value === 'true' ? true : value === undefined || value === 'false' ? false : value),
  z.boolean(),
);

export const typedId = typedNumber(z.number('Choose one of the list.').int().positive());
export const typedIdOrNone = typedNumberOrNone(z.number('Choose one of the list.').int().positive());

export const filledName = (what: string) =>
  z.string(`${what} needs a name.`).trim().min(1, `${what} needs a name.`).max(80, 'A name has at most 80 characters.');
