import { RunParams, RunView } from '@/lib/contracts/runs';
import { handle, personOf } from '@/lib/server/handle';
import { runSubject } from '@/lib/server/run-subject';
import { readRun } from '@/lib/server/run-view';

export const GET = handle(
  { action: 'run.view', params: RunParams, reply: RunView, subject: ({ params }) => runSubject(params.id) },
  ({ params, actor }) => readRun(params.id, personOf(actor).unitSystem),
);
