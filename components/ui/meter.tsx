import { classNames } from './class-names';

export type MeterTone = 'hold' | 'lamp' | 'frozen' | 'urgent' | 'closing' | 'safe' | 'ink';

const fills: Readonly<Record<MeterTone, string>> = {
  hold: 'bg-hold',
  lamp: 'bg-lamp',
  frozen: 'bg-frozen',
  urgent: 'bg-urgent',
  closing: 'bg-closing',
  safe: 'bg-safe',
  ink: 'bg-ink',
};

export type MeterProps = Readonly<{
  label: string;
  value: number;
  max: number;
  /** In words, for screen readers: "204 of 400 t". */
  valueText?: string;
  tone?: MeterTone;
  size?: 'thin' | 'normal' | 'cab';
  className?: string;
}>;

const heights = { thin: 'h-[3px]', normal: 'h-2', cab: 'h-3.5' } as const;

/** How much of a whole, as a bar. The number belongs beside it. */
export function Meter({ label, value, max, valueText, tone = 'hold', size = 'normal', className }: MeterProps) {
  const fraction = max > 0 ? Math.min(1, Math.max(0, value / max)) : 0;
  return (
    <div
      role="meter"
      aria-label={label}
      aria-valuemin={0}
      aria-valuemax={max}
      aria-valuenow={Math.min(max, Math.max(0, value))}
      aria-valuetext={valueText}
      className={classNames('w-full overflow-hidden rounded-full bg-line', heights[size], className)}
    >
      <div className={classNames('h-full rounded-full', fills[tone])} style={{ width: `${fraction * 100}%` }} />
    </div>
  );
}
