'use client';

import { Figure } from '@/components/ui/figure';
import { UnitsProvider, useUnits } from '@/components/ui/units';
import { actionWords, type Treatment } from './treatment-words';

/** The rate, large and lamp-coloured, with the other unit system beside it. */
export function Rate({ treatment }: Readonly<{ treatment: Treatment }>) {
  const system = useUnits();
  const isLiquid = treatment.action === 'anti-ice' && treatment.rateMlPerM2 !== null;
  const value = isLiquid ? treatment.rateMlPerM2 : treatment.rateGPerM2;
  if (value === null || value === 0) {
    return <p className="text-2xl font-bold text-lamp">{actionWords[treatment.action]}</p>;
  }
  const quantity = isLiquid ? 'liquidRate' : 'rate';
  return (
    <p className="flex flex-wrap items-baseline gap-x-3 gap-y-0.5">
      <Figure
        value={value}
        quantity={quantity}
        size="large"
        digits={system === 'metric' ? 0 : undefined}
        className="text-lamp"
      />
      <span className="text-soft">
        {treatment.isPloughed ? 'plough, then ' : ''}
        {treatment.materialName ?? actionWords[treatment.action]},{' '}
        <UnitsProvider system={system === 'metric' ? 'us' : 'metric'}>
          <Figure value={value} quantity={quantity} size="inline" digits={0} />
        </UnitsProvider>
      </span>
    </p>
  );
}
