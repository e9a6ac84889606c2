'use client';

import { signOut } from 'next-auth/react';
import { Preferences, type Theme, type Units } from '@/components/shell/preferences';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Figure } from '@/components/ui/figure';
import { Form } from '@/components/ui/form';
import { PageBody, PageHeader } from '@/components/ui/page-header';
import { Section } from '@/components/ui/section';
import { TextInput } from '@/components/ui/text-input';
import { useSubmission } from '@/components/ui/use-submission';
import { usePreferences } from '../use-preferences';
import { savePassword } from './actions';

export type AccountScreenProps = Readonly<{
  name: string;
  email: string;
  roleName: string;
  units: Units;
  theme: Theme;
}>;

function PasswordForm() {
  const submission = useSubmission(savePassword, () => void signOut({ callbackUrl: '/sign-in?changed=password' }));
  const { fields } = submission;
  return (
    <Form
      submission={submission}
      submitLabel="Change password"
      busyLabel="Changing"
      shownFields={['current', 'next', 'repeat']}
      isPrimary={false}
      className="max-w-sm"
    >
      <Field label="Password now" error={fields.current}>
        <TextInput name="current" type="password" autoComplete="current-password" />
      </Field>
      <Field label="New password" hint="At least 10 characters; a few words in a row are good." error={fields.next}>
        <TextInput name="next" type="password" autoComplete="new-password" />
      </Field>
      <Field label="New password again" error={fields.repeat}>
        <TextInput name="repeat" type="password" autoComplete="new-password" />
      </Field>
    </Form>
  );
}

export function AccountScreen({ name, email, roleName, units, theme }: AccountScreenProps) {
  const preferences = usePreferences({ units, theme });
  return (
    <>
      <PageHeader
        title={name}
        facts={[roleName, email]}
        actions={<Button onClick={() => void signOut({ callbackUrl: '/sign-in' })}>Sign out</Button>}
      />
      <PageBody className="max-w-4xl gap-10 md:grid-cols-2">
        <Section title="How things are shown">
          <Preferences {...preferences} />
          <dl className="mt-4 grid max-w-72 grid-cols-[1fr_auto] gap-x-6 gap-y-1 text-soft">
            <dt>A rate reads</dt>
            <dd className="text-right text-ink">
              <Figure value={24} quantity="rate" digits={0} />
            </dd>
            <dt>A pavement temperature</dt>
            <dd className="text-right text-ink">
              <Figure value={-6.2} quantity="temperature" />
            </dd>
            <dt>A load of salt</dt>
            <dd className="text-right text-ink">
              <Figure value={7500} quantity="largeMass" />
            </dd>
          </dl>
        </Section>
        <Section title="Password">
          <p className="mb-4 max-w-prose text-soft">
            Changing it signs you out everywhere, here too; then sign in with the new one.
          </p>
          <PasswordForm />
        </Section>
      </PageBody>
    </>
  );
}
