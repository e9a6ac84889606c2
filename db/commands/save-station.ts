import { type SaveStationInput } from '@/lib/contracts/readings';
import { Problem } from '@/lib/problem';
import { isKnownZone } from '@/lib/time/format';
import { inTransaction, selectRows } from '../transaction';
import { recordAudit } from './audit';

const insert = `
  insert into stations (name, position, height_m, zone, is_active)
  values (:name, st_setsrid(st_makepoint(:longitudeDeg, :latitudeDeg), 4326), :heightM, :zone, :isActive)
  returning id`;
const update = `
  update stations
     set name = :name, position = st_setsrid(st_makepoint(:longitudeDeg, :latitudeDeg), 4326), height_m = :heightM,
         zone = :zone, is_active = :isActive
   where id = :id
  returning id`;

interface SaveStation {
  input: SaveStationInput;
  /** null: nobody, as in a bench */
  by: number | null;
  now: Date;
}

/** In SQL, since the position is a geometry. */
export async function saveStation({ input, by }: SaveStation): Promise<{ id: number }> {
  if (!isKnownZone(input.zone)) {
    throw new Problem(
      'invalid-input',
      {},
      { zone: `There is no time zone “${input.zone}”: write it like Europe/Oslo.` },
    );
  }
  return inTransaction(async (tx) => {
    const [row] = await selectRows<{ id: number }>(input.id === null ? insert : update, { ...input }, tx);
    if (!row) throw new Problem('not-found', { what: 'station' });
    await recordAudit(tx, {
      personId: by,
      action: input.id === null ? 'setup.stations.add' : 'setup.stations.change',
      subjectKind: 'station',
      subjectId: row.id,
      detail: { ...input },
    });
    return { id: row.id };
  });
}
