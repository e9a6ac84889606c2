import { type SaveYardInput } from '@/lib/contracts/fleet';
import { Problem } from '@/lib/problem';
import { inTransaction, selectRows } from '../transaction';
import { recordAudit } from './audit';
import { type By } from './people-rules';

const insert = `
  insert into yards (name, position, solid_capacity_kg, brine_capacity_l, is_active)
  values (:name, st_setsrid(st_makepoint(:longitudeDeg, :latitudeDeg), 4326), :solidCapacityKg, :brineCapacityL, :isActive)
  returning id`;
const update = `
  update yards
     set name = :name, position = st_setsrid(st_makepoint(:longitudeDeg, :latitudeDeg), 4326),
         solid_capacity_kg = :solidCapacityKg, brine_capacity_l = :brineCapacityL, is_active = :isActive
   where id = :id
  returning id`;

/** In SQL, since the position is a geometry. */
export async function saveYard({ input, by }: By<SaveYardInput>): Promise<{ id: number }> {
  return inTransaction(async (tx) => {
    const [row] = await selectRows<{ id: number }>(input.id === null ? insert : update, { ...input }, tx);
    if (!row) throw new Problem('not-found', { what: 'yard' });
    await recordAudit(tx, {
      personId: by,
      action: input.id === null ? 'setup.yards.add' : 'setup.yards.change',
      subjectKind: 'yard',
      subjectId: row.id,
      detail: { ...input },
    });
    return { id: row.id };
  });
}
