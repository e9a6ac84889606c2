import { type Metadata, type Route } from 'next';
import Link from 'next/link';
import { PageBody, PageHeader } from '@/components/ui/page-header';
import { mayEver, type Action } from '@/lib/permissions';
import { requirePage } from '@/lib/server/page';

export const metadata: Metadata = { title: 'Set-up' };

const parts: readonly { href: string; label: string; what: string; needs: Action }[] = [
  {
    href: '/setup/roads',
    label: 'Roads',
    what: 'The network: load it from a file, see what was assumed, take a load back.',
    needs: 'setup.roads',
  },
  {
    href: '/setup/stations',
    label: 'Stations',
    what: 'Weather stations, how their files are read, and the keys they send with.',
    needs: 'readings.import',
  },
  {
    href: '/setup/materials',
    label: 'Materials',
    what: 'What is spread: what it is made of, what it costs, how cold it still works.',
    needs: 'setup.materials',
  },
  {
    href: '/setup/fleet',
    label: 'Yards and trucks',
    what: 'Where salt and brine are kept, and what carries them.',
    needs: 'setup.fleet',
  },
  {
    href: '/setup/policy',
    label: 'Treatment policy',
    what: 'What each class of road is promised, and the most that may be put down.',
    needs: 'setup.policy',
  },
  {
    href: '/setup/people',
    label: 'People',
    what: 'Who may sign in, and what their role lets them do.',
    needs: 'setup.people',
  },
];

export default async function SetupPage() {
  const actor = await requirePage('setup.view');
  const mine = parts.filter((part) => mayEver(actor.role, part.needs));
  return (
    <>
      <PageHeader title="Set-up" facts={['What the tools work with. Every change is kept in the audit log.']} />
      <PageBody>
        <ul className="max-w-3xl border-t">
          {mine.map((part) => (
            <li key={part.href} className="border-b">
              <Link href={part.href as Route} className="group grid gap-x-6 py-3.5 sm:grid-cols-[11rem_1fr]">
                <span className="text-lg font-bold underline decoration-transparent underline-offset-4 transition-colors group-hover:decoration-lamp">
                  {part.label}
                </span>
                <span className="text-soft">{part.what}</span>
              </Link>
            </li>
          ))}
        </ul>
      </PageBody>
    </>
  );
}
