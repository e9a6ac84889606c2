'use client';

import { Figure, FigureBlock } from '@/components/ui/figure';
import { type LedgerView } from '@/lib/contracts/ledger';
import { differenceFraction } from '@/lib/ledger/account';
import { formatMoney } from '@/lib/units/money';
import { Difference } from './difference';

export type LedgerFiguresProps = Readonly<{ ledger: LedgerView }>;

/** The five figures that matter. */
export function LedgerFigures({ ledger }: LedgerFiguresProps) {
  const { total, laneKm, currency } = ledger;
  const perLaneKm = laneKm > 0 ? formatMoney(Math.round(total.costCents / laneKm), currency) : null;
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
        {formatMoney(Math.round(total.costCents), currency, 0)}
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
