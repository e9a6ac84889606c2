import { type SaveSpreaderInput } from '@/lib/contracts/fleet';
import { Problem } from '@/lib/problem';
import { database } from '../connection';
import { inTransaction } from '../transaction';
import { recordAudit } from './audit';
import { type By } from './people-rules';

/** Adds a spreader, or changes one. */
export async function saveSpreader({ input, by }: By<SaveSpreaderInput>): Promise<{ id: number }> {
  const { id: givenId, ...values } = input;
  return inTransaction(async (tx) => {
    const { Spreader } = database().models;
    const existing = givenId === null ? null : await Spreader.findByPk(givenId, { transaction: tx, lock: true });
    if (givenId !== null && !existing) throw new Problem('not-found', { what: 'spreader' });
    const before = existing?.get({ plain: true }) ?? null;
    const saved = existing
      ? await existing.update(values, { transaction: tx })
      : await Spreader.create(values, { transaction: tx });
    await recordAudit(tx, {
      personId: by,
      action: before ? 'setup.spreaders.change' : 'setup.spreaders.add',
      subjectKind: 'spreader',
      subjectId: saved.id,
      detail: { before, after: values },
    });
    return { id: saved.id };
  });
}
