import { redirect } from 'next/navigation';
import { type ReactNode } from 'react';
import { findAgency } from '@/db/queries/agency';
import { mayEver, roleNames, type Action } from '@/lib/permissions';
import { getActor } from '@/lib/server/session';
import { OpsShell } from './ops-shell';

const places: readonly { href: string; label: string; needs: Action }[] = [
  { href: '/roads', label: 'Roads', needs: 'roads.view' },
  { href: '/storm', label: 'Storm', needs: 'storms.view' },
  { href: '/routes', label: 'Routes', needs: 'routes.view' },
  { href: '/crew', label: 'Crew', needs: 'crew.view' },
  { href: '/cab', label: 'Cab', needs: 'cab.use' },
  { href: '/yard', label: 'Yard', needs: 'yard.view' },
  { href: '/ledger', label: 'Ledger', needs: 'ledger.view' },
  { href: '/bench', label: 'Brine bench', needs: 'bench.use' },
  { href: '/setup', label: 'Set-up', needs: 'setup.view' },
];

export default async function OpsLayout({ children }: Readonly<{ children: ReactNode }>) {
  const actor = await getActor();
  if (!actor) redirect('/sign-in');
  const agency = await findAgency();
  const items = places.filter((place) => mayEver(actor.role, place.needs)).map(({ href, label }) => ({ href, label }));
  return (
    <OpsShell
      items={items}
      agencyName={agency.name}
      name={actor.name}
      roleName={roleNames[actor.role]}
      units={actor.unitSystem}
      theme={actor.theme}
    >
      {children}
    </OpsShell>
  );
}
