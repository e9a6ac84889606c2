'use client';

import { classNames } from '@/components/ui/class-names';

export type CabHeaderProps = Readonly<{
  title: string;
  subtitle: string;
  waiting: number;
  refused: number;
  isOnline: boolean;
  clock: string;
  children?: React.ReactNode;
}>;

/** What has not reached the server, in plain words. */
export function waitingWords({
  waiting,
  refused,
  isOnline,
}: Pick<CabHeaderProps, 'waiting' | 'refused' | 'isOnline'>): string {
  const entries = (count: number) => `${count} ${count === 1 ? 'entry' : 'entries'}`;
  if (refused > 0) return `${entries(refused)} refused, kept on this tablet`;
  if (waiting > 0) return `${isOnline ? 'Sending' : 'No signal'}, ${entries(waiting)} kept on this tablet`;
  return isOnline ? 'All sent' : 'No signal, nothing waiting';
}

export function CabHeader({ title, subtitle, waiting, refused, isOnline, clock, children }: CabHeaderProps) {
  const isCalm = waiting === 0 && refused === 0;
  return (
    <header className="flex flex-wrap items-center gap-x-6 gap-y-2 border-b px-6 py-3">
      <p className="flex flex-1 flex-wrap items-baseline gap-x-5 text-xl">
        <strong className="text-2xl">{title}</strong>
        <span className="text-soft">{subtitle}</span>
      </p>
      <p
        role="status"
        className={classNames(
          'rounded-full border px-4 py-1.5 text-lg font-semibold',
          isCalm ? 'text-soft' : 'border-urgent text-urgent',
        )}
      >
        {waitingWords({ waiting, refused, isOnline })}
      </p>
      <p className="font-mono text-2xl">{clock}</p>
      {children}
    </header>
  );
}
