'use client';

import { useQuery } from '@tanstack/react-query';
import { brineOf, type Curves } from '@/components/roads/brine-of';
import { ChosenRoad } from '@/components/roads/chosen-road';
import { type Storm } from '@/components/roads/decode-storm';
import { type RoadFacts, type RoadNow } from '@/components/roads/road-now';
import { type LastTreatment, type Treatment } from '@/components/roads/treatment-words';
import { reasonInWords, whyInWords } from '@/components/roads/why-words';
import { useUnits } from '@/components/ui/units';
import { plannedWhyQuery } from '@/lib/client/queries/storm-state';
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
    isPloughed: planned.isPloughed[row] === 1,
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
  const system = useUnits();
  const row = storm.rowById.get(road.id);
  const treatment = row === undefined ? null : treatmentOf(storm, row);
  const planId = storm.view.plan?.id ?? 0;
  const { data: source } = useQuery({
    ...plannedWhyQuery({ planId, segmentId: road.id }),
    enabled: treatment !== null,
  });
  if (row === undefined || !facts) return null;
  const { materials, stations } = storm.view;
  const rateGPerM2 = treatment?.rateGPerM2 ?? null;
  const context = { materials, stations, materialName: treatment?.materialName ?? null, rateGPerM2, zone, system };
  const reason = source?.why ? reasonInWords(source.why, context) : treatment?.reason;
  return (
    <ChosenRoad
      className={className ?? ''}
      road={road}
      facts={facts}
      treatment={treatment && { ...treatment, reason: reason ?? '' }}
      last={lastOf(storm, row)}
      brine={brineOf(storm, { row, at: cursorAt }, curves)}
      why={source ? whyInWords(source, context) : null}
      zone={zone}
      nowAt={nowAt}
      noPlan={
        storm.view.isClosed
          ? 'The storm is over. What was done stands in the Ledger.'
          : 'No treatment is worked out for this road yet.'
      }
    />
  );
}
