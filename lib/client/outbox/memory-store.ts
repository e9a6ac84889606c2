import { type Entry, type OutboxStore } from './store';

export function createMemoryStore(): OutboxStore {
  const entries: Entry[] = [];
  return {
    add: async (message) => {
      if (!entries.some((entry) => entry.message.id === message.id)) entries.push({ message, refusal: null });
    },
    list: async () => [...entries],
    remove: async (id) => {
      const index = entries.findIndex((entry) => entry.message.id === id);
      if (index >= 0) entries.splice(index, 1);
    },
    refuse: async (id, refusal) => {
      const entry = entries.find((candidate) => candidate.message.id === id);
      if (entry) entry.refusal = refusal;
    },
  };
}
