import { type ZodType, type z } from 'zod';
import { type ProblemView } from '@/lib/problem';

/** A refusal from the server, with the words it gave. */
export class Refused extends Error {
  readonly view: ProblemView;

  constructor(view: ProblemView) {
    super(view.title);
    this.name = 'Refused';
    this.view = view;
  }
}

/** What a person is told when the server could not be reached at all. */
export const unreachable: ProblemView = {
  code: 'busy',
  status: 503,
  title: 'The server could not be reached.',
  detail: 'Nothing was changed. Check the connection; this page tries again by itself.',
  fields: {},
};

async function viewOf(response: Response): Promise<ProblemView> {
  const isProblem = response.headers.get('content-type')?.startsWith('application/problem+json');
  return isProblem ? ((await response.json()) as ProblemView) : { ...unreachable, status: response.status };
}

interface Sent {
  method?: 'GET' | 'POST' | 'PUT' | 'DELETE';
  body?: unknown;
  signal?: AbortSignal;
}

/** Asks the server and reads the reply through its contract. Throws `Refused`; shows nothing. */
export async function ask<S extends ZodType>(path: string, reply: S, sent: Sent = {}): Promise<z.output<S>> {
  let response: Response;
  try {
    response = await fetch(path, {
      method: sent.method ?? 'GET',
      ...(sent.body === undefined
        ? {}
        : { body: JSON.stringify(sent.body), headers: { 'content-type': 'application/json' } }),
      ...(sent.signal ? { signal: sent.signal } : {}),
    });
  } catch (error) {
    if (sent.signal?.aborted) throw error;
    throw new Refused(unreachable);
  }
  if (!response.ok) throw new Refused(await viewOf(response));
  return reply.parse(await response.json());
}
