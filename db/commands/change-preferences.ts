import { type PreferencesInput } from '@/lib/contracts/account';
import { database } from '../connection';
import { inTransaction } from '../transaction';
import { recordAudit } from './audit';

/** What a person reads in and looks at; nobody else is touched by it. */
export async function changePreferences({ input, by, now }: { input: PreferencesInput; by: number; now: Date }) {
  await inTransaction(async (tx) => {
    await database().models.Person.update({ ...input, updatedAt: now }, { where: { id: by }, transaction: tx });
    await recordAudit(tx, {
      personId: by,
      action: 'account.edit',
      subjectKind: 'person',
      subjectId: by,
      detail: { ...input },
    });
  });
}
