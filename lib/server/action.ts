import 'server-only';
import { revalidatePath } from 'next/cache';
import { type ZodType, type z } from 'zod';
import { type Action, type Subject } from '@/lib/permissions';
import { Problem, type ActionResult } from '@/lib/problem';
import { authorize, refuseHopeless } from './authorize';
import { invalidInput, viewOf } from './problems';
import { getActor, type SignedIn } from './session';

interface Declaration<I extends ZodType> {
  action: Action;
  input: I;
  /** what "own" is judged on; throw Problem('not-found') when there is none */
  subject?: (given: { input: z.output<I>; actor: SignedIn }) => Promise<Subject>;
  /** pages whose data this changes */
  revalidate?: readonly string[];
}

export const madeByAction = Symbol.for('rimewright.action');

/** A server action from its declaration: the same order of steps as `handle`. */
export function action<I extends ZodType, T>(
  declaration: Declaration<I>,
  run: (given: { actor: SignedIn; input: z.output<I> }) => Promise<T>,
) {
  const act = async (given: z.input<I>): Promise<ActionResult<T>> => {
    try {
      const actor = await getActor();
      if (!actor) throw new Problem('not-signed-in');
      refuseHopeless(actor, declaration.action);
      const input = declaration.input.safeParse(given);
      if (!input.success) throw invalidInput(input.error);
      const subject = await declaration.subject?.({ input: input.data, actor });
      authorize(actor, declaration.action, subject);
      const result = await run({ actor, input: input.data });
      for (const path of declaration.revalidate ?? []) revalidatePath(path);
      return { ok: true, data: result };
    } catch (thrown) {
      return { ok: false, problem: viewOf(thrown, `action ${declaration.action}`) };
    }
  };
  return Object.assign(act, { [madeByAction]: declaration.action });
}
