import { type ChangePersonInput } from '@/lib/contracts/people';
import { inTransaction } from '../transaction';
import { recordAudit } from './audit';
import { findForChange, keepAnAdministrator, type By } from './people-rules';

/** A change of role ends the person's sessions: what they may do is read anew at the next sign-in. */
export async function changePerson({ input, by, now }: By<ChangePersonInput>): Promise<{ id: number }> {
  return inTransaction(async (tx) => {
    if (input.role !== 'administrator') await keepAnAdministrator(tx, input.id);
    const person = await findForChange(tx, input.id);
    const before = { name: person.name, role: person.role };
    const isRoleNew = person.role !== input.role;
    await person.update(
      {
        name: input.name,
        role: input.role,
        sessionVersion: person.sessionVersion + (isRoleNew ? 1 : 0),
        updatedAt: now,
      },
      { transaction: tx },
    );
    await recordAudit(tx, {
      personId: by,
      action: 'setup.people.change',
      subjectKind: 'person',
      subjectId: input.id,
      detail: { before, after: { name: input.name, role: input.role } },
    });
    return { id: input.id };
  });
}
