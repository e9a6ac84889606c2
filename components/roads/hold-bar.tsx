import { classNames } from '@/components/ui/class-names';
import { type MarginBand } from './margin-band';

const fills: Readonly<Record<MarginBand, string>> = {
  frozen: 'bg-frozen',
  urgent: 'bg-urgent',
  closing: 'bg-closing',
  hold: 'bg-hold',
  safe: 'bg-safe',
  unknown: 'bg-safe',
};

export type HoldBarProps = Readonly<{
  holdMin: number | null;
  nextPassMin: number | null;
  band: MarginBand;
  /** The time at the right end of the bar. */
  spanMin: number;
}>;

const percent = (minutes: number, spanMin: number) => `${Math.min(100, Math.max(0, (minutes / spanMin) * 100))}%`;

/** Hold as a bar with a tick where the truck comes; the gap between them, when it comes too late, is dashed. */
export function HoldBar({ holdMin, nextPassMin, band, spanMin }: HoldBarProps) {
  const hold = holdMin ?? 0;
  const isLate = nextPassMin !== null && holdMin !== null && nextPassMin > holdMin;
  return (
    <div aria-hidden className="relative h-2.5 flex-1">
      <div className="absolute inset-x-0 top-1 h-[3px] rounded-full bg-line" />
      {isLate ? (
        <div
          className="absolute top-1 border-t-[3px] border-dashed border-frozen"
          style={{ left: percent(hold, spanMin), right: `calc(100% - ${percent(nextPassMin, spanMin)})` }}
        />
      ) : null}
      <div
        className={classNames('absolute left-0 top-1 h-[3px] rounded-full', fills[band])}
        style={{ width: percent(hold, spanMin) }}
      />
      {nextPassMin === null ? null : (
        <div
          className="absolute top-0 h-[11px] w-0.5 -translate-x-px bg-ink"
          style={{ left: percent(nextPassMin, spanMin) }}
        />
      )}
    </div>
  );
}
