import { Problem } from '@/lib/problem';
import { findStation } from '../queries/stations';
import { hashStationKey, makeStationKey } from '../station-key';
import { inTransaction, selectRows } from '../transaction';
import { recordAudit } from './audit';
import { type By } from './people-rules';

const HINT_LETTERS = 4;

/** A new key with which a station's script may load readings. The key itself is in the answer and nowhere else. */
export async function issueStationKey({
  input,
  by,
  now,
}: By<{ stationId: number }>): Promise<{ id: number; key: string; hint: string }> {
  const key = makeStationKey();
  const hint = key.slice(-HINT_LETTERS);
  return inTransaction(async (tx) => {
    if (!(await findStation({ id: input.stationId }, tx))) throw new Problem('not-found', { what: 'station' });
    const [row] = await selectRows<{ id: number }>(
      `insert into station_keys (station_id, key_hash, hint, issued_at, issued_by)
       values (:stationId, :keyHash, :hint, :now, :by) returning id`,
      { stationId: input.stationId, keyHash: hashStationKey(key), hint, now, by },
      tx,
    );
    const id = row?.id ?? 0;
    await recordAudit(tx, {
      personId: by,
      action: 'setup.stations.issue-key',
      subjectKind: 'station',
      subjectId: input.stationId,
      detail: { keyId: id, hint },
    });
    return { id, key, hint };
  });
}

/** From now on the key opens nothing. A key revoked before stays revoked since then. */
export async function revokeStationKey({ input, by, now }: By<{ keyId: number }>): Promise<{ id: number }> {
  return inTransaction(async (tx) => {
    const [row] = await selectRows<{ stationId: number; hint: string }>(
      `update station_keys set revoked_at = coalesce(revoked_at, :now) where id = :keyId
       returning station_id as "stationId", hint`,
      { keyId: input.keyId, now },
      tx,
    );
    if (!row) throw new Problem('not-found', { what: 'station key' });
    await recordAudit(tx, {
      personId: by,
      action: 'setup.stations.revoke-key',
      subjectKind: 'station',
      subjectId: row.stationId,
      detail: { keyId: input.keyId, hint: row.hint },
    });
    return { id: input.keyId };
  });
}
