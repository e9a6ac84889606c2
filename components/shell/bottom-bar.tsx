'use client';

import { type Route } from 'next';
import Link from 'next/link';
import { useState } from 'react';
import { classNames } from '@/components/ui/class-names';
import { Sheet } from '@/components/ui/dialog';
import { AccountPanel, type AccountProps } from './account';
import { type NavItem } from './nav-items';
import { RailLink } from './rail-link';

export type BottomBarProps = Readonly<{ items: readonly NavItem[]; active: NavItem | null; account: AccountProps }>;

const shownItems = 4;

const cell = (isActive: boolean) =>
  classNames(
    'flex min-h-14 flex-1 items-center justify-center border-t-[3px] px-1 text-sm transition-colors',
    isActive ? 'border-lamp font-semibold text-ink' : 'border-transparent text-soft',
  );

/** The rail on a phone: the first places within reach of a thumb, the rest and the account in a sheet. */
export function BottomBar({ items, active, account }: BottomBarProps) {
  const [isOpen, setIsOpen] = useState(false);
  const first = items.slice(0, shownItems);
  const rest = items.slice(shownItems);
  const isMoreActive = active !== null && rest.includes(active);
  return (
    <nav
      aria-label="Places"
      className="fixed inset-x-0 bottom-0 z-30 flex border-t bg-panel pb-[env(safe-area-inset-bottom)] md:hidden print:hidden"
    >
      {first.map((item) => (
        <Link
          key={item.href}
          href={item.href as Route}
          aria-current={item === active ? 'page' : undefined}
          className={cell(item === active)}
        >
          {item.label}
        </Link>
      ))}
      <button type="button" className={cell(isMoreActive)} aria-haspopup="dialog" onClick={() => setIsOpen(true)}>
        More
      </button>
      <Sheet isOpen={isOpen} onOpenChange={setIsOpen} title="More" side="bottom">
        <div className="-mx-5 mb-5 border-b pb-3">
          {rest.map((item) => (
            <RailLink
              key={item.href}
              item={item}
              isActive={item === active}
              onGo={() => setIsOpen(false)}
              className="min-h-12"
            />
          ))}
        </div>
        <AccountPanel {...account} />
      </Sheet>
    </nav>
  );
}
