import 'server-only';
import { redirect } from 'next/navigation';
import { can, mayEver, type Action } from '@/lib/permissions';
import { getActor, type SignedIn } from './session';

/** Guards a page: sends the signed-out to sign in and those who may not to a page that says why. */
export async function requirePage(action: Action): Promise<SignedIn> {
  const actor = await getActor();
  if (!actor) redirect('/sign-in');
  // A page whose rows are filtered to "own" opens for anyone who could ever do the action.
  if (!mayEver(actor.role, action)) {
    redirect(`/not-allowed?for=${encodeURIComponent(action)}`);
  }
  return actor;
}

/** Why `actor` may not, or null: what a disabled button says. */
export function refusal(actor: SignedIn, action: Action): string | null {
  const decision = can(actor, action);
  return decision.allowed ? null : decision.reason;
}
