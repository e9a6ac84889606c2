'use client';

import { Figure, FigureBlock } from '@/components/ui/figure';
import { type AssessedBrine } from './assess-brine';
import { solidName, writeFormula } from './solid-name';

export type BrineFiguresProps = Readonly<{ brine: AssessedBrine }>;

/** The three figures that matter, each with what it may be off by. */
export function BrineFigures({ brine }: BrineFiguresProps) {
  const { freezing, error, strengthError } = brine;
  return (
    <dl className="flex flex-wrap gap-x-8 gap-y-4" aria-live="polite">
      <FigureBlock
        label="Strength"
        beside={
          strengthError > 0 ? (
            <>
              ± <Figure value={strengthError} quantity="percent" size="inline" /> by the reading
            </>
          ) : (
            'as given'
          )
        }
      >
        <Figure value={brine.massFraction} quantity="percent" size="large" />
      </FigureBlock>
      <FigureBlock
        label={freezing.solid === 'ice' ? 'Freezes at' : 'Salt separates at'}
        beside={
          error === null ? (
            'not scored against a table'
          ) : (
            <>
              ± <Figure value={error.errorC} quantity="temperatureDifference" size="inline" />
            </>
          )
        }
      >
        <span className="text-lamp">
          <Figure value={freezing.freezingPointC} quantity="temperature" size="large" />
        </span>
      </FigureBlock>
      <FigureBlock
        label="First solid"
        className="min-w-0 flex-1 basis-44"
        beside={freezing.solid === 'ice' ? 'the brine left over grows stronger' : solidName(freezing.solid)}
      >
        {freezing.solid === 'ice' ? 'ice' : writeFormula(freezing.solid)}
      </FigureBlock>
    </dl>
  );
}
