import { type ReactNode } from 'react';
import { classNames } from './class-names';

export type EmptyStateProps = Readonly<{
  /** What is not there yet. */
  title: ReactNode;
  /** What to do next. */
  children: ReactNode;
  action?: ReactNode;
  className?: string;
}>;

export function EmptyState({ title, children, action, className }: EmptyStateProps) {
  return (
    <div className={classNames('grid max-w-prose gap-1 py-8', className)}>
      <p className="text-lg font-bold">{title}</p>
      <p className="text-soft">{children}</p>
      {action ? <div className="mt-3 flex flex-wrap gap-2">{action}</div> : null}
    </div>
  );
}
