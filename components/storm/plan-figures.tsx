'use client';

import { Figure, FigureBlock } from '@/components/ui/figure';
import { type PlanSummary } from '@/lib/contracts/plans';
import { formatMoney } from '@/lib/units/money';

export type PlanFiguresProps = Readonly<{ summary: PlanSummary; currency: string }>;

/** What a plan comes to, in the figures that matter. */
export function PlanFigures({ summary, currency }: PlanFiguresProps) {
  const treated = summary.groups.filter(({ action }) => action !== 'nothing' && action !== 'undecided');
  const treatedLaneKm = treated.reduce((sum, { laneKm }) => sum + laneKm, 0);
  const treatedRoads = treated.reduce((sum, { roads }) => sum + roads, 0);
  return (
    <dl className="flex flex-wrap gap-x-11 gap-y-5">
      <FigureBlock
        label="Roads to treat"
        beside={
          <>
            of {summary.roads}, <Figure value={treatedLaneKm * 1000} quantity="laneDistance" size="inline" digits={0} />
          </>
        }
      >
        {treatedRoads}
      </FigureBlock>
      <FigureBlock
        label="Material"
        beside={
          <>
            <Figure value={summary.saltKg} quantity="largeMass" size="inline" /> of it salt
          </>
        }
      >
        <Figure value={summary.massKg} quantity="largeMass" size="large" />
      </FigureBlock>
      <FigureBlock label="Brine" beside={summary.brineL > 0 ? 'as a liquid of its own' : 'no liquid of its own'}>
        <Figure value={summary.brineL} quantity="volume" size="large" />
      </FigureBlock>
      <FigureBlock label="Chloride" beside="by species, from the products’ composition">
        <Figure value={summary.chlorideKg} quantity="largeMass" size="large" />
      </FigureBlock>
      <FigureBlock label="Cost of material" beside="trucks and people not counted">
        {formatMoney(Math.round(summary.costCents), currency, 0)}
      </FigureBlock>
    </dl>
  );
}
