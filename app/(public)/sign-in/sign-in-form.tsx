'use client';

import { signIn } from 'next-auth/react';
import { type FormEvent, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { TextInput } from '@/components/ui/text-input';

export interface DemoSignIn {
  email: string;
  name: string;
  roleName: string;
}

export type SignInFormProps = Readonly<{
  /** where to go on; a path of this site */
  onwards: string;
  waitMin: number;
  demo: Readonly<{ people: readonly DemoSignIn[]; password: string }> | null;
}>;

interface Refusal {
  title: string;
  todo: string;
}

function refusalOf(code: string | null | undefined, waitMin: number): Refusal {
  switch (code) {
    case 'CredentialsSignin':
      return {
        title: 'E-mail address and password do not go together.',
        todo: 'Check both and try again. A disabled account is refused in the same words; an administrator can see which it is.',
      };
    case 'too-many-attempts':
      return {
        title: 'Too many attempts with this address.',
        todo: `Nothing is locked for good: wait ${waitMin} minutes, then try again.`,
      };
    case 'busy':
      return { title: 'The database is busy or just starting.', todo: 'Try again in a moment.' };
    default:
      return {
        title: 'The server could not sign you in just now.',
        todo: 'Try again; if it stays, tell whoever runs this server.',
      };
  }
}

export function SignInForm({ onwards, waitMin, demo }: SignInFormProps) {
  const [refusal, setRefusal] = useState<Refusal | null>(null);
  const [isBusy, setIsBusy] = useState(false);
  const enter = async (email: string, password: string) => {
    setIsBusy(true);
    setRefusal(null);
    try {
      const answer = await signIn('credentials', { email, password, redirect: false });
      if (answer?.ok) {
        // A whole new page: nothing of whoever used this browser before stays in its caches.
        window.location.assign(onwards);
        return;
      }
      setRefusal(refusalOf(answer?.error, waitMin));
    } catch {
      setRefusal({ title: 'The server could not be reached.', todo: 'Check the connection and try again.' });
    }
    setIsBusy(false);
  };
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = new FormData(event.currentTarget);
    void enter(String(form.get('email') ?? ''), String(form.get('password') ?? ''));
  };
  return (
    <div className="grid gap-8">
      <form method="post" onSubmit={submit} className="grid gap-4">
        {refusal ? <Notice tone="problem" title={refusal.title} todo={refusal.todo} /> : null}
        <Field label="E-mail address">
          <TextInput
            name="email"
            type="email"
            autoComplete="username"
            required
            maxLength={200}
            className="min-h-11 text-lg"
          />
        </Field>
        <Field label="Password">
          <TextInput
            name="password"
            type="password"
            autoComplete="current-password"
            required
            maxLength={200}
            className="min-h-11 text-lg"
          />
        </Field>
        <Button
          type="submit"
          variant="primary"
          isBusy={isBusy}
          busyLabel="Signing in"
          className="mt-1 min-h-11 text-lg"
        >
          Sign in
        </Button>
      </form>
      {demo ? (
        <section aria-labelledby="demo-title">
          <h2 id="demo-title" className="text-lg font-bold">
            Look around as
          </h2>
          <p className="mb-2 text-sm text-soft">
            Demo people of an invented island. The password of all of them is{' '}
            <span className="font-mono whitespace-nowrap">{demo.password}</span>.
          </p>
          <ul>
            {demo.people.map((person) => (
              <li key={person.email} className="border-t last:border-b">
                <button
                  type="button"
                  onClick={() => void enter(person.email, demo.password)}
                  className="flex min-h-10 w-full flex-wrap items-baseline gap-x-3 py-1.5 text-left hover:bg-raised"
                >
                  <span className="w-28 font-semibold">{person.roleName}</span>
                  <span className="flex-1 text-soft">{person.name}</span>
                  <span className="hidden text-sm text-faint sm:inline">{person.email}</span>
                </button>
              </li>
            ))}
          </ul>
        </section>
      ) : null}
    </div>
  );
}
