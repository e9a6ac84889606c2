import { type Recorded, type StartRunInput } from '@/lib/contracts/runs';
import { Problem } from '@/lib/problem';
import { database } from '../connection';
import { execute, inTransaction, selectRows, type Tx } from '../transaction';
import { recordAudit } from './audit';

interface StartRun {
  input: StartRunInput;
  by: number;
  now: Date;
}

async function segmentsFor(tx: Tx, input: StartRunInput): Promise<number[]> {
  if (input.routeId === null) return input.segmentIds;
  const rows = await selectRows<{ id: number }>(
    'select segment_id as id from route_segments where route_id = :routeId order by position',
    { routeId: input.routeId },
    tx,
  );
  if (rows.length === 0) throw new Problem('not-found', { what: 'route with roads on it' });
  return rows.map((row) => row.id);
}

/** The storm the run belongs to and the plan in force for it then. */
async function stormAndPlan(tx: Tx, startedAt: Date): Promise<{ stormId: number | null; planId: number | null }> {
  const rows = await selectRows<{ stormId: number; planId: number | null }>(
    `select s.id as "stormId",
            plan_in_force(s.id, :startedAt) as "planId"
       from storms s
      where s.opened_at <= :startedAt and (s.closed_at is null or s.closed_at > :startedAt)
      order by s.opened_at desc limit 1`,
    { startedAt },
    tx,
  );
  return rows[0] ?? { stormId: null, planId: null };
}

/** A driver takes a run. The id is the tablet's own: starting the same run again changes nothing. */
export async function startRun({ input, by, now }: StartRun): Promise<Recorded> {
  return inTransaction(async (tx) => {
    const existing = await database().models.Run.findByPk(input.id, { transaction: tx });
    if (existing) return { id: input.id, result: 'already-recorded' };
    const truck = await database().models.Truck.findOne({
      where: { id: input.truckId, isActive: true },
      transaction: tx,
    });
    if (!truck) throw new Problem('not-found', { what: 'truck in use' });
    const segmentIds = await segmentsFor(tx, input);
    const { stormId, planId } = await stormAndPlan(tx, input.startedAt);
    const driverId = input.driverId ?? by;
    await database().models.Run.create(
      {
        id: input.id,
        stormId,
        planId,
        routeId: input.routeId,
        truckId: input.truckId,
        driverId,
        startedAt: input.startedAt,
        finishedAt: null,
        recordedAt: now,
      },
      { transaction: tx },
    );
    await execute(
      tx,
      `insert into run_segments (run_id, position, segment_id)
       select :id, ordinality, segment_id from unnest(array[:segmentIds]::int[]) with ordinality as t (segment_id, ordinality)`,
      { id: input.id, segmentIds },
    );
    await recordAudit(tx, {
      personId: by,
      action: 'run.start',
      subjectKind: 'run',
      subjectId: input.id,
      detail: { truckId: input.truckId, driverId, routeId: input.routeId, roads: segmentIds.length },
    });
    return { id: input.id, result: 'recorded' };
  });
}
