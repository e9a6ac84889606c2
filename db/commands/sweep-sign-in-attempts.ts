import { execute, inTransaction } from '../transaction';

/** Attempts older than a month say nothing any more and hold addresses of people. */
export async function sweepSignInAttempts({ now }: { now: Date }): Promise<void> {
  const before = new Date(now.getTime() - 30 * 24 * 3_600_000);
  await inTransaction((tx) => execute(tx, 'delete from sign_in_attempts where attempted_at < :before', { before }));
}
