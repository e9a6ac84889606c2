'use client';

import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Form, type FormSubmission } from '@/components/ui/form';
import { ProblemNotice } from '@/components/ui/notice';
import { Section } from '@/components/ui/section';
import { TextInput } from '@/components/ui/text-input';
import { type ListedPerson } from './people-table';
import { RoleSelect } from './role-select';

export type PersonFormProps = Readonly<{
  person: ListedPerson;
  ownId: number;
  change: FormSubmission;
  password: FormSubmission;
  disable: FormSubmission;
}>;

export function PersonForm({ person, ownId, change, password, disable }: PersonFormProps) {
  const withId = (fields: Record<string, unknown>) => ({ ...fields, id: person.id });
  return (
    <div className="grid gap-8">
      <Form submission={change} toInput={withId} submitLabel="Save" shownFields={['name', 'role']}>
        <Field label="Name" error={change.fields.name}>
          <TextInput name="name" defaultValue={person.name} autoComplete="off" />
        </Field>
        <RoleSelect
          defaultValue={person.role}
          error={change.fields.role}
          hint="A new role signs them out everywhere, at once."
        />
      </Form>
      <Section title="New password">
        <Form
          submission={password}
          toInput={withId}
          submitLabel="Set password"
          shownFields={['password']}
          isPrimary={false}
        >
          <Field
            label="Password"
            hint="At least 10 characters. It ends every session of theirs."
            error={password.fields.password}
          >
            <TextInput name="password" type="password" autoComplete="new-password" />
          </Field>
        </Form>
      </Section>
      <Section title={person.isDisabled ? 'Let them in again' : 'Disable'}>
        <p className="mb-3 text-soft">
          {person.isDisabled
            ? 'They may sign in again with the password they had.'
            : 'They are signed out at once and may not sign in. What they did stays under their name.'}
        </p>
        <ProblemNotice problem={disable.problem} className="mb-3" />
        <Button
          variant={person.isDisabled ? 'outline' : 'danger'}
          isBusy={disable.isSending}
          disabledReason={person.id === ownId ? 'You cannot disable yourself.' : null}
          onClick={() => disable.send({ id: person.id, isDisabled: !person.isDisabled })}
        >
          {person.isDisabled ? `Enable ${person.name}` : `Disable ${person.name}`}
        </Button>
      </Section>
    </div>
  );
}
