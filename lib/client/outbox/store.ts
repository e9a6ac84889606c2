import { type z } from 'zod';
import { type OutboxMessage } from '@/lib/contracts/runs';

/** A message as it is kept and sent: times are text, so that what is stored is what travels. */
export type KeptMessage = z.input<typeof OutboxMessage>;

export interface Entry {
  message: KeptMessage;
  /** the server's sentence when it will not take the message; such an entry stays and is shown */
  refusal: string | null;
}

/** Where messages wait. Two implementations: the tablet's IndexedDB, and memory for tests. */
export interface OutboxStore {
  add: (message: KeptMessage) => Promise<void>;
  /** oldest first */
  list: () => Promise<Entry[]>;
  remove: (id: string) => Promise<void>;
  refuse: (id: string, refusal: string) => Promise<void>;
}
