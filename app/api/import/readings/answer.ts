import { type IngestedReadings } from '@/db/commands/ingest-readings';
import { ImportProgressLine, ImportReadingsReply } from '@/lib/contracts/readings';
import { summariseUpload } from '@/lib/readings/summary';
import { viewOf } from '@/lib/server/problems';
import { formatDateTime } from '@/lib/time/format';

export function present(ingested: IngestedReadings, zone: string): ImportReadingsReply {
  const { alreadyReadAt } = ingested;
  return ImportReadingsReply.parse({
    ...ingested,
    alreadyReadAt: alreadyReadAt?.toISOString() ?? null,
    summary: summariseUpload(ingested, alreadyReadAt && formatDateTime(alreadyReadAt, zone)),
  });
}

export type Report = (progress: { kind: 'reading' | 'storing'; rows: number; bytes: number }) => void;

const TOLD_EVERY_MS = 200;

/** The work followed line by line of JSON; the last line is what came of it. Going away stops it. */
export function followed(
  where: string,
  stop: AbortController,
  work: (report: Report) => Promise<ImportReadingsReply>,
): Response {
  const encoder = new TextEncoder();
  let toldAt = 0;
  let isOpen = true;
  const stream = new ReadableStream<Uint8Array>({
    start: async (controller) => {
      const tell = (line: ImportProgressLine) => {
        if (isOpen) controller.enqueue(encoder.encode(`${JSON.stringify(ImportProgressLine.parse(line))}\n`));
      };
      const report: Report = (progress) => {
        const now = performance.now();
        if (progress.kind === 'reading' && now - toldAt < TOLD_EVERY_MS) return;
        toldAt = now;
        tell(progress);
      };
      await work(report).then(
        (reply) => tell({ kind: 'done', reply }),
        (thrown: unknown) => tell({ kind: 'problem', problem: viewOf(thrown, where) }),
      );
      if (isOpen) controller.close();
    },
    cancel: () => {
      isOpen = false;
      stop.abort();
    },
  });
  return new Response(stream, { headers: { 'content-type': 'application/x-ndjson', 'cache-control': 'no-store' } });
}
