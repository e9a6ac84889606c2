'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { useUnits } from '@/components/ui/units';
import { type PlanSummary } from '@/lib/contracts/plans';
import { reasonSentence } from '@/lib/treatment/reason';
import { actionWords } from './storm-words';

type Exception = PlanSummary['exceptions'][number];
export type ExceptionsListProps = Readonly<{ exceptions: readonly Exception[]; passAt: number; zone: string }>;

const shownAtFirst = 8;

/** Roads where no rate within the limits lasts to the next pass. */
export function ExceptionsList({ exceptions, passAt, zone }: ExceptionsListProps) {
  const system = useUnits();
  const [isAll, setIsAll] = useState(false);
  const shown = isAll ? exceptions : exceptions.slice(0, shownAtFirst);
  return (
    <div className="grid gap-3">
      <ul className="grid">
        {shown.map(({ segmentId, roadName, serviceClass, action, parts }) => (
          <li key={segmentId} className="border-b py-2 first:border-t">
            <p className="flex flex-wrap items-baseline justify-between gap-x-4">
              <span className="font-semibold">{roadName}</span>
              <span className="text-sm text-soft">
                class {serviceClass}, {actionWords[action]}
              </span>
            </p>
            <p className="text-soft">{reasonSentence(parts, { zone, system, startAt: passAt })}</p>
          </li>
        ))}
      </ul>
      {exceptions.length > shown.length ? (
        <Button className="justify-self-start" onClick={() => setIsAll(true)}>
          Show all {exceptions.length} roads
        </Button>
      ) : null}
    </div>
  );
}
