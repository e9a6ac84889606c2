import { type OpenStormInput } from '@/lib/contracts/storms';
import { database } from '../connection';
import { execute, inTransaction, selectRows } from '../transaction';
import { recordAudit } from './audit';

interface OpenStorm {
  input: OpenStormInput;
  by: number;
  now: Date;
}

/**
 * Opens a storm with its passes, under the next number. The lock keeps two storms opened together from taking the same
 * number.
 */
export async function openStorm({ input, by, now }: OpenStorm): Promise<{ id: number; number: number }> {
  return inTransaction(async (tx) => {
    await execute(tx, 'lock table storms in share row exclusive mode');
    const [next] = await selectRows<{ number: number }>(
      'select coalesce(max(number), 0)::int + 1 as number from storms',
      {},
      tx,
    );
    const number = next?.number ?? 1;
    const { name, fromAt, untilAt, passStartsAt } = input;
    const storm = await database().models.Storm.create(
      { number, name, fromAt, untilAt, openedAt: now, openedBy: by },
      { transaction: tx },
    );
    await database().models.StormPass.bulkCreate(
      passStartsAt.map((startsAt, index) => ({ stormId: storm.id, number: index + 1, startsAt })),
      { transaction: tx },
    );
    await recordAudit(tx, {
      personId: by,
      action: 'storms.open',
      subjectKind: 'storm',
      subjectId: storm.id,
      detail: { number, name, fromAt, untilAt, passStartsAt },
    });
    return { id: storm.id, number };
  });
}
