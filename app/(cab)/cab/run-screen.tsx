'use client';

import { useQuery } from '@tanstack/react-query';
import { type ReactNode, useState } from 'react';
import { LoadSheet } from '@/components/cab/load-sheet';
import { leftKg, roadNow, roadsNext, withPending, askedOf } from '@/components/cab/progress';
import { type CabMaterialChoice } from '@/components/cab/material-choice';
import { RateSheet } from '@/components/cab/rate-sheet';
import { RoadPanel } from '@/components/cab/road-panel';
import { RunButtons } from '@/components/cab/run-buttons';
import { RunEnd } from '@/components/cab/run-end';
import { SidePanel } from '@/components/cab/side-panel';
import { SkipSheet } from '@/components/cab/skip-sheet';
import { Notice } from '@/components/ui/notice';
import { Progress } from '@/components/ui/progress';
import { newId } from '@/lib/client/new-id';
import { type Entry, type KeptMessage } from '@/lib/client/outbox/store';
import { runQuery } from '@/lib/client/queries/runs';
import { type RunRoad } from '@/lib/contracts/runs';
import { loggedHere, messageOf, roadDone } from './messages';

export type RunScreenProps = Readonly<{
  runId: string;
  kept: { entries: readonly Entry[]; sent: readonly KeptMessage[] };
  materials: readonly CabMaterialChoice[];
  yards: readonly { id: number; name: string }[];
  header: (title: string, subtitle: string) => ReactNode;
  notices: ReactNode;
  keep: (message: KeptMessage) => Promise<void>;
  onLeave: () => void;
}>;

type OpenSheet =
  { kind: 'rate'; road: RunRoad; isCorrection: boolean } | { kind: 'skip'; road: RunRoad } | { kind: 'load' };

export function RunScreen({ runId, kept, materials, yards, header, notices, keep, onLeave }: RunScreenProps) {
  const { data, error } = useQuery(runQuery(runId));
  const [chosen, setChosen] = useState<number | null>(null);
  const [sheet, setSheet] = useState<OpenSheet | null>(null);
  const nameOf = (id: number) => materials.find((material) => material.id === id)?.name ?? '';

  if (!data)
    return (
      <>
        {header('Cab', 'Fetching the run')}
        {notices}
        <main className="grid max-w-xl gap-4 p-6">
          {error ? (
            <Notice
              tone="caution"
              title="The run could not be fetched."
              todo="It is kept and is tried again by itself."
            />
          ) : (
            <Progress label="Fetching the run" />
          )}
        </main>
      </>
    );

  const run = withPending(data, loggedHere(kept, runId, nameOf));
  const now = roadNow(run, chosen);
  const log = (road: RunRoad, done: Omit<Parameters<typeof roadDone>[0], 'runId' | 'segmentId'>) => {
    setSheet(null);
    setChosen(null);
    void keep(roadDone({ runId, segmentId: road.segmentId, ...done }));
  };
  const asShown = (road: RunRoad) => {
    const asked = askedOf(road);
    if (asked === 'spread')
      log(road, {
        outcome: 'spread',
        materialId: road.materialId,
        rateGPerM2: road.rateGPerM2,
        isPloughed: road.isPloughed,
      });
    else if (asked === 'ploughed') log(road, { outcome: 'ploughed', isPloughed: true });
    else log(road, { outcome: 'skipped', note: 'Nothing asked for by the plan' });
  };
  const subtitle = [
    run.routeName ? `${run.routeName} route` : 'Own list of roads',
    run.passNumber ? `pass ${run.passNumber}` : '',
  ]
    .filter(Boolean)
    .join(', ');

  return (
    <div className="flex min-h-dvh flex-col">
      {header(`Truck ${run.truckNumber}`, subtitle)}
      {notices}
      <main className="grid flex-1 lg:grid-cols-[1fr_minmax(20rem,26rem)]">
        <div className="flex flex-col justify-between gap-8 p-6">
          {now ? <RoadPanel road={now} /> : <RunEnd run={run} onTakeAnother={onLeave} />}
          <RunButtons
            road={now}
            isFinished={run.finishedAt !== null}
            onDone={asShown}
            onRate={(road) => setSheet({ kind: 'rate', road, isCorrection: false })}
            onSkip={(road) => setSheet({ kind: 'skip', road })}
            onLoad={() => setSheet({ kind: 'load' })}
            onFinish={() => {
              void keep(messageOf('finish-run', newId(), { runId, finishedAt: new Date().toISOString() })).then(
                onLeave,
              );
            }}
          />
        </div>
        <SidePanel
          run={run}
          next={roadsNext(run, now)}
          onChoose={setChosen}
          onCorrect={(road) => setSheet({ kind: 'rate', road, isCorrection: true })}
        />
      </main>
      {sheet?.kind === 'rate' ? (
        <RateSheet
          road={sheet.road}
          materials={materials}
          maxRateGPerM2={run.maxRateGPerM2}
          isCorrection={sheet.isCorrection}
          onClose={() => setSheet(null)}
          onSave={({ materialId, rateGPerM2 }) =>
            log(sheet.road, {
              outcome: 'spread',
              materialId,
              rateGPerM2,
              rateSource: 'typed',
              isPloughed: sheet.road.isPloughed,
              amendsId: sheet.isCorrection ? sheet.road.entryId : null,
            })
          }
        />
      ) : null}
      {sheet?.kind === 'skip' ? (
        <SkipSheet
          roadName={sheet.road.name}
          onClose={() => setSheet(null)}
          onSkip={(note) => log(sheet.road, { outcome: 'skipped', note })}
        />
      ) : null}
      {sheet?.kind === 'load' ? (
        <LoadSheet
          yards={yards}
          materials={materials}
          hopperKg={run.hopperKg}
          leftKg={leftKg(run)}
          onClose={() => setSheet(null)}
          onSave={(load) => {
            const id = newId();
            setSheet(null);
            void keep(messageOf('load', id, { id, runId, ...load, loadedAt: new Date().toISOString() }));
          }}
        />
      ) : null}
    </div>
  );
}
