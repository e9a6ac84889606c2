'use client';

import { useState, useSyncExternalStore } from 'react';
import { classNames } from '@/components/ui/class-names';
import { useUnits } from '@/components/ui/units';
import { bandRange, bandWords, marginBands, type MarginBand } from './margin-band';

const strokes: Readonly<Record<MarginBand, string>> = {
  frozen: 'border-frozen border-dashed',
  urgent: 'border-urgent',
  closing: 'border-closing',
  hold: 'border-hold',
  safe: 'border-safe',
  unknown: 'border-safe border-dotted',
};

const roomy = '(min-width: 48rem)';

/** On a phone the legend begins folded, since it would cover half the map. */
function useIsRoomy(): boolean {
  return useSyncExternalStore(
    (listener) => {
      const media = matchMedia(roomy);
      media.addEventListener('change', listener);
      return () => media.removeEventListener('change', listener);
    },
    () => matchMedia(roomy).matches,
    () => true,
  );
}

export type MarginLegendProps = Readonly<{
  /** "04:10" */
  time: string;
  counts: Readonly<Record<MarginBand, number>>;
  className?: string;
}>;

/** What the lines on the map mean, worst first, with how many roads each holds. */
export function MarginLegend({ time, counts, className }: MarginLegendProps) {
  const system = useUnits();
  const isRoomy = useIsRoomy();
  const [isOpenByHand, setIsOpen] = useState<boolean | null>(null);
  const isOpen = isOpenByHand ?? isRoomy;
  const shown = [...marginBands].reverse().filter((band) => band !== 'unknown' || counts.unknown > 0);
  return (
    <details
      open={isOpen}
      onToggle={(event) => setIsOpen(event.currentTarget.open)}
      className={classNames('group rounded-md border bg-panel/95 px-3.5 py-2 shadow-lg', className)}
    >
      <summary className="flex items-baseline justify-between gap-6 font-semibold [&::-webkit-details-marker]:hidden">
        Freeze margin at {time}
        <span className="text-sm font-normal text-soft">{isOpen ? 'hide' : 'legend'}</span>
      </summary>
      <table className="mt-1 text-sm">
        <thead className="sr-only">
          <tr>
            <th scope="col">Margin</th>
            <th scope="col">Means</th>
            <th scope="col">Roads</th>
          </tr>
        </thead>
        <tbody>
          {shown.map((band) => (
            <tr key={band}>
              <th scope="row" className="py-0.5 pr-4 text-left font-normal whitespace-nowrap">
                <span
                  aria-hidden
                  className={classNames('mr-3 inline-block w-8 border-t-[3px] align-middle', strokes[band])}
                />
                {bandRange(band, system)}
              </th>
              <td className="pr-3 text-soft">{bandWords[band]}</td>
              <td className="text-right font-mono text-soft">{counts[band]}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </details>
  );
}
