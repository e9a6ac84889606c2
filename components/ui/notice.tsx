import { type ReactNode } from 'react';
import { classNames } from './class-names';

export type NoticeTone = 'info' | 'caution' | 'problem' | 'done';

const tones: Readonly<Record<NoticeTone, string>> = {
  info: 'border-hold',
  caution: 'border-urgent',
  problem: 'border-frozen border-dashed',
  done: 'border-closing',
};

export type NoticeProps = Readonly<{
  tone?: NoticeTone;
  /** What happened, in one sentence. */
  title: ReactNode;
  /** What was kept. */
  kept?: ReactNode;
  /** What to do. */
  todo?: ReactNode;
  children?: ReactNode;
  action?: ReactNode;
  className?: string;
}>;

/** Something to be known. A problem interrupts a screen reader; the others wait for their turn. */
export function Notice({ tone = 'info', title, kept, todo, children, action, className }: NoticeProps) {
  return (
    <div
      role={tone === 'problem' ? 'alert' : 'status'}
      className={classNames('grid gap-2 border-l-[3px] bg-panel py-2.5 pr-4 pl-3.5', tones[tone], className)}
    >
      <div className="max-w-prose">
        <p className="font-semibold">{title}</p>
        {kept || todo ? (
          <p className="text-soft">
            {kept} {todo}
          </p>
        ) : null}
        {children ? <div className="text-soft">{children}</div> : null}
      </div>
      {action ? <div className="flex flex-wrap gap-2">{action}</div> : null}
    </div>
  );
}

export type ProblemNoticeProps = Readonly<{
  /** As a server action or an API answer gives it. */
  problem: Readonly<{ title: string; detail: string }> | null | undefined;
  className?: string;
}>;

export function ProblemNotice({ problem, className }: ProblemNoticeProps) {
  return problem ? <Notice tone="problem" title={problem.title} todo={problem.detail} className={className} /> : null;
}
