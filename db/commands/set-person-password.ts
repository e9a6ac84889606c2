import { type SetPersonPasswordInput } from '@/lib/contracts/people';
import { hashPassword } from '../passwords';
import { inTransaction } from '../transaction';
import { recordAudit } from './audit';
import { findForChange, type By } from './people-rules';

export async function setPersonPassword({ input, by, now }: By<SetPersonPasswordInput>): Promise<{ id: number }> {
  const passwordHash = await hashPassword(input.password);
  return inTransaction(async (tx) => {
    const person = await findForChange(tx, input.id);
    await person.update(
      { passwordHash, sessionVersion: person.sessionVersion + 1, updatedAt: now },
      { transaction: tx },
    );
    await recordAudit(tx, {
      personId: by,
      action: 'setup.people.password',
      subjectKind: 'person',
      subjectId: input.id,
    });
    return { id: input.id };
  });
}
