import { beforeAll, describe, expect, inject, it } from 'vitest';
import { mayEver, roles, type Action, type Role } from '@/lib/permissions';
import { signedOut, signInOverHttp, type Session } from '../setup/http';
import { personOf } from '../setup/people';

/** Page → the row of the table that opens it. */
const pages: readonly [string, Action][] = [
  ['/roads', 'roads.view'],
  ['/storm', 'storms.view'],
  ['/routes', 'routes.view'],
  ['/crew', 'crew.view'],
  ['/cab', 'cab.use'],
  ['/yard', 'yard.view'],
  ['/ledger', 'ledger.view'],
  ['/bench', 'bench.use'],
  ['/setup', 'setup.view'],
  ['/setup/people', 'setup.people'],
  ['/setup/roads', 'setup.roads'],
  ['/setup/stations', 'readings.import'],
  ['/setup/materials', 'setup.materials'],
  ['/setup/fleet', 'setup.fleet'],
];

/** Route handler that reads → its row. */
const reads: readonly [string, Action][] = [
  ['/api/crew', 'crew.view'],
  ['/api/road-map', 'roads.view'],
  ['/api/storms/1/ledger', 'ledger.view'],
  ['/api/storms/1/ledger.csv', 'ledger.view'],
  ['/api/storms/1/state', 'storms.view'],
];

const sessions = new Map<Role, Session>();
beforeAll(async () => {
  for (const role of roles) sessions.set(role, await signInOverHttp(personOf[role]));
});

describe.each(roles)('as %s', (role) => {
  const session = () => sessions.get(role) ?? signedOut();

  it.each(pages)('page %s opens exactly when the table says so', async (path, action) => {
    const response = await session().fetch(path);
    // A page refuses by sending on to the page that says why; streamed pages do so inside the document.
    const text = await response.text();
    const isRefused = (response.headers.get('location') ?? text).includes('/not-allowed?for=');
    expect(response.status).toBeLessThan(400);
    expect(isRefused, `${role} on ${path}`).toBe(!mayEver(role, action));
  });

  it.each(reads)('%s answers exactly when the table says so', async (path, action) => {
    const response = await session().fetch(path);
    if (mayEver(role, action)) expect(response.status).toBe(200);
    else {
      expect(response.status).toBe(403);
      expect(response.headers.get('content-type')).toContain('application/problem+json');
    }
  });
});

describe('signed out', () => {
  it.each(pages)('page %s sends to sign in', async (path) => {
    const response = await signedOut().fetch(path);
    expect(response.status).toBeGreaterThanOrEqual(302);
    expect(new URL(response.headers.get('location') ?? '', inject('baseUrl')).pathname).toBe('/sign-in');
  });

  it.each([...reads.map(([path]) => ['GET', path] as const), ['POST', '/api/outbox'] as const])(
    '%s %s answers 401 with a sentence',
    async (method, path) => {
      const response = await signedOut().fetch(path, { method, ...(method === 'POST' ? { body: '{}' } : {}) });
      expect(response.status).toBe(401);
      expect(await response.json()).toMatchObject({ code: 'not-signed-in', title: 'You are not signed in.' });
    },
  );

  it('may see the public status page', async () => {
    expect((await signedOut().fetch('/status')).status).toBe(200);
  });
});
