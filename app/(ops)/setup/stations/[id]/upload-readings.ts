import { ImportProgressLine, type ImportReadingsReply } from '@/lib/contracts/readings';
import { Problem, presentProblem, type ProblemView } from '@/lib/problem';
import { READINGS_FILE_BYTES } from '@/lib/readings/bytes';

export type Progress = { kind: 'sending'; fraction: number; bytes: number } | { kind: 'storing'; rows: number };

export type UploadOutcome =
  | { ok: true; reply: ImportReadingsReply }
  | { ok: false; problem: Pick<ProblemView, 'title' | 'detail'> }
  /** stopped by the person */
  | { ok: false; problem: null };

interface Sending {
  file: File;
  stationId: number;
  mappingSavedAt: string;
  onProgress: (progress: Progress) => void;
  signal: AbortSignal;
}

const unreachable = {
  title: 'The server could not be reached, or the connection broke off.',
  detail: 'Nothing of the file was kept. Check the connection and load it again.',
};

/** Sends the file itself as the body. XMLHttpRequest, because `fetch` cannot say how far an upload is. */
export function uploadReadings({
  file,
  stationId,
  mappingSavedAt,
  onProgress,
  signal,
}: Sending): Promise<UploadOutcome> {
  if (file.size > READINGS_FILE_BYTES) {
    const limit = `${READINGS_FILE_BYTES / 1024 / 1024} MB`;
    return Promise.resolve({ ok: false, problem: presentProblem(new Problem('too-large', { limit })) });
  }
  return new Promise((resolve) => {
    const request = new XMLHttpRequest();
    const query = new URLSearchParams({ station: String(stationId), fileName: file.name.slice(-200), mappingSavedAt });
    request.open('POST', `/api/import/readings?${query}`);
    request.setRequestHeader('content-type', 'text/csv');
    request.setRequestHeader('accept', 'application/x-ndjson');
    request.upload.onprogress = ({ loaded, total }) =>
      onProgress({ kind: 'sending', fraction: loaded / total, bytes: loaded });
    // A browser hands on what the server tells only when all is sent; the server reads as fast as it takes.
    request.onprogress = () => {
      const last = linesOf(request.responseText).at(-1);
      if (last?.kind === 'reading' || last?.kind === 'storing') onProgress({ kind: 'storing', rows: last.rows });
    };
    request.upload.onload = () => onProgress({ kind: 'storing', rows: 0 });
    request.onload = () => resolve(read(request));
    request.onerror = () => resolve({ ok: false, problem: unreachable });
    request.onabort = () => resolve({ ok: false, problem: null });
    signal.addEventListener('abort', () => request.abort());
    request.send(file);
  });
}

function linesOf(text: string): ImportProgressLine[] {
  const whole = text.slice(0, text.lastIndexOf('\n') + 1);
  return whole
    .split('\n')
    .filter(Boolean)
    .map((line) => ImportProgressLine.parse(JSON.parse(line)));
}

function read(request: XMLHttpRequest): UploadOutcome {
  try {
    if (request.status !== 200) return { ok: false, problem: JSON.parse(request.responseText) as ProblemView };
    const last = linesOf(request.responseText).at(-1);
    if (last?.kind === 'done') return { ok: true, reply: last.reply };
    return { ok: false, problem: last?.kind === 'problem' ? last.problem : unreachable };
  } catch {
    return { ok: false, problem: unreachable };
  }
}
