import { createHash } from 'node:crypto';
import { NETWORK_FILE_BYTES } from '@/lib/geo/limits';
import { Problem } from '@/lib/problem';

export interface SentFile {
  text: string;
  sha256: string;
  /** Names may be wrong: it was not UTF-8, and was read as Windows-1252. */
  isGuessedEncoding: boolean;
}

const tooLarge = () => new Problem('too-large', { limit: `${NETWORK_FILE_BYTES / 1024 / 1024} MB` });

/** The body of a request as text, up to the size limit; a longer one is refused as soon as that is known. */
export async function readFile(request: Request): Promise<SentFile> {
  if (Number(request.headers.get('content-length') ?? 0) > NETWORK_FILE_BYTES) throw tooLarge();
  const chunks: Uint8Array[] = [];
  let bytes = 0;
  if (request.body) {
    for await (const chunk of request.body) {
      bytes += chunk.byteLength;
      if (bytes > NETWORK_FILE_BYTES) throw tooLarge();
      chunks.push(chunk);
    }
  }
  const whole = Buffer.concat(chunks);
  return { ...decode(whole), sha256: createHash('sha256').update(whole).digest('hex') };
}

function decode(whole: Buffer): Pick<SentFile, 'text' | 'isGuessedEncoding'> {
  const mark = whole.subarray(0, 2).toString('hex');
  if (mark === 'fffe') return { text: new TextDecoder('utf-16le').decode(whole), isGuessedEncoding: false };
  try {
    return { text: new TextDecoder('utf-8', { fatal: true }).decode(whole), isGuessedEncoding: false };
  } catch {
    return { text: new TextDecoder('windows-1252').decode(whole), isGuessedEncoding: true };
  }
}
