import { applyOutboxMessage } from '@/db/commands/apply-outbox-message';
import { OutboxMessage, Recorded } from '@/lib/contracts/runs';
import { handle, personOf } from '@/lib/server/handle';
import { outboxSubject } from '@/lib/server/run-subject';

/** Where a tablet sends what it kept: one message at a time, oldest first, harmless to repeat. */
export const POST = handle(
  {
    action: 'run.log',
    body: OutboxMessage,
    reply: Recorded,
    subject: ({ body, actor }) => outboxSubject(body, actor.id),
  },
  ({ body, actor }) => applyOutboxMessage({ message: body, by: personOf(actor).id, now: new Date() }),
);
