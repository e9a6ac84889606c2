'use client';

import { useSearchParams } from 'next/navigation';
import { assessBrine, type AssessedBrine } from '@/components/bench/assess-brine';
import { BrineFigures } from '@/components/bench/brine-figures';
import { BrineCautions } from '@/components/bench/cautions';
import { CurvesTable } from '@/components/bench/curves-table';
import { HowKnown } from '@/components/bench/how-known';
import { LiquidusChart } from '@/components/bench/liquidus-chart';
import { OnTheShelf } from '@/components/bench/on-the-shelf';
import { ReadingForm } from '@/components/bench/reading-form';
import { Refusal } from '@/components/bench/refusal';
import { TankChange } from '@/components/bench/tank-change';
import { type BenchProduct } from '@/components/bench/tonight-row';
import { TonightTable } from '@/components/bench/tonight-table';
import { useAnnounce } from '@/components/ui/announcements';
import { Button } from '@/components/ui/button';
import { PageBody, PageHeader } from '@/components/ui/page-header';
import { Section } from '@/components/ui/section';
import { BenchQuery } from '@/lib/contracts/bench';
import { saltName } from '@/lib/brine/salts';

export type BenchScreenProps = Readonly<{
  materials: readonly BenchProduct[];
  currency: string;
  /** The coldest road that was just measured. */
  road: { tempC: number; words: string } | null;
}>;

const UNMEASURED_ROAD_C = -6;

const asProduct = (brine: AssessedBrine): BenchProduct => ({
  key: 'this',
  name: 'this brine',
  isLiquid: true,
  composition: { [brine.salt]: brine.massFraction },
  waterMassFraction: 1 - brine.massFraction,
  densityKgPerM3: brine.densityAt60FKgPerM3 ?? 1000,
  costCentsPerTonne: null,
  practicalMinimumC: null,
});

/** What stands in the address is the state: a link shows another person the same brine. */
function useBench(): [BenchQuery, (change: Partial<BenchQuery>) => void] {
  const parameters = useSearchParams();
  const bench = BenchQuery.parse(Object.fromEntries(parameters));
  const change = (next: Partial<BenchQuery>) => {
    const text = new URLSearchParams(window.location.search);
    for (const [key, value] of Object.entries(next)) text.set(key, String(value));
    window.history.replaceState(null, '', `?${text.toString()}`);
  };
  return [bench, change];
}

export function BenchScreen({ materials, currency, road }: BenchScreenProps) {
  const announce = useAnnounce();
  const [bench, change] = useBench();
  const assessed = assessBrine(bench);
  const brine = assessed.ok ? assessed : null;
  const roadC = bench.roadC ?? road?.tempC ?? UNMEASURED_ROAD_C;
  const copy = () => {
    navigator.clipboard.writeText(window.location.href).then(
      () => announce('Link copied: it opens this brine.'),
      () => announce('The browser does not let pages copy. Take the link from the address bar.'),
    );
  };
  return (
    <>
      <PageHeader
        title="Brine bench"
        facts={['What a brine does, from any reading you can take of it']}
        actions={<Button onClick={copy}>Copy link</Button>}
      />
      <PageBody className="grid-cols-[minmax(0,1fr)] gap-x-10 lg:grid-cols-[17rem_minmax(0,1fr)] lg:grid-rows-[auto_1fr] xl:grid-cols-[17rem_minmax(0,1fr)_21rem]">
        <Section title="Reading">
          <ReadingForm bench={bench} onChange={change} />
        </Section>
        <div className="grid content-start gap-5 lg:row-span-2">
          {assessed.ok ? <BrineFigures brine={assessed} /> : <Refusal refused={assessed} salt={bench.salt} />}
          <LiquidusChart
            salt={bench.salt}
            roadC={roadC}
            brine={brine && { ...brine, freezingPointC: brine.freezing.freezingPointC }}
          />
          <CurvesTable />
        </div>
        <Section title="Tank" className="lg:col-start-1">
          {brine ? (
            <TankChange bench={bench} brine={brine} onChange={change} />
          ) : (
            <p className="text-soft">Once the brine is known, this says what to stir in.</p>
          )}
        </Section>
        <div className="grid content-start gap-8 lg:col-span-2 lg:grid-cols-2 xl:col-span-1 xl:col-start-3 xl:row-span-2 xl:row-start-1 xl:grid-cols-1">
          <Section
            title="For tonight’s road"
            lead={bench.roadC === undefined ? (road?.words ?? 'No reading in three hours; typed figures') : 'As typed'}
            className="lg:row-span-2 xl:row-span-1"
          >
            <TonightTable
              products={brine ? [asProduct(brine), ...materials] : materials}
              roadC={roadC}
              waterMm={bench.waterMm}
              currency={currency}
              onChange={change}
            />
          </Section>
          {brine ? (
            <Section title="On the shelf" lead={saltName[brine.salt]}>
              <OnTheShelf brine={brine} />
            </Section>
          ) : null}
          <Section title="How this is known">
            <HowKnown brine={brine} />
          </Section>
          <Section title="Handling">
            <BrineCautions />
          </Section>
        </div>
      </PageBody>
    </>
  );
}
