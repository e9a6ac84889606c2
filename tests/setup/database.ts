import { inject } from 'vitest';
import { closeDatabase } from '@/db/connection';
import { resetEnv } from '@/lib/server/env';
import { copyTemplate, dropDatabase } from './database-server';
import './provided';

export interface TestDatabase {
  url: string;
  close: () => Promise<void>;
}

/** An empty migrated database of the test file's own; from here on the code under test is connected to it. */
export async function testDatabase(): Promise<TestDatabase> {
  const adminUrl = inject('adminUrl');
  const url = await copyTemplate(adminUrl, inject('templateName'));
  await closeDatabase();
  process.env.DATABASE_URL = url;
  resetEnv();
  return {
    url,
    close: async () => {
      await closeDatabase();
      await dropDatabase(adminUrl, url);
    },
  };
}
