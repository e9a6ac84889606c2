import { type SaveTruckInput } from '@/lib/contracts/fleet';
import { Problem } from '@/lib/problem';
import { database } from '../connection';
import { inTransaction } from '../transaction';
import { recordAudit } from './audit';
import { type By } from './people-rules';

/** Adds a truck, or changes one. */
export async function saveTruck({ input, by }: By<SaveTruckInput>): Promise<{ id: number }> {
  const { id: givenId, ...values } = input;
  return inTransaction(async (tx) => {
    const { Truck } = database().models;
    const existing = givenId === null ? null : await Truck.findByPk(givenId, { transaction: tx, lock: true });
    if (givenId !== null && !existing) throw new Problem('not-found', { what: 'truck' });
    const before = existing?.get({ plain: true }) ?? null;
    const saved = existing
      ? await existing.update(values, { transaction: tx })
      : await Truck.create(values, { transaction: tx });
    await recordAudit(tx, {
      personId: by,
      action: before ? 'setup.trucks.change' : 'setup.trucks.add',
      subjectKind: 'truck',
      subjectId: saved.id,
      detail: { before, after: values },
    });
    return { id: saved.id };
  });
}
