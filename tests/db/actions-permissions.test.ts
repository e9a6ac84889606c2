import { readdirSync } from 'node:fs';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { can, mayEver, roles, type Action, type Role } from '@/lib/permissions';
import { type ActionResult } from '@/lib/problem';
import { testDatabase, type TestDatabase } from '../setup/database';

/** Every server action × every role, through the wrapper itself. Only the session is stood in for. */
let role: Role | null = null;
vi.mock('@/lib/server/session', () => ({
  getActor: async () =>
    role && { id: 1, name: 'Somebody', role, email: 's@example', unitSystem: 'metric', theme: 'system' },
}));
vi.mock('next/cache', () => ({ revalidatePath: () => undefined }));

const root = path.resolve(import.meta.dirname, '../..');
const files = readdirSync(path.join(root, 'app'), { recursive: true, encoding: 'utf8' }).filter((file) =>
  file.endsWith('actions.ts'),
);

type Act = ((input: unknown) => Promise<ActionResult<unknown>>) & Record<symbol, Action>;
const madeByAction = Symbol.for('rimewright.action');

let db: TestDatabase;
beforeAll(async () => {
  db = await testDatabase();
});
afterAll(() => db.close());

describe.each(files)('%s', (file) => {
  it('refuses the signed-out and every role the table refuses, before it reads what was sent', async () => {
    const doors = (await import(path.join(root, 'app', file))) as Record<string, Act>;
    const made = Object.entries(doors).filter(([, act]) => typeof act === 'function');
    expect(made.length).toBeGreaterThan(0);
    for (const [name, act] of made) {
      const action = act[madeByAction];
      if (!action) throw new Error(`${name} of ${file} was not made by action()`);
      role = null;
      expect(await act({}), `${name}, signed out`).toMatchObject({ ok: false, problem: { code: 'not-signed-in' } });
      for (role of roles) {
        const result = await act({ nonsense: true });
        const code = result.ok ? 'done' : result.problem.code;
        if (mayEver(role, action)) expect(code, `${name} as ${role}`).not.toBe('not-signed-in');
        else expect(code, `${name} as ${role}`).toBe('not-allowed');
        if (can({ id: 1, name: '', role }, action).allowed) expect(code, `${name} as ${role}`).not.toBe('not-allowed');
      }
    }
  });
});
