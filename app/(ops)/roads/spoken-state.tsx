'use client';

import { useEffect, useState } from 'react';
import { bandWords, marginBands } from '@/components/roads/margin-band';
import { type RoadNow } from '@/components/roads/road-now';
import { type RoadsAt } from '@/components/roads/roads-at';
import { LiveText } from '@/components/ui/announcements';
import { spanInWords } from '@/lib/time/format';

type SpokenStateProps = Readonly<{ shown: RoadsAt; first: RoadNow | undefined; time: string }>;

const restsMs = 900;

function inWords({ shown, first, time }: SpokenStateProps): string {
  const counts = [...marginBands]
    .reverse()
    .filter((band) => shown.counts[band] > 0)
    .map((band) => `${shown.counts[band]} ${bandWords[band]}`);
  const hold =
    first?.holdMin === null || first?.holdMin === undefined || !Number.isFinite(first.holdMin) ? null : first.holdMin;
  const worst = first && hold !== null ? ` First ${first.name}, holds ${spanInWords(hold)}.` : '';
  return `At ${time}: ${counts.join(', ')}.${worst}`;
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
