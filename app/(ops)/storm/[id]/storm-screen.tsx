'use client';

import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { ClassesTable } from '@/components/storm/classes-table';
import { ForecastNotice } from '@/components/storm/forecast-notice';
import { PassesTable } from '@/components/storm/passes-table';
import { PlanPanel } from '@/components/storm/plan-panel';
import { passToDecide, type PlanVersion, type StormContent } from '@/components/storm/storm-content';
import { stormTitle } from '@/components/storm/storm-words';
import { VersionsTable } from '@/components/storm/versions-table';
import { useAnnounce } from '@/components/ui/announcements';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { EmptyState } from '@/components/ui/empty-state';
import { ProblemNotice } from '@/components/ui/notice';
import { PageBody, PageHeader } from '@/components/ui/page-header';
import { Section } from '@/components/ui/section';
import { useNow } from '@/components/ui/use-now';
import { useSubmission } from '@/components/ui/use-submission';
import { formatDayTime } from '@/lib/time/format';
import { closeStorm, publish, workOut } from '../actions';

export type StormScreenProps = Readonly<{
  content: StormContent;
  refusals: Readonly<{ open: string | null; workOut: string | null; publish: string | null }>;
}>;

/** Why the newest version cannot be published, or null. */
function publishRefusal(newest: PlanVersion | undefined, content: StormContent, refused: string | null): string | null {
  if (refused) return refused;
  if (content.storm.closedAt !== null) return 'The storm is closed.';
  if (!newest) return 'Nothing has been worked out yet.';
  return newest.publishedAt === null ? null : `Version ${newest.version} is published already.`;
}

function useStormWork() {
  const router = useRouter();
  const announce = useAnnounce();
  const [busyPass, setBusyPass] = useState<number | null>(null);
  const [chosenId, setChosenId] = useState<number | null>(null);
  const done = (words: string) => {
    announce(words);
    router.refresh();
  };
  const working = useSubmission(workOut, ({ planId, version }) => {
    setChosenId(planId);
    done(`Worked out: version ${version} is a draft.`);
  });
  const publishing = useSubmission(publish, () => done('Published. Drivers see it now.'));
  const closing = useSubmission(closeStorm, () => done('The storm is closed.'));
  const start = (stormId: number, passNumber: number) => {
    setBusyPass(passNumber);
    working.send({ stormId, passNumber });
  };
  return { working, publishing, closing, start, busyPass: working.isSending ? busyPass : null, chosenId, setChosenId };
}

export function StormScreen({ content, refusals }: StormScreenProps) {
  const { storm, plans, zone } = content;
  const nowAt = useNow() ?? content.nowAt;
  const { working, publishing, closing, start, busyPass, chosenId, setChosenId } = useStormWork();
  const [isClosing, setIsClosing] = useState(false);
  const newest = plans[0];
  const shown = plans.find(({ id }) => id === chosenId) ?? newest;
  const next = passToDecide(content, nowAt);
  const isDraft = newest?.publishedAt === null && storm.closedAt === null;
  return (
    <>
      <PageHeader
        back={
          <Link href="/storm" className="underline underline-offset-4">
            Storms
          </Link>
        }
        title={stormTitle(storm)}
        facts={[
          `${formatDayTime(storm.fromAt, zone)} to ${formatDayTime(storm.untilAt, zone)}`,
          storm.closedAt === null ? 'open' : `closed ${formatDayTime(storm.closedAt, zone)}`,
        ]}
        actions={
          <>
            {storm.closedAt === null ? (
              <Button disabledReason={refusals.open} onClick={() => setIsClosing(true)}>
                Close the storm
              </Button>
            ) : null}
            {isDraft || !next ? (
              <Button
                variant="primary"
                disabledReason={publishRefusal(newest, content, refusals.publish)}
                isBusy={publishing.isSending}
                busyLabel="Publishing"
                onClick={() => newest && publishing.send({ planId: newest.id })}
              >
                {newest ? `Publish pass ${newest.passNumber}` : 'Publish'}
              </Button>
            ) : (
              <Button
                variant="primary"
                disabledReason={refusals.workOut}
                isBusy={busyPass !== null}
                busyLabel={`Working out pass ${busyPass ?? next.number}`}
                onClick={() => start(storm.id, next.number)}
              >
                Work out pass {next.number}
              </Button>
            )}
          </>
        }
      />
      <PageBody>
        <ProblemNotice problem={working.problem ?? publishing.problem ?? closing.problem} />
        {storm.closedAt === null ? <ForecastNotice forecast={content.forecast} zone={zone} nowAt={nowAt} /> : null}
        <div className="grid items-start gap-x-10 gap-y-8 xl:grid-cols-[minmax(0,1fr)_minmax(20rem,28rem)]">
          <Section title="Passes">
            <PassesTable
              content={content}
              nowAt={nowAt}
              refusal={refusals.workOut}
              busyPass={busyPass}
              onWorkOut={(passNumber) => start(storm.id, passNumber)}
            />
          </Section>
          <Section
            title="Promises"
            lead={content.policyVersion === null ? 'default policy' : `policy ${content.policyVersion}`}
          >
            <ClassesTable classes={content.classes} />
          </Section>
        </div>
        {shown ? (
          <PlanPanel plan={shown} currency={content.currency} zone={zone} />
        ) : (
          <EmptyState title="No pass has been worked out yet.">
            Working one out takes the newest readings and forecast, what was spread so far, and the promise of each
            class, and gives every road its least rate. It stays a draft until you publish it.
          </EmptyState>
        )}
        {plans.length > 0 ? (
          <Section title="Versions" lead="None is ever changed or removed">
            <VersionsTable plans={plans} zone={zone} chosenId={shown?.id ?? null} onChoose={setChosenId} />
          </Section>
        ) : null}
      </PageBody>
      <Dialog
        isOpen={isClosing}
        onOpenChange={setIsClosing}
        title={`Close storm ${storm.number}?`}
        description="No more plans can be worked out or published for it. What was planned and logged stays."
      >
        <Button
          variant="danger"
          isBusy={closing.isSending}
          busyLabel="Closing"
          onClick={() => {
            closing.send({ stormId: storm.id });
            setIsClosing(false);
          }}
        >
          Close the storm
        </Button>
      </Dialog>
    </>
  );
}
