'use client';

import { type Route } from 'next';
import Link from 'next/link';
import { classNames } from '@/components/ui/class-names';
import { type NavItem } from './nav-items';

export type RailLinkProps = Readonly<{ item: NavItem; isActive: boolean; className?: string; onGo?: () => void }>;

/** A labelled place; the lamp bar marks where one is. */
export function RailLink({ item, isActive, className, onGo }: RailLinkProps) {
  return (
    <Link
      href={item.href as Route}
      aria-current={isActive ? 'page' : undefined}
      {...(onGo ? { onClick: onGo } : {})}
      className={classNames(
        'flex min-h-[2.4375rem] items-center border-l-[3px] pr-3 pl-4 transition-colors',
        isActive
          ? 'border-lamp bg-raised font-semibold text-ink'
          : 'border-transparent text-soft hover:bg-raised/60 hover:text-ink',
        className,
      )}
    >
      {item.label}
    </Link>
  );
}
