import { describe, expect, it } from 'vitest';
import { unreachable } from '../api';
import { createMemoryStore } from './memory-store';
import { backOffMs, createOutbox, isWorthRetrying, type SendResult } from './outbox';
import { type KeptMessage } from './store';

function finish(n: number): KeptMessage {
  const id = `0000000${n}-0000-4000-8000-000000000000`;
  return {
    version: 1,
    id,
    kind: 'finish-run',
    madeAt: '2026-12-01T02:40:00Z',
    payload: { runId: id, finishedAt: '2026-12-01T02:40:00Z' },
  };
}

function outboxThat(answer: (message: KeptMessage) => SendResult) {
  const sent: string[] = [];
  const counts: number[] = [];
  const outbox = createOutbox({
    store: createMemoryStore(),
    send: async (message) => {
      const result = answer(message);
      sent.push(`${message.id.slice(7, 8)}:${result.sent ? 'sent' : result.isRefused ? 'refused' : 'waits'}`);
      return result;
    },
    onChange: (entries) => counts.push(entries.length),
  });
  return { outbox, sent, counts };
}

describe('outbox', () => {
  it('sends oldest first and forgets only what the server has', async () => {
    const { outbox, sent, counts } = outboxThat(() => ({ sent: true }));
    await outbox.add(finish(1));
    await outbox.add(finish(2));
    expect(await outbox.flush()).toBe(true);
    expect(sent).toEqual(['1:sent', '2:sent']);
    expect(counts).toEqual([1, 2, 1, 0]);
  });

  it('stops at the first that cannot be sent now and keeps all that follow', async () => {
    const { outbox, sent } = outboxThat(() => ({ sent: false, isRefused: false, problem: unreachable }));
    await outbox.add(finish(1));
    await outbox.add(finish(2));
    expect(await outbox.flush()).toBe(false);
    expect(sent).toEqual(['1:waits']);
    expect(await outbox.list()).toHaveLength(2);
  });

  it('keeps a refused message with its reason and goes on with the next', async () => {
    const problem = { ...unreachable, status: 403, title: 'Not yours.', detail: 'Ask.' };
    const { outbox, sent } = outboxThat((message) =>
      message.id.startsWith('00000001') ? { sent: false, isRefused: true, problem } : { sent: true },
    );
    await outbox.add(finish(1));
    await outbox.add(finish(2));
    await outbox.flush();
    await outbox.flush();
    expect(sent).toEqual(['1:refused', '2:sent']);
    expect((await outbox.list()).map((entry) => entry.refusal)).toEqual(['Not yours. Ask.']);
  });

  it('adds the same message once and shares a flush that is under way', async () => {
    const { outbox, sent } = outboxThat(() => ({ sent: true }));
    await outbox.add(finish(1));
    await outbox.add(finish(1));
    await Promise.all([outbox.flush(), outbox.flush()]);
    expect(sent).toEqual(['1:sent']);
  });

  it('sends what is added while a flush is under way', async () => {
    const late: { add?: () => Promise<void> } = {};
    const { outbox, sent } = outboxThat((message) => {
      if (message.id.startsWith('00000001')) void late.add?.();
      return { sent: true };
    });
    late.add = () => outbox.add(finish(2));
    await outbox.add(finish(1));
    await outbox.flush();
    expect(sent).toEqual(['1:sent', '2:sent']);
  });

  it('backs off from 2 s to a minute and retries only what may yet succeed', () => {
    expect([1, 2, 3, 6, 20].map(backOffMs)).toEqual([2000, 4000, 8000, 60_000, 60_000]);
    expect(
      [401, 403, 404, 409, 422, 429, 500, 503].filter((status) => isWorthRetrying({ ...unreachable, status })),
    ).toEqual([401, 429, 500, 503]);
  });
});
