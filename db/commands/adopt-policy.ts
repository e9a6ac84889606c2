import { type AdoptPolicyInput } from '@/lib/contracts/policy';
import { Problem } from '@/lib/problem';
import { database } from '../connection';
import { newestPolicyVersion } from '../queries/policy';
import { execute, inTransaction } from '../transaction';
import { recordAudit } from './audit';
import { type By } from './people-rules';

/**
 * Adds a version; plans keep the one they were worked out under. The lock lets one adoption through at a time, so that
 * two people cannot both build on the same version.
 */
export async function adoptPolicy({ input, by, now }: By<AdoptPolicyInput>): Promise<{ version: number }> {
  return inTransaction(async (tx) => {
    await execute(tx, 'lock table policies in exclusive mode');
    const newest = await newestPolicyVersion(tx);
    if (newest !== input.basedOnVersion) throw new Problem('changed-meanwhile', { what: 'The policy' });
    const version = newest + 1;
    await database().models.Policy.create(
      { version, rules: input.rules, adoptedAt: now, adoptedBy: by },
      { transaction: tx },
    );
    await recordAudit(tx, {
      personId: by,
      action: 'setup.policy.adopt',
      subjectKind: 'policy',
      subjectId: version,
      detail: { rules: input.rules },
    });
    return { version };
  });
}
