'use client';

import { Figure } from '@/components/ui/figure';
import { Meter } from '@/components/ui/meter';
import { type RunRoad, type RunView } from '@/lib/contracts/runs';
import { askedOf, leftKg, neededKg } from './progress';
import { RateFigure } from './rate-figure';

export type SidePanelProps = Readonly<{
  run: RunView;
  next: readonly RunRoad[];
  onChoose: (position: number) => void;
  onCorrect: (road: RunRoad) => void;
}>;

export function SidePanel({ run, next, onChoose, onCorrect }: SidePanelProps) {
  const done = run.roads.filter((road) => road.outcome !== null);
  return (
    <aside aria-label="Load and next roads" className="grid content-start gap-6 border-line bg-panel p-6 lg:border-l">
      <Hopper run={run} />
      <section>
        <h2 className="mb-1 text-xl font-bold">Next</h2>
        {next.length === 0 ? (
          <p className="py-3 text-lg text-soft">No more roads on this run.</p>
        ) : (
          <ol>
            {next.slice(0, 6).map((road) => (
              <li key={road.position} className="border-t">
                <button
                  type="button"
                  onClick={() => onChoose(road.position)}
                  className="flex min-h-16 w-full items-center justify-between gap-4 py-2 text-left text-lg hover:bg-raised"
                >
                  <span className="min-w-0 font-semibold">{road.name}</span>
                  <NextRate road={road} />
                </button>
              </li>
            ))}
          </ol>
        )}
        <p className="border-t pt-3 text-lg text-soft">
          {done.length} of {run.roads.length} roads done{next.length > 6 ? `, ${next.length - 6} more after these` : ''}
          .
        </p>
      </section>
      {done.length > 0 ? <Done roads={done} onCorrect={onCorrect} /> : null}
    </aside>
  );
}

function Hopper({ run }: Readonly<{ run: RunView }>) {
  const left = leftKg(run);
  const short = neededKg(run) - left;
  return (
    <section className="grid gap-2">
      <div className="flex items-baseline justify-between gap-4 text-lg">
        <h2 className="text-soft">Hopper, by the log</h2>
        <p className="whitespace-nowrap">
          <Figure value={left} quantity="largeMass" isUnitHidden /> <span className="text-soft">of</span>{' '}
          <Figure value={run.hopperKg} quantity="largeMass" />
        </p>
      </div>
      <Meter
        label="Left in the hopper"
        value={left}
        max={run.hopperKg}
        tone={short > 0 ? 'urgent' : 'closing'}
        size="cab"
      />
      {short > 0 ? (
        <p className="text-lg">
          <Figure value={short} quantity="largeMass" /> short for the roads still to do.
        </p>
      ) : null}
    </section>
  );
}

function NextRate({ road }: Readonly<{ road: RunRoad }>) {
  const asked = askedOf(road);
  return (
    <span className="flex shrink-0 items-baseline gap-3 text-right">
      {asked === 'spread' ? (
        <span className="text-lamp">
          <RateFigure rateGPerM2={road.rateGPerM2 ?? 0} rateMlPerM2={road.rateMlPerM2} />
        </span>
      ) : (
        <span className="text-soft">{{ ploughed: 'plough', nothing: 'nothing', unknown: 'no rate' }[asked]}</span>
      )}
      <Figure value={road.lengthM} quantity="distance" className="w-20" />
    </span>
  );
}

const outcomeWords = { spread: 'spread', ploughed: 'ploughed', skipped: 'skipped' } as const;

function Done({ roads, onCorrect }: Readonly<{ roads: readonly RunRoad[]; onCorrect: (road: RunRoad) => void }>) {
  return (
    <details className="group">
      <summary className="flex min-h-16 items-center text-lg font-semibold">Roads done, to correct one</summary>
      <ul>
        {[...roads].reverse().map((road) => (
          <li key={road.position} className="border-t">
            <button
              type="button"
              onClick={() => onCorrect(road)}
              className="flex min-h-16 w-full items-center justify-between gap-4 py-2 text-left text-lg hover:bg-raised"
            >
              <span className="min-w-0">{road.name}</span>
              <span className="shrink-0 text-soft">
                {road.outcome === 'spread' && road.loggedRateGPerM2 !== null ? (
                  <Figure value={road.loggedRateGPerM2} quantity="rate" digits={0} />
                ) : (
                  outcomeWords[road.outcome ?? 'skipped']
                )}
              </span>
            </button>
          </li>
        ))}
      </ul>
    </details>
  );
}
