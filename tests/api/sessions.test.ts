import pg from 'pg';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { signInOverHttp } from '../setup/http';

/** Sessions end when a person is disabled or the role changes; attempts are limited. */
let db: pg.Client;
const harker = { email: 'n.harker@skerrow.example', password: 'skerrow-demo' };
const tully = { email: 'c.tully@skerrow.example', password: 'skerrow-demo' };

beforeAll(async () => {
  db = new pg.Client(inject('databaseUrl'));
  await db.connect();
});
afterAll(() => db.end());

describe('sessions', () => {
  it('end at once when the person is disabled', async () => {
    const session = await signInOverHttp(harker);
    expect((await session.fetch('/cab')).status).toBe(200);
    await db.query('update people set is_disabled = true, session_version = session_version + 1 where email = $1', [
      harker.email,
    ]);
    expect((await session.fetch('/api/crew')).status).toBe(401);
    await expect(signInOverHttp(harker)).rejects.toThrow('CredentialsSignin');
  });

  it('end at once when the role changes', async () => {
    const session = await signInOverHttp(tully);
    expect((await session.fetch('/api/crew')).status).toBe(403);
    await db.query(`update people set role = 'observer', session_version = session_version + 1 where email = $1`, [
      tully.email,
    ]);
    expect((await session.fetch('/api/crew')).status).toBe(401);
    expect((await (await signInOverHttp(tully)).fetch('/api/crew')).status).toBe(200);
  });

  it('are refused after eight wrong passwords, even with the right one', async () => {
    const email = 's.wick@skerrow.example';
    for (let attempt = 0; attempt < 8; attempt += 1)
      await expect(signInOverHttp({ email, password: `wrong ${attempt}` })).rejects.toThrow('CredentialsSignin');
    await expect(signInOverHttp({ email, password: 'skerrow-demo' })).rejects.toThrow('too-many-attempts');
  });

  it('do not tell an unknown address from a wrong password', async () => {
    await expect(signInOverHttp({ email: 'nobody@skerrow.example', password: 'x' })).rejects.toThrow(
      'CredentialsSignin',
    );
  });
});
