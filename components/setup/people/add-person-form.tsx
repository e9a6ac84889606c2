'use client';

import { Field } from '@/components/ui/field';
import { Form, type FormSubmission } from '@/components/ui/form';
import { TextInput } from '@/components/ui/text-input';
import { RoleSelect } from './role-select';

export type AddPersonFormProps = Readonly<{ submission: FormSubmission }>;

export function AddPersonForm({ submission }: AddPersonFormProps) {
  const { fields } = submission;
  return (
    <Form
      submission={submission}
      submitLabel="Add"
      busyLabel="Adding"
      shownFields={['name', 'email', 'role', 'password']}
    >
      <Field label="Name" error={fields.name}>
        <TextInput name="name" autoComplete="off" />
      </Field>
      <Field label="E-mail address" error={fields.email}>
        <TextInput name="email" type="email" autoComplete="off" />
      </Field>
      <RoleSelect defaultValue="driver" error={fields.role} />
      <Field
        label="First password"
        hint="At least 10 characters. They can change it in their account."
        error={fields.password}
      >
        <TextInput name="password" type="password" autoComplete="new-password" />
      </Field>
    </Form>
  );
}
