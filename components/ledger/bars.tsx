'use client';

import { scaleBand, scaleLinear } from '@visx/scale';
import { useUnits } from '@/components/ui/units';
import { differenceFraction, type Account } from '@/lib/ledger/account';
import { rateToleranceFraction } from '@/lib/ledger/limits';
import { formatQuantity } from '@/lib/units/format';

export interface BarGroup {
  name: string;
  account: Pick<Account, 'recommendedKg' | 'spreadKg'>;
}

export type BarsProps = Readonly<{ groups: readonly BarGroup[] }>;

const width = 760;
const height = 260;
const inset = { top: 12, right: 8, bottom: 26, left: 64 };

/** Recommended beside spread by route. The table above it holds the same numbers for those who cannot see it. */
export function Bars({ groups }: BarsProps) {
  const system = useUnits();
  const highest = Math.max(1, ...groups.flatMap(({ account }) => [account.recommendedKg, account.spreadKg]));
  const x = scaleBand({
    domain: groups.map((group) => group.name),
    range: [inset.left, width - inset.right],
    padding: 0.28,
  });
  const y = scaleLinear({ domain: [0, highest], range: [height - inset.bottom, inset.top], nice: true });
  const half = x.bandwidth() / 2;
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      role="img"
      aria-label="Recommended beside spread, by route"
      className="w-full"
    >
      {y.ticks(4).map((tick) => {
        const { value, unit } = formatQuantity(tick, 'largeMass', system, { digits: highest < 4000 ? 1 : 0 });
        return (
          <g key={tick}>
            <line x1={inset.left} x2={width - inset.right} y1={y(tick)} y2={y(tick)} className="stroke-line" />
            <text x={inset.left - 8} y={y(tick) + 4} textAnchor="end" className="fill-soft font-mono text-xs">
              {value} {unit}
            </text>
          </g>
        );
      })}
      {groups.map(({ name, account }) => {
        const left = x(name) ?? 0;
        const isOver = (differenceFraction(account) ?? 0) > rateToleranceFraction;
        return (
          <g key={name}>
            <rect
              x={left}
              width={half - 2}
              y={y(account.recommendedKg)}
              height={y(0) - y(account.recommendedKg)}
              className="fill-line"
            />
            <rect
              x={left + half}
              width={half - 2}
              y={y(account.spreadKg)}
              height={y(0) - y(account.spreadKg)}
              className={isOver ? 'fill-frozen' : 'fill-hold'}
            />
            <text x={left + half} y={height - 8} textAnchor="middle" className="fill-soft text-xs">
              {name.length > 14 ? `${name.slice(0, 13)}…` : name}
            </text>
          </g>
        );
      })}
    </svg>
  );
}

/** Which bar is which, in words. */
export function BarsKey() {
  const item = (look: string, words: string) => (
    <span className="flex items-center gap-2">
      <span aria-hidden className={`inline-block h-3 w-4 rounded-sm ${look}`} /> {words}
    </span>
  );
  return (
    <p className="flex flex-wrap gap-x-6 gap-y-1 text-sm text-soft">
      {item('bg-line', 'recommended')}
      {item('bg-hold', 'spread')}
      {item('bg-frozen', 'spread, more than a tenth over')}
    </p>
  );
}
