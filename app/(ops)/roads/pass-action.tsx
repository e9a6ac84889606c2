'use client';

import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useAnnounce } from '@/components/ui/announcements';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { ProblemNotice } from '@/components/ui/notice';
import { useSubmission } from '@/components/ui/use-submission';
import { stormStateQuery } from '@/lib/client/queries/storm-state';
import { type StormStateView } from '@/lib/contracts/storm-state';
import { publish, workOut } from '../storm/actions';
import { type RoadsScreenProps } from './roads-screen';

type PassActionProps = Readonly<{ state: StormStateView; may: RoadsScreenProps['may']; nowAt: number }>;

const reasonOf = (decision: RoadsScreenProps['may']['publish']) => (decision.allowed ? null : decision.reason);

/** The one thing to do next: publish the draft; without one, work out the next pass. */
export function PassAction({ state, may, nowAt }: PassActionProps) {
  if (state.isClosed) return null;
  if (state.plan && state.plan.publishedAt === null) return <PublishPass state={state} plan={state.plan} may={may} />;
  const planned = new Set(state.plans.map((plan) => plan.passNumber));
  const next = state.passes.find((pass) => pass.startsAt > nowAt && !planned.has(pass.number));
  return next ? <WorkOutPass state={state} passNumber={next.number} may={may} /> : null;
}

function useAfter(stormId: number): (words: string) => void {
  const announce = useAnnounce();
  const queries = useQueryClient();
  return (words) => {
    announce(words);
    void queries.invalidateQueries({ queryKey: stormStateQuery(stormId).queryKey });
  };
}

type WorkOutProps = Omit<PassActionProps, 'nowAt'> & Readonly<{ passNumber: number }>;

function WorkOutPass({ state, passNumber, may }: WorkOutProps) {
  const after = useAfter(state.stormId);
  const working = useSubmission(workOut, () =>
    after(`Pass ${passNumber} is worked out. It is a draft until published.`),
  );
  return (
    <>
      <Button
        variant="primary"
        disabledReason={reasonOf(may.workOut)}
        isBusy={working.isSending}
        busyLabel={`Working out pass ${passNumber}`}
        onClick={() => working.send({ stormId: state.stormId, passNumber })}
      >
        Work out pass {passNumber}
      </Button>
      <ProblemNotice problem={working.problem} className="basis-full" />
    </>
  );
}

type PublishProps = Omit<PassActionProps, 'nowAt'> & Readonly<{ plan: NonNullable<StormStateView['plan']> }>;

function PublishPass({ state, plan, may }: PublishProps) {
  const [isAsking, setIsAsking] = useState(false);
  const after = useAfter(state.stormId);
  const publishing = useSubmission(publish, () => {
    setIsAsking(false);
    after(`Pass ${plan.passNumber} is published. Drivers see it now.`);
  });
  const actions = state.planned?.actions ?? [];
  const treated = actions.filter((action) => action > 0).length;
  return (
    <>
      <Button variant="primary" disabledReason={reasonOf(may.publish)} onClick={() => setIsAsking(true)}>
        Publish pass {plan.passNumber}
      </Button>
      <Dialog
        isOpen={isAsking}
        onOpenChange={setIsAsking}
        title={`Publish pass ${plan.passNumber}?`}
        description={`Version ${plan.version} treats ${treated} of ${actions.length} roads. Drivers see it at once, and it never changes: working the pass out again makes a new version.`}
      >
        <ProblemNotice problem={publishing.problem} className="mb-4" />
        <p className="mb-4 text-soft">
          Rates are decision support: local policy, product labels and licensed practice decide.
        </p>
        <Button
          variant="primary"
          isBusy={publishing.isSending}
          busyLabel="Publishing"
          onClick={() => publishing.send({ planId: plan.id })}
        >
          Publish it
        </Button>
      </Dialog>
    </>
  );
}
