'use client';

import { type Route } from 'next';
import Link from 'next/link';
import { Popover } from 'radix-ui';
import { Button } from '@/components/ui/button';
import { Preferences, type PreferencesProps } from './preferences';

export type AccountProps = Readonly<{
  name: string;
  roleName: string;
  onSignOut: () => void;
}> &
  PreferencesProps;

export function AccountPanel({ name, roleName, units, theme, onChange, onSignOut }: AccountProps) {
  return (
    <div className="grid gap-4">
      <div>
        <p className="font-bold">{name}</p>
        <p className="text-sm text-soft">{roleName}</p>
      </div>
      <Preferences units={units} theme={theme} onChange={onChange} />
      <div className="flex flex-wrap items-center justify-between gap-3">
        <Link href={'/account' as Route} className="link">
          Your account
        </Link>
        <Button size="small" onClick={onSignOut}>
          Sign out
        </Button>
      </div>
    </div>
  );
}

/** The foot of the rail: who is signed in, and a panel with what is theirs. */
export function Account(props: AccountProps) {
  return (
    <Popover.Root>
      <Popover.Trigger className="grid w-full border-t px-4 py-3 text-left transition-colors hover:bg-raised/60 data-[state=open]:bg-raised">
        <span className="truncate font-semibold">{props.name}</span>
        <span className="truncate text-sm text-soft">{props.roleName}</span>
      </Popover.Trigger>
      <Popover.Portal>
        <Popover.Content
          side="right"
          align="end"
          sideOffset={6}
          collisionPadding={8}
          aria-label="Account"
          className="appear z-50 w-64 rounded-lg border bg-panel p-4 text-ink shadow-2xl outline-none"
        >
          <AccountPanel {...props} />
        </Popover.Content>
      </Popover.Portal>
    </Popover.Root>
  );
}
