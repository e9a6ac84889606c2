'use client';

import { stormTitle } from '@/components/storm/storm-words';
import { PageHeader } from '@/components/ui/page-header';
import { formatDayTime } from '@/lib/time/format';
import { type StormStateView } from '@/lib/contracts/storm-state';
import { PassAction } from './pass-action';
import { type RoadsScreenProps } from './roads-screen';

type StormHeaderProps = Pick<RoadsScreenProps, 'storm' | 'may' | 'zone'> &
  Readonly<{ state: StormStateView | null; nowAt: number; roadCount: number }>;

const counted = (count: number, one: string, many: string) => `${count} ${count === 1 ? one : many}`;

function factsOf(state: StormStateView | null, roadCount: number): string[] {
  if (!state) return [counted(roadCount, 'road', 'roads')];
  const loading = state.trucksOut.filter((truck) => truck.isLoading).length;
  const out = counted(state.trucksOut.length - loading, 'truck out', 'trucks out');
  const treated = `${state.treatedThisPass} of ${roadCount} roads treated this pass`;
  return [state.isClosed ? 'over' : loading > 0 ? `${out}, ${loading} loading` : out, treated];
}

/** What storm, what time, what is going on, and the one thing to do next. */
export function StormHeader({ storm, state, may, zone, nowAt, roadCount }: StormHeaderProps) {
  const title = storm ? stormTitle(storm) : 'Roads';
  return (
    <PageHeader
      look="bar"
      title={title}
      facts={factsOf(state, roadCount)}
      actions={state ? <PassAction state={state} may={may} nowAt={nowAt} /> : null}
      clock={nowAt > 0 ? formatDayTime(nowAt, zone) : undefined}
    />
  );
}
