import { type Metadata } from 'next';
import { type Route } from 'next';
import Link from 'next/link';
import { redirect } from 'next/navigation';
import { BrineFigure } from '@/components/shell/brine-figure';
import { Wordmark } from '@/components/shell/mark';
import { Notice } from '@/components/ui/notice';
import { signInLimits } from '@/db/commands/sign-in';
import { findAgency } from '@/db/queries/agency';
import { findDemoSignIns } from '@/db/queries/demo-sign-ins';
import { roleNames, type Role } from '@/lib/permissions';
import { getActor } from '@/lib/server/session';
import { SignInForm } from './sign-in-form';

export const metadata: Metadata = { title: 'Sign in' };

type Search = Promise<{ callbackUrl?: string | string[]; changed?: string | string[] }>;

/** Only the path of the asked address: nobody is sent to another site after signing in. */
function onwardsFrom(asked: string | string[] | undefined): string {
  if (typeof asked !== 'string') return '/';
  const path = asked.replace(/^https?:\/\/[^/]+/, '');
  return /^\/(?![/\\])/.test(path) && !path.startsWith('/sign-in') ? path : '/';
}

const withRoleName = ({ name, email, role }: { name: string; email: string; role: Role }) => ({
  name,
  email,
  roleName: roleNames[role],
});

export default async function SignInPage({ searchParams }: Readonly<{ searchParams: Search }>) {
  const [{ callbackUrl, changed }, actor, agency, demo] = await Promise.all([
    searchParams,
    getActor(),
    findAgency(),
    findDemoSignIns(),
  ]);
  const onwards = onwardsFrom(callbackUrl);
  if (actor) redirect(onwards as Route);
  return (
    <main className="grid min-h-dvh lg:grid-cols-[minmax(26rem,34rem)_1fr]">
      <div className="flex flex-col gap-10 bg-panel px-6 py-8 sm:px-12 lg:border-r">
        <Wordmark className="text-lg" />
        <div className="grid w-full max-w-md flex-1 content-center gap-6">
          <div>
            <h1 className="text-[1.75rem] leading-tight font-bold">Which road refreezes first?</h1>
            <p className="mt-1.5 text-soft">
              {agency.name ? `${agency.name}, winter desk.` : 'Sign in to the winter desk.'}
            </p>
          </div>
          {changed === 'password' ? (
            <Notice tone="done" title="Your password is changed." todo="Sign in with the new one." />
          ) : null}
          <SignInForm
            onwards={onwards}
            waitMin={signInLimits.windowMin}
            demo={demo && { password: demo.password, people: demo.people.map(withRoleName) }}
          />
        </div>
        <p className="text-sm text-faint">
          Here for the roads, not the desk?{' '}
          <Link href={'/status' as Route} className="link text-soft">
            See which roads have been treated
          </Link>
        </p>
      </div>
      <div className="hidden items-center justify-center p-12 lg:flex">
        <BrineFigure className="w-full max-w-3xl" />
      </div>
    </main>
  );
}
