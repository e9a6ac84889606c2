import Dexie, { type Table } from 'dexie';
import { OutboxMessage } from '@/lib/contracts/runs';
import { type Entry, type KeptMessage, type OutboxStore } from './store';

interface Row {
  id: string;
  /** order of arrival, independent of the tablet's clock */
  sequence?: number;
  message: unknown;
  refusal: string | null;
}

/** The tablet's own store. What comes out is parsed again: last month's version may have written it. */
export function createIndexedDbStore(): OutboxStore {
  const db = new Dexie('rimewright-outbox');
  db.version(1).stores({ messages: '++sequence, &id' });
  const messages: Table<Row, number> = db.table('messages');
  return {
    add: async (message) => {
      const known = await messages.where('id').equals(message.id).count();
      if (known === 0) await messages.add({ id: message.id, message, refusal: null });
    },
    list: async () => {
      const rows = await messages.orderBy('sequence').toArray();
      return rows.map(entryOf);
    },
    remove: async (id) => {
      await messages.where('id').equals(id).delete();
    },
    refuse: async (id, refusal) => {
      await messages.where('id').equals(id).modify({ refusal });
    },
  };
}

function entryOf(row: Row): Entry {
  const isUnderstood = OutboxMessage.safeParse(row.message).success;
  return {
    message: row.message as KeptMessage,
    refusal:
      row.refusal ?? (isUnderstood ? null : 'This entry was kept by another version and cannot be sent as it is.'),
  };
}
