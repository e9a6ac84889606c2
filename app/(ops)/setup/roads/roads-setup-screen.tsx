'use client';

import { type Route } from 'next';
import { useRouter } from 'next/navigation';
import { useRef, useState, useTransition } from 'react';
import { DropZone, type UploadState } from '@/components/setup/roads/drop-zone';
import { ImportsTable } from '@/components/setup/roads/imports-table';
import { RoadFilter, type RoadFilterValues } from '@/components/setup/roads/road-filter';
import { type ListedRoad, RoadForm } from '@/components/setup/roads/road-form';
import { RoadsTable } from '@/components/setup/roads/roads-table';
import { counted } from '@/components/setup/roads/words';
import { useAnnounce } from '@/components/ui/announcements';
import { Button } from '@/components/ui/button';
import { Sheet } from '@/components/ui/dialog';
import { EmptyState } from '@/components/ui/empty-state';
import { Figure } from '@/components/ui/figure';
import { PageBody, PageHeader } from '@/components/ui/page-header';
import { Section } from '@/components/ui/section';
import { useSubmission } from '@/components/ui/use-submission';
import { type NetworkImportRow, type SegmentFilter } from '@/lib/contracts/network';
import { type ProblemView } from '@/lib/problem';
import { BackToSetup } from '../back';
import { changeSegmentAction } from './actions';
import { uploadNetwork } from './upload-network';

interface Totals {
  segments: number;
  lengthM: number;
  laneM: number;
}

export type RoadsSetupScreenProps = Readonly<{
  zone: string;
  imports: readonly NetworkImportRow[];
  roads: readonly ListedRoad[];
  filter: SegmentFilter;
  shown: Totals;
  totals: Totals;
  pages: number;
  attributions: readonly string[];
}>;

export function RoadsSetupScreen(props: RoadsSetupScreenProps) {
  const { zone, imports, totals, attributions } = props;
  return (
    <>
      <PageHeader
        back={<BackToSetup />}
        title="Roads"
        facts={[
          totals.segments === 0 ? (
            'No roads yet'
          ) : (
            <>
              {counted(totals.segments, 'road')} in use,{' '}
              <Figure value={totals.lengthM} quantity="distance" size="inline" />,{' '}
              <Figure value={totals.laneM} quantity="laneDistance" size="inline" />
            </>
          ),
        ]}
      />
      <PageBody>
        <Section title="Import roads from a file" className="max-w-4xl">
          <LoadFile />
        </Section>
        {imports.length > 0 ? (
          <Section title="Imports">
            <ImportsTable imports={imports} zone={zone} />
          </Section>
        ) : null}
        <Section title="Roads in use">
          {totals.segments === 0 ? (
            <EmptyState title="There are no roads yet.">
              Import a file of centre lines above; look at the preview, then save it.
            </EmptyState>
          ) : (
            <RoadsInUse {...props} />
          )}
        </Section>
        {attributions.length > 0 ? <p className="text-sm text-soft">Road data: {attributions.join('; ')}.</p> : null}
      </PageBody>
    </>
  );
}

function LoadFile() {
  const router = useRouter();
  const [upload, setUpload] = useState<UploadState | null>(null);
  const [problem, setProblem] = useState<ProblemView | null>(null);
  const stop = useRef<AbortController | null>(null);
  const send = async (file: File) => {
    stop.current = new AbortController();
    setProblem(null);
    setUpload({ fileName: file.name, fraction: 0 });
    const onProgress = (fraction: number | null) => setUpload({ fileName: file.name, fraction });
    const result = await uploadNetwork({ file, onProgress, signal: stop.current.signal });
    if (result.ok) {
      router.push(`/setup/roads/${result.id}` as Route);
      return;
    }
    setUpload(null);
    setProblem(result.problem);
  };
  return (
    <DropZone
      upload={upload}
      problem={problem}
      onFile={(file) => void send(file)}
      onStop={() => stop.current?.abort()}
    />
  );
}

function addressOf(values: RoadFilterValues, page = 1): Route {
  const filled = Object.entries({ ...values, page: page > 1 ? String(page) : '' }).filter(([, value]) => value !== '');
  return `/setup/roads?${new URLSearchParams(filled)}` as Route;
}

function RoadsInUse({ roads, filter, shown, totals, pages }: RoadsSetupScreenProps) {
  const router = useRouter();
  const announce = useAnnounce();
  const [isMoving, startMoving] = useTransition();
  const [chosenId, setChosenId] = useState<number | null>(null);
  const change = useSubmission(changeSegmentAction, () => {
    setChosenId(null);
    announce('Saved. A repeated import of its file leaves this road as you set it.');
  });
  const { find, serviceClass, assumed, page } = filter;
  const values = { find, serviceClass, assumed };
  const go = (address: Route) => startMoving(() => router.replace(address, { scroll: false }));
  const chosen = roads.find((road) => road.id === chosenId);
  return (
    <div aria-busy={isMoving}>
      <RoadFilter key={find} values={values} onChange={(next) => go(addressOf(next))} />
      {shown.segments === 0 ? (
        <EmptyState title="No road is like that." action={<Button onClick={() => go('/setup/roads')}>Show all</Button>}>
          Take a part of the name, or another class.
        </EmptyState>
      ) : (
        <>
          <RoadsTable roads={roads} onChange={setChosenId} />
          <Pages page={page} pages={pages} onGo={(next) => go(addressOf(values, next))}>
            {shown.segments === totals.segments
              ? counted(shown.segments, 'road')
              : `${counted(shown.segments, 'road')} of ${totals.segments}`}
            , <Figure value={shown.laneM} quantity="laneDistance" size="inline" />
          </Pages>
        </>
      )}
      <Sheet
        isOpen={chosen !== undefined}
        onOpenChange={(isOpen) => setChosenId(isOpen ? chosenId : null)}
        title={chosen?.name ?? ''}
        description={chosen?.source ? `From ${chosen.source}` : undefined}
      >
        {chosen ? <RoadForm key={chosen.id} road={chosen} submission={change} /> : null}
      </Sheet>
    </div>
  );
}

type PagesProps = Readonly<{ page: number; pages: number; onGo: (page: number) => void; children: React.ReactNode }>;

function Pages({ page, pages, onGo, children }: PagesProps) {
  return (
    <div className="mt-3 flex flex-wrap items-center gap-x-4 gap-y-2 print:hidden">
      <p className="mr-auto text-soft">{children}</p>
      {pages > 1 ? (
        <>
          <Button disabledReason={page <= 1 ? 'This is the first page.' : null} onClick={() => onGo(page - 1)}>
            Before
          </Button>
          <p>
            Page {page} of {pages}
          </p>
          <Button disabledReason={page >= pages ? 'This is the last page.' : null} onClick={() => onGo(page + 1)}>
            Next
          </Button>
        </>
      ) : null}
    </div>
  );
}
