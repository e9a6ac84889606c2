'use client';

import { signOut } from 'next-auth/react';
import { useRouter } from 'next/navigation';
import { Preferences, type Theme, type Units } from '@/components/shell/preferences';
import { useAnnounce } from '@/components/ui/announcements';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Figure } from '@/components/ui/figure';
import { Form } from '@/components/ui/form';
import { ProblemNotice } from '@/components/ui/notice';
import { PageBody, PageHeader } from '@/components/ui/page-header';
import { Section } from '@/components/ui/section';
import { TextInput } from '@/components/ui/text-input';
import { useSubmission } from '@/components/ui/use-submission';
import { savePassword, savePreferences } from './actions';

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
  const router = useRouter();
  const announce = useAnnounce();
  const preferences = useSubmission(savePreferences, () => {
    announce('Saved for every device you sign in on.');
    router.refresh();
  });
  return (
    <>
      <PageHeader
        title={name}
        facts={[roleName, email]}
        actions={<Button onClick={() => void signOut({ callbackUrl: '/sign-in' })}>Sign out</Button>}
      />
      <PageBody className="max-w-4xl gap-10 md:grid-cols-2">
        <Section title="How things are shown">
          <ProblemNotice problem={preferences.problem} className="mb-3" />
          <Preferences
            units={units}
            theme={theme}
            onChange={(change) => preferences.send({ unitSystem: change.units, theme: change.theme })}
          />
          <p className="mt-4 text-soft">
            A rate of 24 g/m² reads <Figure value={24} quantity="rate" />, and −6 °C reads{' '}
            <Figure value={-6} quantity="temperature" />.
          </p>
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
