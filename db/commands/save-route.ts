import { type SaveRouteInput } from '@/lib/contracts/routes';
import { Problem } from '@/lib/problem';
import { database } from '../connection';
import { execute, inTransaction, selectRows, type Tx } from '../transaction';
import { recordAudit } from './audit';

interface SaveRoute {
  input: SaveRouteInput;
  by: number;
}

async function writeHead(tx: Tx, { id, name, yardId, truckId }: SaveRouteInput): Promise<number> {
  if (id === null) {
    const made = await database().models.Route.create({ name, yardId, truckId, isActive: true }, { transaction: tx });
    return made.id;
  }
  // Locked, so that two people saving the same route cannot mix their lists of roads.
  const route = await database().models.Route.findByPk(id, { transaction: tx, lock: tx.LOCK.UPDATE });
  if (!route) throw new Problem('not-found', { what: 'route' });
  await route.update({ name, yardId, truckId }, { transaction: tx });
  return id;
}

/** A standing route and its roads in order. Runs already taken keep the roads they started with. */
export async function saveRoute({ input, by }: SaveRoute): Promise<{ id: number }> {
  return inTransaction(async (tx) => {
    const id = await writeHead(tx, input);
    const before = await selectRows<{ segmentId: number }>(
      'select segment_id as "segmentId" from route_segments where route_id = :id order by position',
      { id },
      tx,
    );
    await execute(tx, 'delete from route_segments where route_id = :id', { id });
    await execute(
      tx,
      `insert into route_segments (route_id, position, segment_id)
       select :id, ordinality, segment_id from unnest(array[:segmentIds]::int[]) with ordinality as t (segment_id, ordinality)`,
      { id, segmentIds: input.segmentIds },
    );
    await recordAudit(tx, {
      personId: by,
      action: 'routes.edit',
      subjectKind: 'route',
      subjectId: id,
      detail: { name: input.name, before: before.map((row) => row.segmentId), after: input.segmentIds },
    });
    return { id };
  });
}

/** Takes a route out of use; its runs and its list stay on record. */
export async function retireRoute({ id, by }: { id: number; by: number }): Promise<{ id: number }> {
  return inTransaction(async (tx) => {
    const [count] = await database().models.Route.update({ isActive: false }, { where: { id }, transaction: tx });
    if (count === 0) throw new Problem('not-found', { what: 'route' });
    await recordAudit(tx, { personId: by, action: 'routes.retire', subjectKind: 'route', subjectId: id });
    return { id };
  });
}
