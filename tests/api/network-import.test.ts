import { beforeAll, describe, expect, it } from 'vitest';
import { NetworkImportView, UploadNetworkReply } from '@/lib/contracts/network';
import { signedOut, signInOverHttp, type Session } from '../setup/http';
import { personOf } from '../setup/people';

/*
 *  a ── b ── c     one line, and one that leaves it at b: three roads.
 *       d          Far out at sea, so that it touches nothing of the demo.
 */
const file = (name = 'Test Road') =>
  JSON.stringify({
    type: 'FeatureCollection',
    features: [
      road('t1', { highway: 'tertiary', name }, [
        [-40, 10],
        [-40.001, 10],
        [-40.002, 10],
      ]),
      road('t2', { highway: 'residential', oneway: 'yes', other_tags: '"lanes"=>"2"' }, [
        [-40.001, 10],
        [-40.001, 10.001],
      ]),
    ],
  });
const road = (id: string, properties: Record<string, string>, coordinates: number[][]) => ({
  type: 'Feature',
  properties: { osm_id: id, ...properties },
  geometry: { type: 'LineString', coordinates },
});

let administrator: Session;
let dispatcher: Session;
beforeAll(async () => {
  administrator = await signInOverHttp(personOf.administrator);
  dispatcher = await signInOverHttp(personOf.dispatcher);
});

const address = (name: string) => `/api/import/network?fileName=${encodeURIComponent(name)}`;
const send = (session: Session, body: BodyInit, name = 'ladder.geojson') =>
  session.fetch(address(name), { method: 'POST', body });
const readView = async (id: number) =>
  NetworkImportView.parse(await (await administrator.fetch(`/api/import/network/${id}`)).json());

describe('POST /api/import/network', () => {
  it('401 for nobody, 403 for a dispatcher, 400 without a file name', async () => {
    expect((await send(signedOut(), file())).status).toBe(401);
    const refused = await send(dispatcher, file());
    expect(refused.status).toBe(403);
    expect(await refused.json()).toMatchObject({ code: 'not-allowed' });
    expect((await administrator.fetch('/api/import/network', { method: 'POST', body: file() })).status).toBe(400);
  });

  it.each([
    ['empty', '', 'The file is empty.'],
    ['cut off', file().slice(0, 200), 'The file breaks off before its end'],
    ['points only', JSON.stringify({ type: 'FeatureCollection', features: [] }), 'The file holds no features'],
    ['projected', file().replaceAll('-40', '4468000'), 'look projected'],
  ])('422 with a sentence for a file that is %s', async (_, body, sentence) => {
    const answer = await send(administrator, body);
    expect(answer.status).toBe(422);
    const { title, detail } = (await answer.json()) as { title: string; detail: string };
    expect(`${title} ${detail}`).toContain(sentence);
    expect(detail).toContain('Nothing was changed.');
  });

  it('413 for 60 MB', async () => {
    expect((await send(administrator, Buffer.alloc(60 * 1024 * 1024, 32))).status).toBe(413);
  });

  it('200 with a preview; the same file again is the same preview, and the roads are not saved', async () => {
    const { id } = UploadNetworkReply.parse(await (await send(administrator, file())).json());
    const again = UploadNetworkReply.parse(await (await send(administrator, file())).json());
    expect(again.id).toBe(id);
    const view = await readView(id);
    expect(view).toMatchObject({
      state: 'previewed',
      source: 'ladder',
      attribution: '© OpenStreetMap contributors, ODbL 1.0',
      report: { linesRead: 2, segments: 3, nodes: 4, oneWaySegments: 1 },
      changes: { added: 3, changed: 0, same: 0, retired: 0 },
    });
    expect(view.roads.map(({ lanes }) => lanes)).toEqual([2, 2, 2]);
  });
});

describe('GET /api/import/network/[id]', () => {
  it('401, 403, 400 and 404', async () => {
    expect((await signedOut().fetch('/api/import/network/1')).status).toBe(401);
    expect((await dispatcher.fetch('/api/import/network/1')).status).toBe(403);
    expect((await administrator.fetch('/api/import/network/x')).status).toBe(400);
    expect((await administrator.fetch('/api/import/network/999999')).status).toBe(404);
  });
});
