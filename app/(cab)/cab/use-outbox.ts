'use client';

import { useEffect, useState } from 'react';
import { createIndexedDbStore } from '@/lib/client/outbox/indexed-db-store';
import { backOffMs, createOutbox, isWorthRetrying, type Outbox, type SendResult } from '@/lib/client/outbox/outbox';
import { sendToServer } from '@/lib/client/outbox/send';
import { type Entry, type KeptMessage } from '@/lib/client/outbox/store';
import { finishRun, recordLoad, recordSpreadEntry, startRun } from './actions';

/** By the page's own actions while it is online; their ids change with a release, so the handler is the way that always works. */
async function sendByAction(message: KeptMessage): Promise<SendResult> {
  const result = await callAction(message);
  return result.ok
    ? { sent: true }
    : { sent: false, isRefused: !isWorthRetrying(result.problem), problem: result.problem };
}

function callAction(message: KeptMessage) {
  switch (message.kind) {
    case 'start-run':
      return startRun(message.payload);
    case 'spread-entry':
      return recordSpreadEntry(message.payload);
    case 'load':
      return recordLoad(message.payload);
    case 'finish-run':
      return finishRun(message.payload);
  }
}

async function send(message: KeptMessage): Promise<SendResult> {
  try {
    return await sendByAction(message);
  } catch {
    return sendToServer(message);
  }
}

interface Kept {
  entries: readonly Entry[];
  /** sent since the page opened: the server has them, its next answer will show them */
  sent: readonly KeptMessage[];
  /** Keeps the message on the tablet, then tries to send it. */
  keep: (message: KeptMessage) => Promise<void>;
}

/** The tablet's outbox, sent at start, when the connection comes back, and again with growing pauses. */
export function useOutbox(onFlushed: () => void): Kept {
  const [entries, setEntries] = useState<readonly Entry[]>([]);
  const [sent, setSent] = useState<readonly KeptMessage[]>([]);
  const [outbox, setOutbox] = useState<Outbox | null>(null);

  useEffect(() => {
    const made = createOutbox({
      store: createIndexedDbStore(),
      send,
      onChange: setEntries,
      onSent: (message) => setSent((before) => [...before.slice(-199), message]),
    });
    let failures = 0;
    let timer: ReturnType<typeof setTimeout> | undefined;
    const trySending = async () => {
      clearTimeout(timer);
      const isEmpty = await made.flush();
      failures = isEmpty ? 0 : failures + 1;
      onFlushed();
      if (!isEmpty) timer = setTimeout(() => void trySending(), backOffMs(failures));
    };
    const now = () => void trySending();
    window.addEventListener('online', now);
    void made.list().then((kept) => {
      setEntries(kept);
      setOutbox(made);
      now();
    });
    return () => {
      clearTimeout(timer);
      window.removeEventListener('online', now);
    };
  }, [onFlushed]);

  const keep = async (message: KeptMessage) => {
    if (!outbox) return;
    await outbox.add(message);
    const isEmpty = await outbox.flush();
    onFlushed();
    // The timer of the effect goes on from here; the event starts it.
    if (!isEmpty) window.dispatchEvent(new Event('online'));
  };
  return { entries, sent, keep };
}
