import { Problem } from '@/lib/problem';
import { hashPassword, passwordMatches } from '../passwords';
import { database } from '../connection';
import { inTransaction, selectRows } from '../transaction';

/** Failures in the window after which an e-mail address, or an address on the network, must wait. */
export const signInLimits = { windowMin: 15, failuresPerEmail: 8, failuresPerAddress: 60 };

interface Attempt {
  email: string;
  password: string;
  address: string;
  now: Date;
}

let decoyHash: Promise<string> | undefined;

async function refuseWhenTooMany({ email, address, now }: Attempt): Promise<void> {
  const [counts] = await selectRows<{ byEmail: number; byAddress: number }>(
    `select count(*) filter (where email = :email)::int as "byEmail",
            count(*) filter (where address = :address)::int as "byAddress"
       from sign_in_attempts
      where not has_succeeded and attempted_at > :since and (email = :email or address = :address)`,
    { email, address, since: new Date(now.getTime() - signInLimits.windowMin * 60_000) },
  );
  if (!counts) return;
  if (counts.byEmail >= signInLimits.failuresPerEmail || counts.byAddress >= signInLimits.failuresPerAddress) {
    throw new Problem('too-many-attempts', { minutes: signInLimits.windowMin });
  }
}

/**
 * The person these credentials belong to, or null. Counts the attempt either way, and takes the same
 * time whether or not the address is known.
 */
export async function signIn(attempt: Attempt): Promise<{ id: number; name: string; sessionVersion: number } | null> {
  const email = attempt.email.trim().toLowerCase();
  await refuseWhenTooMany({ ...attempt, email });
  const person = await database().models.Person.findOne({ where: { email } });
  decoyHash ??= hashPassword('nobody has this password');
  const matches = await passwordMatches(person?.passwordHash ?? (await decoyHash), attempt.password);
  const hasSucceeded = matches && person !== null && !person.isDisabled;
  await inTransaction(async (tx) => {
    await database().models.SignInAttempt.create(
      { email, address: attempt.address, attemptedAt: attempt.now, hasSucceeded },
      { transaction: tx },
    );
  });
  return hasSucceeded ? { id: person.id, name: person.name, sessionVersion: person.sessionVersion } : null;
}
