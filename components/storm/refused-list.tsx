'use client';

import { useUnits } from '@/components/ui/units';
import { type PlanSummary } from '@/lib/contracts/plans';
import { refusalSentence } from '@/lib/treatment/reason';
import { alternatives } from './storm-words';

type Refused = PlanSummary['refused'][number];
export type RefusedListProps = Readonly<{ refused: readonly Refused[] }>;

/** Products that limits forbid somewhere: on how many roads, why, what it would take, and what is left to try. */
export function RefusedList({ refused }: RefusedListProps) {
  const system = useUnits();
  return (
    <ul className="grid">
      {refused.map(({ materialName, reason, roads, neededRateGPerM2, limit }) => (
        <li key={`${materialName}-${reason}-${limit ?? ''}`} className="border-b py-2 first:border-t">
          <p>
            <span className="font-semibold">{materialName}</span> on {roads} {roads === 1 ? 'road' : 'roads'}:{' '}
            {refusalSentence(
              {
                reason,
                ...(neededRateGPerM2 === null ? {} : { neededRateGPerM2 }),
                ...(limit === null ? {} : { limit }),
              },
              { system },
            )}
            {neededRateGPerM2 !== null && limit !== 0 && roads > 1 ? ' on the worst of them' : ''}.
          </p>
          {alternatives[reason] ? <p className="text-sm text-soft">Instead: {alternatives[reason]}</p> : null}
        </li>
      ))}
    </ul>
  );
}
