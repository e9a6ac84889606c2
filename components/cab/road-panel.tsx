'use client';

import { Figure } from '@/components/ui/figure';
import { type RunRoad } from '@/lib/contracts/runs';
import { askedOf, roadWords } from './progress';
import { RateFigure } from './rate-figure';

export type RoadPanelProps = Readonly<{ road: RunRoad }>;

/** The one road that matters now; its rate is the biggest thing on the screen. */
export function RoadPanel({ road }: RoadPanelProps) {
  return (
    <section aria-label={`Now: ${road.name}`} className="grid min-w-0 content-start gap-2">
      <p className="text-xl text-soft">Now</p>
      <h1 className="text-[clamp(2rem,6vw,3rem)] leading-[1.05] font-bold text-balance">{road.name}</h1>
      <p className="text-xl text-soft">
        <Figure value={road.lengthM} quantity="distance" size="inline" className="text-ink" />, {roadWords(road)}, class{' '}
        {road.serviceClass}
      </p>
      <div className="flex flex-wrap items-end justify-between gap-x-8">
        <Asked road={road} />
        {road.pavementTempC === null ? null : (
          <p className="grid pb-4 text-right">
            <span className="text-xl text-soft">Pavement</span>
            <span className="text-5xl">
              <Figure value={road.pavementTempC} quantity="temperature" />
            </span>
          </p>
        )}
      </div>
      {road.isSensitive ? (
        <p className="mt-1 border-l-[3px] border-urgent pl-3 text-xl">Salt-sensitive ground: keep to the rate shown.</p>
      ) : null}
      {road.reason ? <p className="max-w-[46ch] text-xl text-soft">{road.reason}</p> : null}
    </section>
  );
}

function Asked({ road }: RoadPanelProps) {
  const asked = askedOf(road);
  if (asked === 'spread') {
    return (
      <div className="flex flex-wrap items-end gap-x-6 gap-y-1 pt-4 pb-3 text-lamp">
        <RateFigure rateGPerM2={road.rateGPerM2 ?? 0} rateMlPerM2={road.rateMlPerM2} size="cab" />
        <p className="pb-1 text-2xl text-soft">
          {road.materialName}
          {road.isPloughed ? <strong className="block text-ink">Plough down</strong> : null}
        </p>
      </div>
    );
  }
  const words = {
    ploughed: 'Plough only',
    nothing: 'Nothing to spread',
    unknown: 'No rate in the plan',
  }[asked];
  return <p className="py-6 text-[clamp(2.5rem,9vw,5.5rem)] leading-none font-bold text-lamp">{words}</p>;
}
