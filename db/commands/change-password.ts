import { type ChangePasswordInput } from '@/lib/contracts/account';
import { Problem } from '@/lib/problem';
import { database } from '../connection';
import { hashPassword, passwordMatches } from '../passwords';
import { inTransaction } from '../transaction';
import { recordAudit } from './audit';

/** A new password ends every session of the person, this one too: whoever knew the old one is out. */
export async function changePassword({ input, by, now }: { input: ChangePasswordInput; by: number; now: Date }) {
  const person = await database().models.Person.findByPk(by);
  if (!person) throw new Problem('not-found', { what: 'person' });
  if (!(await passwordMatches(person.passwordHash, input.current))) {
    throw new Problem('invalid-input', {}, { current: 'This is not your password.' });
  }
  const passwordHash = await hashPassword(input.next);
  await inTransaction(async (tx) => {
    await database().models.Person.update(
      { passwordHash, sessionVersion: person.sessionVersion + 1, updatedAt: now },
      { where: { id: by }, transaction: tx },
    );
    await recordAudit(tx, { personId: by, action: 'account.password', subjectKind: 'person', subjectId: by });
  });
}
