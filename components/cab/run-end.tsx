'use client';

import { Button } from '@/components/ui/button';
import { Figure } from '@/components/ui/figure';
import { type RunView } from '@/lib/contracts/runs';

export type RunEndProps = Readonly<{ run: RunView; onTakeAnother: () => void }>;

/** Every road is logged, or the run is over. */
export function RunEnd({ run, onTakeAnother }: RunEndProps) {
  const skipped = run.roads.filter((road) => road.outcome === 'skipped').length;
  return (
    <section className="grid content-start gap-4">
      <h1 className="text-5xl font-bold">{run.finishedAt ? 'Run ended' : 'Every road is logged'}</h1>
      <p className="max-w-[40ch] text-2xl text-soft">
        <Figure value={run.spreadKg} quantity="largeMass" size="inline" className="text-ink" /> spread from{' '}
        <Figure value={run.loadedKg} quantity="largeMass" size="inline" className="text-ink" /> loaded
        {skipped > 0 ? `, ${skipped} ${skipped === 1 ? 'road' : 'roads'} skipped` : ''}.
      </p>
      {run.finishedAt ? (
        <Button size="cab-tall" variant="primary" onClick={onTakeAnother} className="justify-self-start">
          Take another run
        </Button>
      ) : null}
    </section>
  );
}
