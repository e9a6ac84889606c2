import { Problem } from '@/lib/problem';
import { READINGS_FILE_BYTES } from '@/lib/readings/bytes';

/** A sender that says nothing for so long has gone. */
const SILENT_MS = 60_000;

const brokeOff = (bytes: number) =>
  new Problem('unreadable-file', {
    reason: `The upload broke off after ${(bytes / 1e6).toFixed(1)} MB.`,
    todo: 'Send the file again: what was read of it was taken back.',
  });

function withinSilence<T>(next: Promise<T>): Promise<T> {
  let timer: ReturnType<typeof setTimeout> | undefined;
  const silence = new Promise<never>((_, reject) => {
    timer = setTimeout(() => reject(new Error('silent')), SILENT_MS);
  });
  return Promise.race([next, silence]).finally(() => clearTimeout(timer));
}

export interface SentBody {
  /** piece by piece; throws a Problem when it is cut short, falls silent, or is a form */
  pieces: AsyncIterable<Uint8Array>;
  /** Takes what still comes of a refused file and drops it: a sender cut off in the middle would not hear the reason. */
  discard: () => Promise<void>;
}

export function readBody(request: Request): SentBody {
  const reader = request.body?.getReader();
  const declared = request.headers.get('content-length');
  const isForm = request.headers.get('content-type')?.startsWith('multipart/') ?? false;
  return { pieces: piecesOf(reader, { declared, isForm }), discard: () => discard(reader) };
}

type Reader = ReadableStreamDefaultReader<Uint8Array> | undefined;

async function* piecesOf(
  reader: Reader,
  { declared, isForm }: { declared: string | null; isForm: boolean },
): AsyncGenerator<Uint8Array> {
  if (isForm) {
    throw new Problem('unreadable-file', {
      reason: 'The file came wrapped in a form.',
      todo: 'Send the file itself as the body, for example with curl --data-binary @readings.csv.',
    });
  }
  let bytes = 0;
  while (reader) {
    const { done, value } = await withinSilence(reader.read()).catch(() => {
      throw brokeOff(bytes);
    });
    if (done) break;
    bytes += value.byteLength;
    yield value;
  }
  if (declared !== null && Number(declared) !== bytes) throw brokeOff(bytes);
}

async function discard(reader: Reader): Promise<void> {
  let bytes = 0;
  try {
    while (reader && bytes < READINGS_FILE_BYTES) {
      const { done, value } = await withinSilence(reader.read());
      if (done) return;
      bytes += value.byteLength;
    }
    await reader?.cancel();
  } catch {
    // the sender has gone
  }
}
