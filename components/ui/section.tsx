import { type ReactNode, useId } from 'react';
import { classNames } from './class-names';

export type SectionProps = Readonly<{
  title: ReactNode;
  /** One line on what is in it. */
  lead?: ReactNode;
  actions?: ReactNode;
  children: ReactNode;
  /** One level of card at most: give it only where the page has none. */
  isCard?: boolean;
  className?: string;
}>;

export function Section({ title, lead, actions, children, isCard = false, className }: SectionProps) {
  const id = useId();
  return (
    <section
      aria-labelledby={id}
      className={classNames('min-w-0', isCard && 'rounded-lg border bg-panel px-4 py-3.5 md:px-5', className)}
    >
      <div className="mb-2.5 flex flex-wrap items-baseline justify-between gap-x-4 gap-y-1">
        <h2 id={id} className="text-lg font-bold">
          {title}
        </h2>
        {lead ? <p className="text-soft">{lead}</p> : null}
        {actions ? <div className="flex flex-wrap gap-2 print:hidden">{actions}</div> : null}
      </div>
      {children}
    </section>
  );
}
