'use client';

import { type Route } from 'next';
import Link from 'next/link';
import { usePathname } from 'next/navigation';
import { type ReactNode } from 'react';
import { Account, type AccountProps } from './account';
import { BottomBar } from './bottom-bar';
import { Wordmark } from './mark';
import { activeItem, type NavItem } from './nav-items';
import { RailLink } from './rail-link';

export type ShellProps = Readonly<{
  items: readonly NavItem[];
  account: AccountProps;
  /** Whose roads these are, under the name. */
  agencyName: string;
  children: ReactNode;
}>;

/**
 * Rail and page. From 768 px on the page fills the window and scrolls by itself, so that a full-height screen can say
 * `h-full`; below, the window scrolls and the rail is a bar at its foot.
 */
export function Shell({ items, account, agencyName, children }: ShellProps) {
  const active = activeItem(items, usePathname());
  return (
    <div className="min-h-dvh md:grid md:h-dvh md:grid-cols-[9.25rem_minmax(0,1fr)] print:block print:h-auto">
      <a
        href="#page"
        className="fixed top-2 left-2 z-50 -translate-y-20 rounded-md bg-lamp px-3 py-2 font-semibold text-on-lamp focus:translate-y-0"
      >
        Go to the page
      </a>
      <nav
        aria-label="Places"
        className="hidden min-h-0 flex-col overflow-y-auto border-r bg-panel md:flex print:hidden"
      >
        <Link href={(items[0]?.href ?? '/') as Route} className="flex min-h-14 items-center pl-4">
          <Wordmark />
        </Link>
        <div className="flex-1">
          {items.map((item) => (
            <RailLink key={item.href} item={item} isActive={item === active} />
          ))}
        </div>
        {agencyName ? <p className="px-4 pt-4 pb-2 text-sm text-faint">{agencyName}</p> : null}
        <Account {...account} />
      </nav>
      <main
        id="page"
        tabIndex={-1}
        className="flex min-w-0 flex-col pb-[calc(3.75rem+env(safe-area-inset-bottom))] outline-none md:min-h-0 md:overflow-y-auto md:pb-0 print:overflow-visible print:pb-0"
      >
        {children}
      </main>
      <BottomBar items={items} active={active} account={account} />
    </div>
  );
}
