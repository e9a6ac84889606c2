import { can, mayEver, type Action, type Actor, type Subject } from '@/lib/permissions';
import { Problem } from '@/lib/problem';

/** Throws when nobody is signed in or the table says no. Called by `handle`, `action` and `requirePage` only. */
export function authorize<A extends Actor>(actor: A | null, action: Action, subject?: Subject): A {
  if (!actor) throw new Problem('not-signed-in');
  const decision = can(actor, action, subject);
  if (!decision.allowed) throw new Problem('not-allowed', { reason: decision.reason });
  return actor;
}

/** Refuses a role that never may, before anything of the request is read: the ladder's first step. */
export function refuseHopeless(actor: Actor, action: Action): void {
  if (!mayEver(actor.role, action)) authorize(actor, action);
}
