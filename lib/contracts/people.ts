import { z } from 'zod';
import { roles } from '@/lib/permissions';
import { NewPassword } from './account';
import { filledName, typedId } from './form-values';

const Role = z.enum(roles, 'Choose a role.');

export const AddPersonInput = z.strictObject({
  name: filledName('A person'),
  email: z
    .string('An e-mail address is needed.')
    .trim()
    .toLowerCase()
    .max(200)
    .pipe(z.email('This is not an e-mail address.')),
  role: Role,
  password: NewPassword,
});
export type AddPersonInput = z.output<typeof AddPersonInput>;

export const ChangePersonInput = z.strictObject({
  id: typedId,
  name: filledName('A person'),
  role: Role,
});
export type ChangePersonInput = z.output<typeof ChangePersonInput>;

export const SetPersonPasswordInput = z.strictObject({ id: typedId, password: NewPassword });
export type SetPersonPasswordInput = z.output<typeof SetPersonPasswordInput>;

export const DisablePersonInput = z.strictObject({ id: typedId, isDisabled: z.boolean() });
export type DisablePersonInput = z.output<typeof DisablePersonInput>;
