'use client';

import { Figure, FigureBlock } from '@/components/ui/figure';
import { type LedgerView } from '@/lib/contracts/ledger';
import { differenceFraction } from '@/lib/ledger/account';
import { formatNumber } from '@/lib/units/format';
import { Difference } from './difference';

export type LedgerFiguresProps = Readonly<{ ledger: LedgerView }>;

/** Cents as whole money, grouped like every other figure: "€5 159". */
export function money(cents: number, currency: string): string {
  const parts = new Intl.NumberFormat('en-IE', { style: 'currency', currency }).formatToParts(0);
  const sign = parts.find((part) => part.type === 'currency')?.value ?? currency;
  return `${sign}${formatNumber(cents / 100, 0)}`;
}

/** The five figures that matter. */
export function LedgerFigures({ ledger }: LedgerFiguresProps) {
  const { total, laneKm, currency } = ledger;
  const perLaneKm = laneKm > 0 ? money(total.costCents / laneKm, currency) : null;
  return (
    <dl className="flex flex-wrap gap-x-11 gap-y-5">
      <FigureBlock
        label="Material spread"
        beside={
          <>
            recommended <Figure value={total.recommendedKg} quantity="largeMass" size="inline" />
          </>
        }
      >
        <Figure value={total.spreadKg} quantity="largeMass" size="large" />
      </FigureBlock>
      <FigureBlock label="Against the plan" beside={`${total.roads} roads logged, ${total.skipped} skipped`}>
        <Difference fraction={differenceFraction(total)} />
      </FigureBlock>
      <FigureBlock
        label="Cost of material"
        beside={perLaneKm ? `${perLaneKm} per lane-km treated` : 'nothing treated yet'}
      >
        {money(total.costCents, currency)}
      </FigureBlock>
      <FigureBlock
        label="Chloride to salt-sensitive ground"
        beside={
          <>
            of <Figure value={total.chlorideKg} quantity="largeMass" size="inline" /> chloride in all
          </>
        }
      >
        <Figure value={total.chlorideOnSensitiveKg} quantity="largeMass" digits={2} size="large" />
      </FigureBlock>
      <FigureBlock
        label="Treated"
        beside={
          ledger.brineL > 0 ? (
            <>
              <Figure value={ledger.brineL} quantity="volume" size="inline" /> of it as brine
            </>
          ) : (
            'no liquid spread'
          )
        }
      >
        <Figure value={laneKm * 1000} quantity="laneDistance" size="large" />
      </FigureBlock>
    </dl>
  );
}
