'use client';

import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/select';
import { roleNames, roles, type Role } from '@/lib/permissions';

/** What each role is for, in the words of the job. */
const roleWords: Readonly<Record<Role, string>> = {
  dispatcher: 'runs the night: storms, treatments, routes',
  driver: 'own runs only, on the tablet',
  supervisor: 'everything operational, approvals, policy',
  yard: 'stock, brine, loads, calibrations',
  administrator: 'set-up; every change audited',
  observer: 'reads everything, changes nothing',
};

export type RoleSelectProps = Readonly<{ defaultValue: Role; error: string | undefined; hint?: string }>;

export function RoleSelect({ defaultValue, error, hint }: RoleSelectProps) {
  return (
    <Field label="Role" error={error} hint={hint}>
      <Select
        name="role"
        defaultValue={defaultValue}
        options={roles.map((role) => ({ value: role, label: `${roleNames[role]}: ${roleWords[role]}` }))}
      />
    </Field>
  );
}
