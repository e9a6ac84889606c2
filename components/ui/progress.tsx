import { type ReactNode } from 'react';
import { classNames } from './class-names';

export type ProgressProps = Readonly<{
  /** What is being done now: "Checking rows". */
  label: string;
  /** 0 to 1; leave out while the end is not known. */
  fraction?: number | null | undefined;
  /** How far, in words: "12 400 of 90 000 rows". */
  detail?: ReactNode;
  /** The stop button. */
  action?: ReactNode;
  className?: string;
}>;

export function Progress({ label, fraction, detail, action, className }: ProgressProps) {
  const isKnown = fraction !== null && fraction !== undefined;
  const percent = isKnown ? Math.round(Math.min(1, Math.max(0, fraction)) * 100) : undefined;
  return (
    <div className={classNames('grid gap-1.5', className)}>
      <div className="flex flex-wrap items-baseline justify-between gap-x-4">
        <p className="font-semibold">{label}</p>
        <p className="text-sm text-soft">{detail ?? (isKnown ? `${percent} %` : null)}</p>
      </div>
      <div
        role="progressbar"
        aria-label={label}
        aria-valuemin={0}
        aria-valuemax={100}
        aria-valuenow={percent}
        className="h-1.5 overflow-hidden rounded-full bg-raised"
      >
        <div
          className={classNames('h-full rounded-full bg-lamp', isKnown ? 'transition-[width]' : 'slide-over w-2/7')}
          style={isKnown ? { width: `${percent}%` } : undefined}
        />
      </div>
      {action ? <div className="mt-1">{action}</div> : null}
    </div>
  );
}
