import { http, HttpResponse } from 'msw';
import { describe, expect, it } from 'vitest';
import { presentProblem, Problem } from '@/lib/problem';
import { CrewView } from '@/lib/contracts/crew';
import { Recorded } from '@/lib/contracts/runs';
import { network } from '../../tests/setup/msw';
import { ask, Refused } from './api';
import { sendToServer } from './outbox/send';
import { type KeptMessage } from './outbox/store';

const at = (path: string) => `${location.origin}${path}`;
const id = '00000001-0000-4000-8000-000000000000';
const message: KeptMessage = {
  version: 1,
  id,
  kind: 'finish-run',
  madeAt: '2026-12-01T02:40:00Z',
  payload: { runId: id, finishedAt: '2026-12-01T02:40:00Z' },
};
const refuse = (problem: Problem) => {
  const view = presentProblem(problem);
  return HttpResponse.json(view, { status: view.status, headers: { 'content-type': 'application/problem+json' } });
};

describe('asking the server', () => {
  it('reads a reply through its contract, and drops what the contract does not name', async () => {
    const reply = { ...CrewView.parse({ trucks: [], drivers: [] }), secret: 'not for the glass' };
    network.use(http.get(at('/api/crew'), () => HttpResponse.json(reply)));
    expect(await ask('/api/crew', CrewView)).toEqual({ trucks: [], drivers: [] });
  });

  it('throws the server’s own words when it refuses', async () => {
    network.use(http.get(at('/api/crew'), () => refuse(new Problem('not-signed-in'))));
    const refused: unknown = await ask('/api/crew', CrewView).catch((error: unknown) => error);
    expect(refused).toBeInstanceOf(Refused);
    expect((refused as Refused).view).toMatchObject({ status: 401, title: 'You are not signed in.' });
  });

  it('says that the server could not be reached when the line is dead', async () => {
    network.use(http.get(at('/api/crew'), () => HttpResponse.error()));
    await expect(ask('/api/crew', CrewView)).rejects.toThrow('The server could not be reached.');
  });
});

describe('sending a kept message', () => {
  it('sends it as it was kept and takes both answers of a repeat as sent', async () => {
    const bodies: unknown[] = [];
    network.use(
      http.post(at('/api/outbox'), async ({ request }) => {
        bodies.push(await request.json());
        return HttpResponse.json(Recorded.parse({ id, result: bodies.length > 1 ? 'already-recorded' : 'recorded' }));
      }),
    );
    expect(await sendToServer(message)).toEqual({ sent: true });
    expect(await sendToServer(message)).toEqual({ sent: true });
    expect(bodies).toEqual([message, message]);
  });

  it('waits when the server is busy or the person signed out, and is refused when the server will never take it', async () => {
    const answers = [new Problem('busy'), new Problem('not-signed-in'), new Problem('not-found', { what: 'run' })];
    network.use(http.post(at('/api/outbox'), () => refuse(answers.shift() ?? new Problem('busy'))));
    const results = [await sendToServer(message), await sendToServer(message), await sendToServer(message)];
    expect(results.map((result) => !result.sent && result.isRefused)).toEqual([false, false, true]);
  });
});
