'use client';

import { type ReactNode, useState } from 'react';
import { BrineChart } from '@/components/charts/brine-chart';
import { type BrineContent } from '@/components/charts/brine-content';
import { Button } from '@/components/ui/button';
import { classNames } from '@/components/ui/class-names';
import { Figure } from '@/components/ui/figure';
import { Tag } from '@/components/ui/tag';
import { formatTime, relativeInWords } from '@/lib/time/format';
import { bandWords } from './margin-band';
import { Rate } from './rate';
import { surfaceInWords, type RoadFacts, type RoadNow } from './road-now';
import { type LastTreatment, type Treatment } from './treatment-words';
import { type WhyContent } from './why-content';
import { WhySheet } from './why-sheet';

export type ChosenRoadProps = Readonly<{
  road: RoadNow;
  facts: RoadFacts;
  treatment: Treatment | null;
  last: LastTreatment | null;
  brine: BrineContent | null;
  why: WhyContent | null;
  zone: string;
  nowAt: number;
  /** What stands where the rate would, when no plan covers this road. */
  noPlan: ReactNode;
  onOpenWhy?: () => void;
  className?: string;
}>;

/** The chosen road: what to put down and why, and its brine against the freezing curve. */
export function ChosenRoad(props: ChosenRoadProps) {
  const { road, facts, treatment, last, brine, why, zone, nowAt, noPlan, onOpenWhy, className } = props;
  const [isWhyOpen, setIsWhyOpen] = useState(false);
  const openWhy = () => {
    onOpenWhy?.();
    setIsWhyOpen(true);
  };
  return (
    <section aria-label="Chosen road" className={classNames('grid min-w-0 content-start gap-2 px-4 py-3', className)}>
      <header className="flex flex-wrap items-baseline justify-between gap-x-4">
        <h2 className="text-lg font-bold">{road.name}</h2>
        <p className="text-sm text-soft">
          <Figure value={facts.laneM} quantity="laneDistance" digits={2} size="inline" />, {surfaceInWords(facts)}
        </p>
      </header>
      {treatment ? (
        <>
          <div className="flex items-start justify-between gap-4">
            <Rate treatment={treatment} />
            <Button size="small" onClick={openWhy} aria-haspopup="dialog">
              Why
            </Button>
          </div>
          <p className="text-soft">
            {treatment.reason}{' '}
            {treatment.isPublished ? null : <span className="text-ink">Draft for pass {treatment.passNumber}.</span>}
          </p>
        </>
      ) : (
        <div className="text-soft">{noPlan}</div>
      )}
      <p className="flex flex-wrap items-center gap-x-3 text-sm text-soft">
        <Tag tone={road.band === 'unknown' ? 'plain' : road.band}>{bandWords[road.band]}</Tag>
        {road.band === 'unknown' ? (
          <span>No current data. Do not treat as clear.</span>
        ) : (
          <span>
            margin <Figure value={road.freezeMarginC} quantity="temperatureDifference" signed size="inline" />
          </span>
        )}
        <span>{lastInWords(last, { zone, nowAt })}</span>
      </p>
      {brine ? <BrineChart content={brine} zone={zone} /> : null}
      {treatment && why ? (
        <WhySheet
          isOpen={isWhyOpen}
          onOpenChange={setIsWhyOpen}
          roadName={road.name}
          reason={treatment.reason}
          why={why}
          nowAt={nowAt}
        />
      ) : null}
    </section>
  );
}

function lastInWords(last: LastTreatment | null, { zone, nowAt }: { zone: string; nowAt: number }): string {
  if (!last) return 'not treated in this storm';
  const did = last.outcome === 'spread' ? 'treated' : last.outcome;
  return `${did} ${formatTime(last.at, zone)} (${relativeInWords(last.at, nowAt)}), truck ${last.truckNumber}`;
}
