'use client';

import { type CrewView } from '@/lib/contracts/crew';
import { formatDuration } from '@/lib/units/format';

export type DriverListProps = Readonly<{ drivers: CrewView['drivers']; now: number | null }>;

export function DriverList({ drivers, now }: DriverListProps) {
  return (
    <ul className="grid gap-x-10 sm:grid-cols-2 xl:grid-cols-3">
      {drivers.map((driver) => (
        <li key={driver.id} className="flex items-baseline justify-between gap-4 border-b py-2">
          <span className="font-semibold">{driver.name}</span>
          {driver.outSince && now !== null ? (
            <span>
              <span className="text-soft">out for</span>{' '}
              <span className="font-mono">{formatDuration((now - new Date(driver.outSince).getTime()) / 60_000)}</span>
            </span>
          ) : (
            <span className="text-soft">not out</span>
          )}
        </li>
      ))}
    </ul>
  );
}
