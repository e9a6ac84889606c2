'use server';

import { finishRun as finish } from '@/db/commands/finish-run';
import { recordLoad as load } from '@/db/commands/record-load';
import { recordSpreadEntry as record } from '@/db/commands/record-spread-entry';
import { startRun as start } from '@/db/commands/start-run';
import { FinishRunInput, LoadInput, SpreadEntryInput, StartRunInput } from '@/lib/contracts/runs';
import { action } from '@/lib/server/action';
import { runSubject, startSubject } from '@/lib/server/run-subject';

export const startRun = action(
  {
    action: 'run.start',
    input: StartRunInput,
    subject: async ({ input, actor }) => startSubject(input.driverId, actor.id),
    revalidate: ['/cab'],
  },
  ({ input, actor }) => start({ input, by: actor.id, now: new Date() }),
);

export const recordSpreadEntry = action(
  { action: 'run.log', input: SpreadEntryInput, subject: ({ input }) => runSubject(input.runId) },
  ({ input, actor }) => record({ entry: input, by: actor.id, now: new Date() }),
);

export const recordLoad = action(
  { action: 'load.record', input: LoadInput, subject: ({ input }) => runSubject(input.runId) },
  ({ input, actor }) => load({ load: input, by: actor.id, now: new Date() }),
);

export const finishRun = action(
  {
    action: 'run.finish',
    input: FinishRunInput,
    subject: ({ input }) => runSubject(input.runId),
    revalidate: ['/cab'],
  },
  ({ input, actor }) => finish({ input, by: actor.id, now: new Date() }),
);
