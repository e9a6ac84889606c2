import { Recorded } from '@/lib/contracts/runs';
import { ask, Refused } from '../api';
import { isWorthRetrying, type SendResult } from './outbox';
import { type KeptMessage } from './store';

/** One message to the server's outbox handler. */
export async function sendToServer(message: KeptMessage): Promise<SendResult> {
  try {
    await ask('/api/outbox', Recorded, { method: 'POST', body: message });
    return { sent: true };
  } catch (error) {
    if (!(error instanceof Refused)) throw error;
    return { sent: false, isRefused: !isWorthRetrying(error.view), problem: error.view };
  }
}
