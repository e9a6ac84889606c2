import { ingestReadings } from '@/db/commands/ingest-readings';
import { findAgency } from '@/db/queries/agency';
import { findStation, findStationByKey, findStationMapping } from '@/db/queries/stations';
import { ImportReadingsQuery, MappingInput } from '@/lib/contracts/readings';
import { Problem } from '@/lib/problem';
import { handle } from '@/lib/server/handle';
import { followed, present, type Report } from './answer';
import { readBody } from './read-body';

const MOST_AT_ONCE = 4;
let underWay = 0;

async function stationOfKey(request: Request) {
  const authorization = request.headers.get('authorization');
  if (authorization === null) return null;
  const found = await findStationByKey({ key: authorization.replace(/^Bearer\s+/i, '') });
  if (!found) throw new Problem('key-unknown');
  return found;
}

async function mappingOf(stationId: number, savedAt: string | undefined) {
  const saved = await findStationMapping({ stationId });
  const mapping = MappingInput.safeParse(saved?.mapping);
  if (!saved || !mapping.success) {
    throw new Problem('not-possible-now', {
      reason: 'Nobody has said yet how the files of this station are read.',
      todo: 'Load one file on the screen first (Set-up, Stations): what is said there is remembered.',
    });
  }
  if (savedAt !== undefined && saved.updatedAt.getTime() !== Date.parse(savedAt)) {
    throw new Problem('changed-meanwhile', { what: 'How the files of this station are read' });
  }
  return mapping.data;
}

/** Takes a file of readings as the body, from the screen or from a station's script with its key. */
export const POST = handle(
  { action: 'readings.import', query: ImportReadingsQuery, reply: 'response', machine: stationOfKey },
  async ({ request, query, actor, machine }) => {
    const stationId = machine?.stationId ?? query.station;
    if (stationId === undefined) throw new Problem('invalid-input', {}, { station: 'Say which station it is of.' });
    if (query.station !== undefined && query.station !== stationId) {
      throw new Problem('not-allowed', { reason: 'This key belongs to another station.' });
    }
    if (!(await findStation({ id: stationId }))) throw new Problem('not-found', { what: 'station' });
    const mapping = await mappingOf(stationId, query.mappingSavedAt);
    const { zone } = await findAgency();
    const stop = new AbortController();
    const signal = AbortSignal.any([request.signal, stop.signal]);
    const from = machine
      ? { source: 'script' as const, stationKeyId: machine.keyId }
      : { source: 'screen' as const, personId: actor?.id ?? null };
    const body = readBody(request);
    const { fileName } = query;
    const work = async (onProgress?: Report) => {
      if (underWay >= MOST_AT_ONCE) throw new Problem('busy');
      underWay += 1;
      try {
        const given = { stationId, fileName, body: body.pieces, mapping, from, now: new Date(), signal, onProgress };
        return present(await ingestReadings(given), zone);
      } catch (error) {
        void body.discard();
        throw error;
      } finally {
        underWay -= 1;
      }
    };
    return request.headers.get('accept')?.includes('application/x-ndjson')
      ? followed('POST /api/import/readings', stop, work)
      : Response.json(await work());
  },
);
