import { type OutboxMessage, type Recorded } from '@/lib/contracts/runs';
import { finishRun } from './finish-run';
import { recordLoad } from './record-load';
import { recordSpreadEntry } from './record-spread-entry';
import { startRun } from './start-run';

interface Apply {
  message: OutboxMessage;
  by: number;
  now: Date;
}

/** A tablet's kept message, by the same commands that the page's actions call. */
export function applyOutboxMessage({ message, by, now }: Apply): Promise<Recorded> {
  switch (message.kind) {
    case 'start-run':
      return startRun({ input: message.payload, by, now });
    case 'spread-entry':
      return recordSpreadEntry({ entry: message.payload, by, now });
    case 'load':
      return recordLoad({ load: message.payload, by, now });
    case 'finish-run':
      return finishRun({ input: message.payload, by, now });
  }
}
