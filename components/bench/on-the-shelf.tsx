'use client';

import { Figure } from '@/components/ui/figure';
import { type AssessedBrine } from './assess-brine';

export type OnTheShelfProps = Readonly<{ brine: AssessedBrine }>;

/** What a yard hand can check the brine by, and how it keeps. */
export function OnTheShelf({ brine }: OnTheShelfProps) {
  const { densityAt60FKgPerM3: density, freezing, isPastEutectic } = brine;
  return (
    <div className="grid gap-2 text-soft">
      {density === null ? (
        <p>Stronger than the densities that were measured, so no hydrometer figure is given.</p>
      ) : (
        <p>
          A hydrometer at 60 °F reads <Figure value={brine.specificGravity} quantity="specificGravity" size="inline" />
          {brine.salometer === null ? null : (
            <>
              , a salometer <Figure value={brine.salometer} quantity="salometer" size="inline" />
            </>
          )}
          . It weighs <Figure value={density} quantity="density" size="inline" /> and holds{' '}
          <Figure value={density * brine.massFraction} quantity="density" size="inline" /> of salt.
        </p>
      )}
      {freezing.icePointC !== null && isPastEutectic ? (
        <p>
          Past the eutectic, stronger is worse: ice alone would wait until{' '}
          <Figure value={freezing.icePointC} quantity="temperature" size="inline" />, but the salt separates first and
          can block lines, pumps and nozzles. Diluted on the road it works down to the eutectic as any other.
        </p>
      ) : (
        <p>
          Clear down to <Figure value={freezing.freezingPointC} quantity="temperature" size="inline" /> in a tank that
          stands still. Brine may cool further before it freezes; never count on that.
        </p>
      )}
    </div>
  );
}
