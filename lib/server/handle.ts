import 'server-only';
import { type ZodType, type z } from 'zod';
import { type Action, type Subject } from '@/lib/permissions';
import { Problem } from '@/lib/problem';
import { authorize, refuseHopeless } from './authorize';
import { log } from './log';
import { invalidInput, viewOf } from './problems';
import { getActor, type SignedIn } from './session';

type RouteContext = { params: Promise<Record<string, string | string[]>> };
type Out<S> = S extends ZodType ? z.output<S> : undefined;

interface Declaration<P, Q, B, R, S, M> {
  /** the row of the permission table; `public` needs no sign-in */
  action: Action | 'public';
  params?: P;
  query?: Q;
  body?: B;
  /** the contract is the presenter: fields it does not name never leave. `response` when the handler streams a file */
  reply: R | 'response';
  /** JSON body limit in bytes; 256 kB when not said. Streams limit themselves */
  maxBytes?: number;
  /** what "own" is judged on; throw Problem('not-found') when there is none */
  subject?: (input: { params: Out<P>; query: Out<Q>; body: Out<B>; actor: SignedIn }) => Promise<S>;
  /** another program's key instead of a person's session; null means: ask for the session */
  machine?: (request: Request, input: { params: Out<P>; query: Out<Q> }) => Promise<M | null>;
}

interface Given<P, Q, B, S, M> {
  request: Request;
  params: Out<P>;
  query: Out<Q>;
  body: Out<B>;
  subject: S;
  /** null for public routes and for machines */
  actor: SignedIn | null;
  machine: M | null;
}

/** The person of a route that only people call. */
export function personOf(actor: SignedIn | null): SignedIn {
  if (!actor) throw new Problem('not-signed-in');
  return actor;
}

export const madeByHandle = Symbol.for('rimewright.handle');

function parse<S extends ZodType>(schema: S | undefined, value: unknown): Out<S> {
  if (!schema) return undefined as Out<S>;
  const result = schema.safeParse(value);
  if (!result.success) throw invalidInput(result.error);
  return result.data as Out<S>;
}

async function readJson(request: Request, maxBytes: number): Promise<unknown> {
  const tooLarge = () => new Problem('too-large', { limit: `${Math.round(maxBytes / 1024)} kB` });
  if (Number(request.headers.get('content-length') ?? 0) > maxBytes) throw tooLarge();
  const text = await request.text();
  if (text.length > maxBytes) throw tooLarge();
  try {
    return JSON.parse(text);
  } catch {
    throw new Problem('invalid-input', {}, { request: 'The body is not JSON.' });
  }
}

/** A route handler from its declaration: parse, load, authorize, command, present. */
export function handle<
  R extends ZodType,
  P extends ZodType | undefined = undefined,
  Q extends ZodType | undefined = undefined,
  B extends ZodType | undefined = undefined,
  S extends Subject | undefined = undefined,
  M = never,
>(declaration: Declaration<P, Q, B, R, S, M>, run: (given: Given<P, Q, B, S, M>) => Promise<z.input<R> | Response>) {
  const route = async (request: Request, context: RouteContext): Promise<Response> => {
    const startedAt = performance.now();
    const where = `${request.method} ${new URL(request.url).pathname}`;
    let status = 200;
    try {
      const response = await answer(declaration, run, { request, rawParams: await context.params });
      status = response.status;
      return response;
    } catch (thrown) {
      const view = viewOf(thrown, where);
      status = view.status;
      return Response.json(view, { status, headers: { 'content-type': 'application/problem+json' } });
    } finally {
      log('info', where, { status, ms: Math.round(performance.now() - startedAt) });
    }
  };
  return Object.assign(route, { [madeByHandle]: declaration.action });
}

async function answer<
  R extends ZodType,
  P extends ZodType | undefined,
  Q extends ZodType | undefined,
  B extends ZodType | undefined,
  S extends Subject | undefined,
  M,
>(
  declaration: Declaration<P, Q, B, R, S, M>,
  run: (given: Given<P, Q, B, S, M>) => Promise<z.input<R> | Response>,
  { request, rawParams }: { request: Request; rawParams: unknown },
): Promise<Response> {
  const isPublic = declaration.action === 'public';
  const signedIn = isPublic ? null : await getActor();
  if (signedIn && declaration.action !== 'public') refuseHopeless(signedIn, declaration.action);
  // The signed-out learn nothing about what a route accepts; a machine's key is judged once its address is read.
  if (!isPublic && !signedIn && !declaration.machine) throw new Problem('not-signed-in');
  const params = parse(declaration.params, rawParams) as Out<P>;
  const query = parse(declaration.query, Object.fromEntries(new URL(request.url).searchParams)) as Out<Q>;
  const machine = signedIn ? null : ((await declaration.machine?.(request, { params, query })) ?? null);
  if (!isPublic && !signedIn && !machine) throw new Problem('not-signed-in');
  const body = declaration.body
    ? (parse(declaration.body, await readJson(request, declaration.maxBytes ?? 262_144)) as Out<B>)
    : (undefined as Out<B>);
  const subject = (
    signedIn && declaration.subject ? await declaration.subject({ params, query, body, actor: signedIn }) : undefined
  ) as S;
  if (declaration.action !== 'public' && !machine) authorize(signedIn, declaration.action, subject);
  const result = await run({ request, params, query, body, subject, actor: signedIn, machine });
  if (result instanceof Response) return result;
  if (declaration.reply === 'response') throw new TypeError('A route declared as response must return one.');
  return Response.json(declaration.reply.parse(result));
}
