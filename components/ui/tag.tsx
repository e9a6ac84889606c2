import { type ReactNode } from 'react';
import { classNames } from './class-names';

export type TagTone = 'plain' | 'lamp' | 'frozen' | 'urgent' | 'closing' | 'hold' | 'safe';

const strokes: Readonly<Record<TagTone, string>> = {
  plain: 'border-faint',
  lamp: 'border-lamp',
  frozen: 'border-frozen border-dashed',
  urgent: 'border-urgent',
  closing: 'border-closing',
  hold: 'border-hold',
  safe: 'border-safe',
};

const words: Readonly<Record<TagTone, string>> = {
  plain: 'text-soft',
  lamp: 'text-lamp',
  frozen: 'text-frozen',
  urgent: 'text-urgent',
  closing: 'text-closing',
  hold: 'text-hold',
  safe: 'text-soft',
};

export type TagProps = Readonly<{ tone?: TagTone; children: ReactNode; className?: string }>;

/** A state as a word, with a short stroke of its colour before it; frozen is dashed, as on the map. */
export function Tag({ tone = 'plain', children, className }: TagProps) {
  return (
    <span className={classNames('inline-flex items-center gap-1.5 whitespace-nowrap', words[tone], className)}>
      <span aria-hidden className={classNames('w-3.5 border-t-[3px]', strokes[tone])} />
      {children}
    </span>
  );
}
