'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { classNames } from '@/components/ui/class-names';
import { RefreezeRow } from './refreeze-row';
import { type RoadNow } from './road-now';

export type RefreezeListProps = Readonly<{
  /** In order: what refreezes first stands first. */
  roads: readonly RoadNow[];
  selectedId: number | null;
  /** How far the forecast reaches from the cursor. */
  longestMin: number;
  onSelect: (id: number) => void;
  onPoint?: (id: number | null) => void;
  className?: string;
}>;

const shownAtFirst = 40;
const heads = ['hold', 'next', 'slack'];
const ignore = () => undefined;

/** Which road refreezes first, and will a truck be there before it does: the map's twin in words. */
export function RefreezeList({
  roads,
  selectedId,
  longestMin,
  onSelect,
  onPoint = ignore,
  className,
}: RefreezeListProps) {
  const [isAll, setIsAll] = useState(false);
  const shown = isAll ? roads : roads.slice(0, shownAtFirst);
  const chosen =
    selectedId === null || shown.some((road) => road.id === selectedId)
      ? undefined
      : roads.find((road) => road.id === selectedId);
  return (
    <section aria-label="Refreezes first" className={classNames('@container flex min-h-0 flex-col', className)}>
      <header className="flex items-baseline gap-1.5 border-b px-4 py-2 @[26rem]:gap-2">
        <h2 className="flex-1 font-bold whitespace-nowrap">Refreezes first</h2>
        {heads.map((word) => (
          <span
            key={word}
            aria-hidden
            className="w-[3.1rem] text-right text-sm whitespace-nowrap text-soft @[26rem]:w-[3.75rem]"
          >
            {word}
            {word === 'next' ? <span className="hidden @[26rem]:inline"> pass</span> : null}
          </span>
        ))}
      </header>
      <div className="relative min-h-0 flex-1 overflow-y-auto">
        <ol>
          {[...shown, ...(chosen ? [chosen] : [])].map((road) => (
            <RefreezeRow
              key={road.id}
              road={road}
              isChosen={road.id === selectedId}
              longestMin={longestMin}
              onSelect={onSelect}
              onPoint={onPoint}
            />
          ))}
        </ol>
        {roads.length > shownAtFirst ? (
          <p className="px-4 py-3">
            <Button size="small" variant="quiet" onClick={() => setIsAll(!isAll)}>
              {isAll ? `Show the first ${shownAtFirst}` : `Show all ${roads.length} roads`}
            </Button>
          </p>
        ) : null}
      </div>
    </section>
  );
}
