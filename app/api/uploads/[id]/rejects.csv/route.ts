import { findUpload, listRejects, type RejectRecord } from '@/db/queries/uploads';
import { UploadParams } from '@/lib/contracts/readings';
import { Problem } from '@/lib/problem';
import { rejectsCsv, rejectsHead } from '@/lib/readings/rejects-csv';
import { handle } from '@/lib/server/handle';

const ROWS_AT_ONCE = 2000;

async function* pages(uploadId: number): AsyncGenerator<string> {
  yield rejectsHead;
  let after: RejectRecord | undefined;
  do {
    const rejects = await listRejects({ uploadId, after, limit: ROWS_AT_ONCE });
    if (rejects.length > 0) yield rejectsCsv(rejects);
    after = rejects.length < ROWS_AT_ONCE ? undefined : rejects.at(-1);
  } while (after);
}

/** The rows of an upload that were not taken, with line, column and reason. */
export const GET = handle(
  { action: 'readings.import', params: UploadParams, reply: 'response' },
  async ({ params }) => {
    const upload = await findUpload({ id: params.id });
    if (!upload) throw new Problem('not-found', { what: 'upload' });
    const rows = pages(upload.id);
    const encoder = new TextEncoder();
    const stream = new ReadableStream<Uint8Array>({
      pull: async (controller) => {
        const { done, value } = await rows.next();
        if (done) controller.close();
        else controller.enqueue(encoder.encode(value));
      },
      cancel: async () => {
        await rows.return(undefined);
      },
    });
    return new Response(stream, {
      headers: {
        'content-type': 'text/csv; charset=utf-8',
        'content-disposition': `attachment; filename="rejected-rows-${upload.id}.csv"`,
        'cache-control': 'no-store',
      },
    });
  },
);
