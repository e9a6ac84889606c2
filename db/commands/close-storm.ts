import { Problem } from '@/lib/problem';
import { database } from '../connection';
import { inTransaction } from '../transaction';
import { recordAudit } from './audit';

interface CloseStorm {
  stormId: number;
  by: number;
  now: Date;
}

/** Closes a storm: no more plans for it. What was planned and logged stays. Closing it again changes nothing. */
export async function closeStorm({ stormId, by, now }: CloseStorm): Promise<{ id: number }> {
  return inTransaction(async (tx) => {
    // Locked, so that a plan being published and the close cannot cross.
    const storm = await database().models.Storm.findByPk(stormId, { transaction: tx, lock: tx.LOCK.UPDATE });
    if (!storm) throw new Problem('not-found', { what: 'storm' });
    if (storm.closedAt) return { id: stormId };
    await storm.update({ closedAt: now, closedBy: by }, { transaction: tx });
    await recordAudit(tx, {
      personId: by,
      action: 'storms.close',
      subjectKind: 'storm',
      subjectId: stormId,
      detail: { number: storm.number },
    });
    return { id: stormId };
  });
}
