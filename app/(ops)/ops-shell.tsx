'use client';

import { signOut } from 'next-auth/react';
import { type ReactNode } from 'react';
import { type NavItem } from '@/components/shell/nav-items';
import { type Theme, type Units } from '@/components/shell/preferences';
import { Shell } from '@/components/shell/shell';
import { useAnnounce } from '@/components/ui/announcements';
import { UnitsProvider } from '@/components/ui/units';
import { usePreferences } from './use-preferences';

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
  const announce = useAnnounce();
  const preferences = usePreferences({ units, theme });
  const account = {
    name,
    roleName,
    ...preferences,
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
