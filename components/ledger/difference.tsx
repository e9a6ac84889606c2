import { classNames } from '@/components/ui/class-names';
import { formatNumber } from '@/lib/units/format';
import { rateToleranceFraction } from '@/lib/ledger/limits';

export type DifferenceProps = Readonly<{ fraction: number | null }>;

/** Spread above or below what was recommended, with its sign; over-use stands out. */
export function Difference({ fraction }: DifferenceProps) {
  if (fraction === null) return <span className="text-faint">no plan</span>;
  return (
    <span className={classNames('font-semibold', fraction > rateToleranceFraction && 'text-frozen')}>
      {formatNumber(fraction * 100, 0, true)} %
    </span>
  );
}
