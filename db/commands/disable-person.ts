import { type DisablePersonInput } from '@/lib/contracts/people';
import { Problem } from '@/lib/problem';
import { inTransaction } from '../transaction';
import { recordAudit } from './audit';
import { findForChange, keepAnAdministrator, type By } from './people-rules';

/** Disabling ends every session at once; what the person did stays under their name. */
export async function disablePerson({ input, by, now }: By<DisablePersonInput>): Promise<{ id: number }> {
  if (input.isDisabled && input.id === by) {
    throw new Problem('not-possible-now', {
      reason: 'You cannot disable yourself.',
      todo: 'Ask another administrator to do it.',
    });
  }
  return inTransaction(async (tx) => {
    if (input.isDisabled) await keepAnAdministrator(tx, input.id);
    const person = await findForChange(tx, input.id);
    await person.update(
      { isDisabled: input.isDisabled, sessionVersion: person.sessionVersion + 1, updatedAt: now },
      { transaction: tx },
    );
    await recordAudit(tx, {
      personId: by,
      action: input.isDisabled ? 'setup.people.disable' : 'setup.people.enable',
      subjectKind: 'person',
      subjectId: input.id,
    });
    return { id: input.id };
  });
}
