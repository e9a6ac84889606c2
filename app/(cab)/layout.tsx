import { redirect } from 'next/navigation';
import { type ReactNode } from 'react';
import { PortalRoot } from '@/components/ui/portal-root';
import { UnitsProvider } from '@/components/ui/units';
import { getActor } from '@/lib/server/session';

/** The tablet: no rail, and dark unless the driver says otherwise, for night eyes. */
export default async function CabLayout({ children }: Readonly<{ children: ReactNode }>) {
  const actor = await getActor();
  if (!actor) redirect('/sign-in');
  return (
    <UnitsProvider system={actor.unitSystem}>
      <PortalRoot
        data-theme={actor.theme === 'light' ? 'light' : 'dark'}
        className="min-h-dvh bg-ground text-[1.1875rem] text-ink"
      >
        {children}
      </PortalRoot>
    </UnitsProvider>
  );
}
