import { UploadNetworkReply } from '@/lib/contracts/network';
import { NETWORK_FILE_BYTES } from '@/lib/geo/limits';
import { Problem, presentProblem, type ProblemView } from '@/lib/problem';

export type UploadResult =
  { ok: true; id: number } | { ok: false; problem: ProblemView } | { ok: false; problem: null };

interface Sending {
  file: File;
  onProgress: (fraction: number | null) => void;
  signal: AbortSignal;
}

const unreachable: ProblemView = {
  code: 'busy',
  status: 503,
  title: 'The server could not be reached.',
  detail: 'Nothing was changed. Check the connection and choose the file again.',
  fields: {},
};

/** Sends the file itself as the body. XMLHttpRequest, because `fetch` cannot say how far an upload is. */
export function uploadNetwork({ file, onProgress, signal }: Sending): Promise<UploadResult> {
  if (file.size > NETWORK_FILE_BYTES) {
    const limit = `${NETWORK_FILE_BYTES / 1024 / 1024} MB`;
    return Promise.resolve({ ok: false, problem: presentProblem(new Problem('too-large', { limit })) });
  }
  return new Promise((resolve) => {
    const request = new XMLHttpRequest();
    request.open('POST', `/api/import/network?${new URLSearchParams({ fileName: file.name.slice(-200) })}`);
    request.setRequestHeader('content-type', 'application/geo+json');
    request.upload.onprogress = ({ loaded, total }) => onProgress(loaded < total ? loaded / total : null);
    request.upload.onload = () => onProgress(null);
    request.onload = () => resolve(read(request));
    request.onerror = () => resolve({ ok: false, problem: unreachable });
    request.onabort = () => resolve({ ok: false, problem: null });
    signal.addEventListener('abort', () => request.abort());
    request.send(file);
  });
}

function read(request: XMLHttpRequest): UploadResult {
  try {
    const answer: unknown = JSON.parse(request.responseText);
    return request.status === 200
      ? { ok: true, id: UploadNetworkReply.parse(answer).id }
      : { ok: false, problem: answer as ProblemView };
  } catch {
    return { ok: false, problem: { ...unreachable, status: request.status } };
  }
}
