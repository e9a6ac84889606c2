import { beforeAll, describe, expect, it } from 'vitest';
import { unpackSteps } from '@/lib/contracts/packed-steps';
import { RoadMapView } from '@/lib/contracts/road-map';
import { PlannedWhyView, StormStateView } from '@/lib/contracts/storm-state';
import { signInOverHttp, type Session } from '../setup/http';
import { personOf } from '../setup/people';

let session: Session;
beforeAll(async () => {
  session = await signInOverHttp(personOf.observer);
});

const read = async <T>(path: string, contract: { parse: (value: unknown) => T }): Promise<T> => {
  const response = await session.fetch(path);
  expect(response.status, path).toBe(200);
  return contract.parse(await response.json());
};

/** The demo's storm under way is its second. */
const statePath = '/api/storms/2/state';

describe('the road map', () => {
  it('has every column filled for every road, and the island under them', async () => {
    const map = await read('/api/road-map', RoadMapView);
    const count = map.ids.length;
    expect(count).toBeGreaterThan(300);
    for (const column of [map.nameOf, map.lanes, map.lengthsM, map.surfaceOf, map.exposureOf, map.flags, map.paths]) {
      expect(column).toHaveLength(count);
    }
    expect(map.serviceClasses).toHaveLength(count);
    expect(new Set(map.baseFeatures.map(({ kind }) => kind))).toContain('coast');
  });

  it.each(['/api/road-map', statePath])('%s is not sent again while its tag holds', async (path) => {
    const first = await session.fetch(path);
    const tag = first.headers.get('etag') ?? '';
    expect(tag).toMatch(/^W\/"/);
    const again = await session.fetch(path, { headers: { 'if-none-match': tag } });
    expect(again.status).toBe(304);
    expect(await again.text()).toBe('');
    const other = await session.fetch(path, { headers: { 'if-none-match': 'W/"another"' } });
    expect(other.status).toBe(200);
  });
});

describe('the state of a storm', () => {
  it('has the roads of the map in its order, a row of every step for each', async () => {
    const [map, state] = await Promise.all([read('/api/road-map', RoadMapView), read(statePath, StormStateView)]);
    expect(state.segmentIds).toEqual(map.ids);
    const { count } = state.axis;
    for (const packed of [state.marginC, state.pavementC, state.waterMm, state.massFraction, state.holdSteps]) {
      expect(unpackSteps(packed, count)).toHaveLength(map.ids.length * count);
    }
    expect(state.stations.length).toBeGreaterThan(0);
  });

  it('can say why of a road that its plan covers', async () => {
    const { plan, segmentIds } = await read(statePath, StormStateView);
    const { why, options } = await read(`/api/plans/${plan?.id}/why/${segmentIds[0]}`, PlannedWhyView);
    expect(why?.parts.length).toBeGreaterThan(0);
    expect(options.length).toBeGreaterThan(0);
  });

  it.each([
    ['/api/storms/nought/state', 400],
    ['/api/storms/999999/state', 404],
    ['/api/plans/999999/why/1', 404],
  ])('%s is refused with %i and words', async (path, status) => {
    const response = await session.fetch(path);
    expect(response.status).toBe(status);
    expect(response.headers.get('content-type')).toContain('application/problem+json');
  });
});
