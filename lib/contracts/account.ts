import { z } from 'zod';

/** Shortest password accepted. Length guards better than rules about characters (NIST SP 800-63B, section 3.1.1.2). */
export const shortestPassword = 10;

export const NewPassword = z
  .string('A password is needed.')
  .min(shortestPassword, `A password has at least ${shortestPassword} characters.`)
  .max(200, 'A password has at most 200 characters.');

/** What is not named stays as it is: two changes close together must not undo each other. */
export const PreferencesInput = z.strictObject({
  unitSystem: z.enum(['metric', 'us'], 'Choose metric or US units.').optional(),
  theme: z.enum(['system', 'dark', 'light'], 'Choose system, dark or light.').optional(),
});
export type PreferencesInput = z.output<typeof PreferencesInput>;

export const ChangePasswordInput = z
  .strictObject({
    current: z.string().min(1, 'Type the password you have now.').max(200),
    next: NewPassword,
    repeat: z.string(),
  })
  .refine((input) => input.next === input.repeat, { path: ['repeat'], message: 'This differs from the new password.' })
  .refine((input) => input.next !== input.current, { path: ['next'], message: 'This is the password you have now.' });
export type ChangePasswordInput = z.output<typeof ChangePasswordInput>;
