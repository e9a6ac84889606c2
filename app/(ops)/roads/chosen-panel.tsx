'use client';

import { brineOf, type Curves } from '@/components/roads/brine-of';
import { ChosenRoad } from '@/components/roads/chosen-road';
import { type Storm } from '@/components/roads/decode-storm';
import { type RoadFacts, type RoadNow } from '@/components/roads/road-now';
import { type LastTreatment, type Treatment } from '@/components/roads/treatment-words';
import { plannedActions } from '@/lib/contracts/storm-state';

type ChosenPanelProps = Readonly<{
  storm: Storm;
  road: RoadNow;
  facts: RoadFacts | undefined;
  cursorAt: number;
  nowAt: number;
  zone: string;
  curves: Curves;
  className?: string;
}>;

function treatmentOf({ view }: Storm, row: number): Treatment | null {
  const { plan, planned, materials } = view;
  const action = plannedActions[planned?.actions[row] ?? -1];
  if (!plan || !planned || !action) return null;
  return {
    action,
    materialName: materials[planned.materials[row] ?? -1]?.name ?? null,
    rateGPerM2: planned.ratesGPerM2[row] ?? null,
    rateMlPerM2: planned.ratesMlPerM2[row] ?? null,
    reason: planned.reasonTexts[planned.reasons[row] ?? -1] ?? '',
    isPublished: plan.publishedAt !== null,
    passNumber: plan.passNumber,
  };
}

function lastOf(storm: Storm, row: number): LastTreatment | null {
  return storm.lastByRow.get(row) ?? null;
}

/** The chosen road with what the storm says of it. */
export function ChosenPanel({ storm, road, facts, cursorAt, nowAt, zone, curves, className }: ChosenPanelProps) {
  const row = storm.rowById.get(road.id);
  if (row === undefined || !facts) return null;
  return (
    <ChosenRoad
      className={className ?? ''}
      road={road}
      facts={facts}
      treatment={treatmentOf(storm, row)}
      last={lastOf(storm, row)}
      brine={brineOf(storm, { row, at: cursorAt }, curves)}
      why={null}
      zone={zone}
      nowAt={nowAt}
      noPlan="No treatment is worked out for this road yet."
    />
  );
}
