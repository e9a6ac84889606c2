'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { recordLoad } from '@/app/(cab)/cab/actions';
import { LoadDialog } from '@/components/yard/load-dialog';
import { LoadsTable, type LoadRow } from '@/components/yard/loads-table';
import { YardList, type YardRow } from '@/components/yard/yard-list';
import { useAnnounce } from '@/components/ui/announcements';
import { Button } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { PageBody, PageHeader } from '@/components/ui/page-header';
import { Section } from '@/components/ui/section';
import { useSubmission } from '@/components/ui/use-submission';
import { newId } from '@/lib/client/new-id';

export type YardScreenProps = Readonly<{
  zone: string;
  yards: readonly YardRow[];
  loads: readonly LoadRow[];
  runs: readonly { id: string; label: string }[];
  materials: readonly { id: number; name: string }[];
  loadRefusal: string | null;
}>;

export function YardScreen({ zone, yards, loads, runs, materials, loadRefusal }: YardScreenProps) {
  const router = useRouter();
  const announce = useAnnounce();
  const [isOpen, setIsOpen] = useState(false);
  const submission = useSubmission(recordLoad, () => {
    setIsOpen(false);
    announce('Load recorded.');
    router.refresh();
  });
  const reason = loadRefusal ?? (runs.length === 0 ? 'No truck is out on a run to load.' : null);
  return (
    <>
      <PageHeader
        title="Yard"
        facts={[`${loads.length === 60 ? 'Last 60' : loads.length} loads on record`]}
        actions={
          <Button variant="primary" disabledReason={reason} onClick={() => setIsOpen(true)}>
            Record a load
          </Button>
        }
      />
      <PageBody>
        <Section title="Yards" lead="Loads of the last 24 hours">
          {yards.length === 0 ? (
            <EmptyState title="There is no yard yet.">An administrator adds yards in Set-up, Fleet.</EmptyState>
          ) : (
            <YardList yards={yards} />
          )}
        </Section>
        <Section title="Loads">
          {loads.length === 0 ? (
            <EmptyState title="Nothing has been loaded yet.">
              A load is recorded here or by the driver in the cab, once a truck is on a run.
            </EmptyState>
          ) : (
            <LoadsTable loads={loads} zone={zone} />
          )}
        </Section>
        <p className="max-w-prose text-sm text-soft">
          Keep between no truck and loader; chock wheels; never reach into a running auger. Salt heaps can slump and
          spilled brine is slippery.
        </p>
      </PageBody>
      {isOpen ? (
        <LoadDialog
          runs={runs}
          yards={yards}
          materials={materials}
          problem={submission.problem}
          isSending={submission.isSending}
          onClose={() => setIsOpen(false)}
          onSave={(load) => submission.send({ id: newId(), ...load, loadedAt: new Date().toISOString() })}
        />
      ) : null}
    </>
  );
}
