import { type ReactNode } from 'react';
import { classNames } from './class-names';

export type PageHeaderProps = Readonly<{
  /** What this is about: "Storm 07, snow turning to freezing drizzle". */
  title: ReactNode;
  /** What is going on, each a short phrase. */
  facts?: readonly ReactNode[];
  /** The time the page speaks of: "Tue 02:40". */
  clock?: ReactNode;
  /** At most one primary button, and others before it. */
  actions?: ReactNode;
  /** A way back: a link with its word. */
  back?: ReactNode;
  /** `bar` stands over full-height screens; `page` over pages that scroll. */
  look?: 'bar' | 'page';
  className?: string;
}>;

const looks = {
  bar: 'min-h-14 border-b bg-ground px-4 py-2 md:px-5',
  page: 'px-4 pt-6 pb-5 md:px-8',
} as const;

export function PageHeader({ title, facts = [], clock, actions, back, look = 'page', className }: PageHeaderProps) {
  return (
    <header
      className={classNames('flex shrink-0 flex-wrap items-center gap-x-6 gap-y-2 print:px-0', looks[look], className)}
    >
      <div className="flex min-w-0 flex-1 basis-72 flex-wrap items-baseline gap-x-6 gap-y-1">
        {back ? <p className="-mb-1 basis-full text-sm text-soft">{back}</p> : null}
        <h1 className={classNames('min-w-0 font-bold', look === 'bar' ? 'text-xl' : 'text-2xl')}>{title}</h1>
        {facts.map((fact, index) => (
          <p key={index} className="text-soft">
            {fact}
          </p>
        ))}
      </div>
      {clock || actions ? (
        <div className="flex flex-wrap items-center gap-x-5 gap-y-2 print:hidden">
          {clock ? <p className="font-mono text-lg whitespace-nowrap">{clock}</p> : null}
          {actions ? <div className="flex flex-wrap gap-2.5">{actions}</div> : null}
        </div>
      ) : null}
    </header>
  );
}

export type PageBodyProps = Readonly<{ children: ReactNode; className?: string }>;

/** The margins of a page that scrolls, under a `page` header. */
export function PageBody({ children, className }: PageBodyProps) {
  return <div className={classNames('grid gap-8 px-4 pb-12 md:px-8 print:px-0', className)}>{children}</div>;
}
