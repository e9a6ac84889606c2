import { type ProblemView } from '@/lib/problem';
import { type Entry, type KeptMessage, type OutboxStore } from './store';

/**
 *            add                    sent
 *   page ───────────▶ waiting ───────────────▶ gone (the server has it)
 *                      ▲   │ not reached: wait, then again (back-off)
 *                      └───┘
 *                          │ refused
 *                          ▼
 *                       kept and shown, never dropped
 */
export type SendResult = { sent: true } | { sent: false; isRefused: boolean; problem: ProblemView };

/** Delay before trying again after `failures` in a row, ms: 2 s doubling to 60 s. */
export function backOffMs(failures: number): number {
  return Math.min(60_000, 2_000 * 2 ** Math.max(0, failures - 1));
}

/** Whether a problem means "not now" rather than "never": the message then waits. */
export function isWorthRetrying(problem: ProblemView): boolean {
  return problem.status === 401 || problem.status === 429 || problem.status >= 500;
}

interface OutboxOptions {
  store: OutboxStore;
  send: (message: KeptMessage) => Promise<SendResult>;
  onChange: (entries: Entry[]) => void;
  /** the server has it */
  onSent?: (message: KeptMessage) => void;
}

/** Sends what waits, oldest first, one at a time; a message that cannot be sent now stops the line, a refused one does not. */
export function createOutbox({ store, send, onChange, onSent }: OutboxOptions) {
  let flushing: Promise<boolean> | null = null;

  const announce = async () => onChange(await store.list());

  /** The list is read anew for each message, so that one added meanwhile is sent too. */
  const flushOnce = async (): Promise<boolean> => {
    for (;;) {
      const next = (await store.list()).find((entry) => entry.refusal === null);
      if (!next) return true;
      const result = await send(next.message);
      if (result.sent) {
        await store.remove(next.message.id);
        onSent?.(next.message);
      } else if (result.isRefused)
        await store.refuse(next.message.id, `${result.problem.title} ${result.problem.detail}`);
      else return false;
      await announce();
    }
  };

  /** True when nothing waits any more. Calls while one is under way share it. */
  const flush = (): Promise<boolean> => {
    flushing ??= flushOnce().finally(() => {
      flushing = null;
    });
    return flushing;
  };

  return {
    flush,
    /** Kept first, then sent: closing the page in between loses nothing. */
    add: async (message: KeptMessage): Promise<void> => {
      await store.add(message);
      await announce();
    },
    list: () => store.list(),
  };
}

export type Outbox = ReturnType<typeof createOutbox>;
