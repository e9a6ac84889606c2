'use client';

import { useQueryClient } from '@tanstack/react-query';
import { signOut } from 'next-auth/react';
import Link from 'next/link';
import { useCallback, useState } from 'react';
import { CabHeader } from '@/components/cab/cab-header';
import { type CabMaterialChoice } from '@/components/cab/material-choice';
import { type RoadChoiceView } from '@/components/cab/road-picker';
import { TakeRun, type RouteChoice, type TruckChoice } from '@/components/cab/take-run';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { useIsOnline, useNow } from '@/components/ui/use-now';
import { newId } from '@/lib/client/new-id';
import { mayEver, type Actor } from '@/lib/permissions';
import { formatTime } from '@/lib/time/format';
import { messageOf } from './messages';
import { RunScreen } from './run-screen';
import { useOutbox } from './use-outbox';

export type CabScreenProps = Readonly<{
  driver: Actor;
  zone: string;
  openRunId: string | null;
  trucks: readonly TruckChoice[];
  routes: readonly RouteChoice[];
  roads: readonly RoadChoiceView[];
  materials: readonly CabMaterialChoice[];
  yards: readonly { id: number; name: string }[];
}>;

export function CabScreen({ driver, zone, openRunId, trucks, routes, roads, materials, yards }: CabScreenProps) {
  const queryClient = useQueryClient();
  const refresh = useCallback(() => void queryClient.invalidateQueries({ queryKey: ['run'] }), [queryClient]);
  const { entries, sent, keep } = useOutbox(refresh);
  const [runId, setRunId] = useState(openRunId);
  const [isStarting, setIsStarting] = useState(false);
  const isOnline = useIsOnline();
  const now = useNow();
  const refused = entries.filter((entry) => entry.refusal !== null);
  const counts = { waiting: entries.length - refused.length, refused: refused.length, isOnline };
  const clock = now === null ? '' : formatTime(new Date(now), zone);

  const start = async (choice: { truckId: number; routeId: number | null; segmentIds: number[] }) => {
    const id = newId();
    setIsStarting(true);
    await keep(messageOf('start-run', id, { id, ...choice, startedAt: new Date().toISOString() }));
    setRunId(id);
    setIsStarting(false);
  };

  const header = (title: string, subtitle: string) => (
    <CabHeader title={title} subtitle={subtitle} clock={clock} {...counts}>
      <LeaveLinks role={driver.role} waiting={entries.length} />
    </CabHeader>
  );
  const notices = <RefusedNotices sentences={refused.map((entry) => entry.refusal ?? '')} />;

  if (runId === null)
    return (
      <>
        {header('Cab', driver.name)}
        {notices}
        <main>
          <TakeRun
            driverName={driver.name}
            trucks={trucks}
            routes={routes}
            roads={roads}
            isStarting={isStarting}
            onStart={(choice) => void start(choice)}
          />
        </main>
      </>
    );
  return (
    <RunScreen
      key={runId}
      runId={runId}
      kept={{ entries, sent }}
      materials={materials}
      yards={yards}
      header={header}
      notices={notices}
      keep={keep}
      onLeave={() => setRunId(null)}
    />
  );
}

function RefusedNotices({ sentences }: Readonly<{ sentences: readonly string[] }>) {
  if (sentences.length === 0) return null;
  return (
    <div className="grid gap-2 px-6 pt-4">
      {sentences.map((sentence, index) => (
        <Notice
          key={index}
          tone="problem"
          title="The server did not take an entry. It is kept on this tablet."
          todo={sentence}
        />
      ))}
    </div>
  );
}

function LeaveLinks({ role, waiting }: Readonly<{ role: Actor['role']; waiting: number }>) {
  return !mayEver(role, 'roads.view') ? (
    <Button
      variant="quiet"
      className="min-h-12"
      disabledReason={
        waiting > 0 ? 'Entries on this tablet have not been sent yet: they would wait for you to sign in again.' : null
      }
      onClick={() => void signOut({ callbackUrl: '/sign-in' })}
    >
      Sign out
    </Button>
  ) : (
    <Link href="/roads" className="link">
      Office screens
    </Link>
  );
}
