import { findRun } from '@/db/queries/runs';
import { type OutboxMessage } from '@/lib/contracts/runs';
import { type Subject } from '@/lib/permissions';
import { Problem } from '@/lib/problem';

/** Whose run it is; there must be one. */
export async function runSubject(runId: string): Promise<Subject> {
  const run = await findRun({ id: runId });
  if (!run) throw new Problem('not-found', { what: 'run' });
  return { driverId: run.driverId };
}

/** A run that is just starting belongs to the driver named, or to the one who starts it. */
export function startSubject(driverId: number | null, actorId: number): Subject {
  return { driverId: driverId ?? actorId };
}

export async function outboxSubject(message: OutboxMessage, actorId: number): Promise<Subject> {
  return message.kind === 'start-run'
    ? startSubject(message.payload.driverId, actorId)
    : runSubject(message.payload.runId);
}
