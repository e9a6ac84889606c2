import { previewNetworkImport } from '@/db/commands/preview-network-import';
import { findLastMapping, findNetworkBounds } from '@/db/queries/network-imports';
import { UploadNetworkQuery, UploadNetworkReply } from '@/lib/contracts/network';
import { suggestAttribution } from '@/lib/geo/attribution';
import { type NetworkWarning } from '@/lib/geo/network';
import { checkPlace } from '@/lib/geo/place-check';
import { boundsOf } from '@/lib/geo/extent';

import { readGeoJson } from '@/lib/geo/read-geojson';
import { Problem } from '@/lib/problem';
import { handle, personOf } from '@/lib/server/handle';
import { readFile } from './read-file';

const guessedEncoding: NetworkWarning = {
  kind: 'unreadable-tag',
  sentence: 'The file is not UTF-8; it was read as Windows-1252. Check names with accents.',
  sourceIds: [],
  at: null,
};

/** Takes a file of roads as the body and keeps it as a preview; the network itself is not touched. */
export const POST = handle(
  { action: 'setup.roads', query: UploadNetworkQuery, reply: UploadNetworkReply },
  async ({ request, query, actor }) => {
    const { text, sha256, isGuessedEncoding } = await readFile(request);
    const reading = readGeoJson(text);
    if (!reading.ok) {
      const [happened = '', ...todo] = reading.sentence.split(/(?<=[.!])\s+/);
      throw new Problem('unreadable-file', { reason: happened, todo: todo.join(' ') });
    }
    const { lines, skipped, warnings } = reading;
    const place = checkPlace(boundsOf(lines.map(({ positions }) => positions)), await findNetworkBounds());
    const source = query.source ?? query.fileName.replace(/\.[^.]*$/, '').slice(0, 80);
    return previewNetworkImport({
      fileName: query.fileName,
      sha256,
      source,
      attribution: query.attribution ?? suggestAttribution(lines),
      mapping: await findLastMapping({ source }),
      payload: { lines, skipped, warnings: [...warnings, ...place, ...(isGuessedEncoding ? [guessedEncoding] : [])] },
      by: personOf(actor).id,
      now: new Date(),
    });
  },
);
