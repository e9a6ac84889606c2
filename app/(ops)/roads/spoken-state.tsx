'use client';

import { useEffect, useState } from 'react';
import { bandWords, marginBands } from '@/components/roads/margin-band';
import { type RoadNow } from '@/components/roads/road-now';
import { type BandsAt } from '@/components/roads/roads-at';
import { LiveText } from '@/components/ui/announcements';
import { spanInWords } from '@/lib/time/format';

type SpokenStateProps = Readonly<{ counts: BandsAt['counts']; first: RoadNow | undefined; time: string }>;

const restsMs = 900;

function inWords({ counts, first, time }: SpokenStateProps): string {
  const words = [...marginBands]
    .reverse()
    .filter((band) => counts[band] > 0)
    .map((band) => `${counts[band]} ${bandWords[band]}`);
  const hold =
    first?.holdMin === null || first?.holdMin === undefined || !Number.isFinite(first.holdMin) ? null : first.holdMin;
  const worst = first && hold !== null ? ` First ${first.name}, holds ${spanInWords(hold)}.` : '';
  return `At ${time}: ${words.join(', ')}.${worst}`;
}

/** What a glance at the map tells, for screen readers, once the cursor rests. */
export function SpokenState(props: SpokenStateProps) {
  const words = inWords(props);
  const [spoken, setSpoken] = useState('');
  useEffect(() => {
    const timer = setTimeout(() => setSpoken(words), restsMs);
    return () => clearTimeout(timer);
  }, [words]);
  return <LiveText>{spoken}</LiveText>;
}
