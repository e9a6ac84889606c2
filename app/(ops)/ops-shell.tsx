'use client';

import { signOut } from 'next-auth/react';
import { useRouter } from 'next/navigation';
import { type ReactNode } from 'react';
import { type NavItem } from '@/components/shell/nav-items';
import { type Theme, type Units } from '@/components/shell/preferences';
import { Shell } from '@/components/shell/shell';
import { useAnnounce } from '@/components/ui/announcements';
import { UnitsProvider } from '@/components/ui/units';
import { useSubmission } from '@/components/ui/use-submission';
import { savePreferences } from './account/actions';

export type OpsShellProps = Readonly<{
  items: readonly NavItem[];
  agencyName: string;
  name: string;
  roleName: string;
  units: Units;
  theme: Theme;
  children: ReactNode;
}>;

export function OpsShell({ items, agencyName, name, roleName, units, theme, children }: OpsShellProps) {
  const router = useRouter();
  const announce = useAnnounce();
  const preferences = useSubmission(savePreferences, () => router.refresh());
  const account = {
    name,
    roleName,
    units,
    theme,
    onChange: (change: { units: Units; theme: Theme }) =>
      preferences.send({ unitSystem: change.units, theme: change.theme }),
    onSignOut: () => {
      announce('Signing out.');
      void signOut({ callbackUrl: '/sign-in' });
    },
  };
  return (
    <UnitsProvider system={units}>
      <Shell items={items} agencyName={agencyName} account={account}>
        {children}
      </Shell>
    </UnitsProvider>
  );
}
