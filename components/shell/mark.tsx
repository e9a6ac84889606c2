import { classNames } from '@/components/ui/class-names';

export type MarkProps = Readonly<{ className?: string }>;

/** Our mark: a freezing curve falling to its eutectic and rising again, over its two axes. */
export function Mark({ className }: MarkProps) {
  return (
    <svg
      aria-hidden
      viewBox="0 0 24 24"
      fill="none"
      strokeLinecap="round"
      strokeLinejoin="round"
      className={classNames('size-6', className)}
    >
      <path d="M3.5 5.2C8 6.4 11.8 10 14.6 16.2L3.5 16.2Z" className="fill-lamp opacity-15" />
      <path d="M3 2.5V20.5H21.5" className="stroke-soft" strokeWidth="1.8" />
      <path d="M3.5 5.2C8 6.4 11.8 10 14.6 16.2L19.8 5.2" className="stroke-lamp" strokeWidth="2.4" />
    </svg>
  );
}

/** The mark with the name beside it. */
export function Wordmark({ className }: MarkProps) {
  return (
    <span className={classNames('inline-flex items-center gap-2.5 font-bold', className)}>
      <Mark />
      Rimewright
    </span>
  );
}
