import { type AddPersonInput } from '@/lib/contracts/people';
import { database } from '../connection';
import { hashPassword } from '../passwords';
import { inTransaction } from '../transaction';
import { recordAudit } from './audit';
import { type By } from './people-rules';

export async function addPerson({ input, by, now }: By<AddPersonInput>): Promise<{ id: number }> {
  const { password, ...given } = input;
  const passwordHash = await hashPassword(password);
  return inTransaction(async (tx) => {
    const person = await database().models.Person.create(
      { ...given, passwordHash, createdAt: now, updatedAt: now },
      { transaction: tx },
    );
    await recordAudit(tx, {
      personId: by,
      action: 'setup.people.add',
      subjectKind: 'person',
      subjectId: person.id,
      detail: { ...given },
    });
    return { id: person.id };
  });
}
