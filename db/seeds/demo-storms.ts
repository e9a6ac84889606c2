import { type Random } from '@/lib/skerrow/random';
import { type RoadNetwork } from '@/lib/skerrow/roads';
import { type SkerrowStorm } from '@/lib/skerrow/storms';
import { execute, selectRows, type Tx } from '../transaction';
import { type SeededRoute } from './demo-network';
import { seedDraft, seedPublished } from './demo-plans';
import { type RunSetting, seedRunsOfPass } from './demo-runs';
import { idOf, insertRows } from './insert-rows';

export interface StormSetting {
  storm: SkerrowStorm;
  anchorAt: Date;
  network: RoadNetwork;
  routes: readonly SeededRoute[];
  ids: RunSetting['ids'];
}

const hourMs = 3_600_000;
const minMs = 60_000;
const at = (anchorAt: Date, hours: number) => new Date(anchorAt.getTime() + hours * hourMs);
/** Plans are worked out and published this long before the trucks leave. */
const workedOutBeforeMin = 26;
const publishedBeforeMin = 14;

const auditOf = (of: { stormId: number; personId: number }) => (recordedAt: Date, action: string, detail: object) => ({
  recordedAt,
  personId: of.personId,
  action,
  subjectKind: 'storm',
  subjectId: String(of.stormId),
  detail,
});

async function openStorm(tx: Tx, { storm, anchorAt }: StormSetting, dispatcherId: number): Promise<number> {
  const openedAt = at(anchorAt, storm.openedH);
  const [row] = await selectRows<{ id: number }>(
    `insert into storms (number, name, from_at, until_at, opened_at, opened_by)
     values (:number, :name, :fromAt, :untilAt, :openedAt, :dispatcherId) returning id`,
    {
      number: storm.number,
      name: storm.name,
      fromAt: at(anchorAt, storm.fromH),
      untilAt: at(anchorAt, storm.untilH),
      openedAt,
      dispatcherId,
    },
    tx,
  );
  const stormId = row?.id ?? 0;
  await insertRows(tx, {
    table: 'storm_passes',
    rows: storm.passesH.map((hours, index) => ({ stormId, number: index + 1, startsAt: at(anchorAt, hours) })),
  });
  const audit = auditOf({ stormId, personId: dispatcherId });
  await insertRows(tx, {
    table: 'audit_log',
    rows: [audit(openedAt, 'storms.open', { number: storm.number, name: storm.name })],
  });
  return stormId;
}

async function closeStorm(tx: Tx, stormId: number, by: { dispatcherId: number; closedAt: Date }): Promise<void> {
  await execute(tx, 'update storms set closed_at = :closedAt, closed_by = :dispatcherId where id = :stormId', {
    stormId,
    ...by,
  });
  const audit = auditOf({ stormId, personId: by.dispatcherId });
  await insertRows(tx, { table: 'audit_log', rows: [audit(by.closedAt, 'storms.close', {})] });
}

/** A storm with its passes, the plans published so far and what the trucks then did; of a storm under way, the next draft. */
export async function seedStorm(tx: Tx, setting: StormSetting, random: Random): Promise<void> {
  const { storm, anchorAt, network, routes, ids } = setting;
  const dispatcherId = idOf(ids.people, 'Una Kinnaird');
  const stormId = await openStorm(tx, setting, dispatcherId);
  const roads = new Map(network.segments.map((segment) => [segment.key, segment]));
  const backAt = new Map<number, Date>();
  for (const [index, hours] of storm.passesH.slice(0, storm.publishedPasses).entries()) {
    const pass = index + 1;
    const leavesAt = at(anchorAt, hours);
    const before = (minutes: number) => new Date(leavesAt.getTime() - minutes * minMs);
    const times = { workedOutAt: before(workedOutBeforeMin), publishedAt: before(publishedBeforeMin) };
    const { planId, asks } = await seedPublished(tx, { stormId, pass, dispatcherId, ...times });
    const run = { storm, stormId, pass, leavesAt, backAt, anchorAt, routes, roads, ids };
    await seedRunsOfPass(tx, { ...run, planId, asks }, random);
  }
  if (storm.closedH !== null) {
    await closeStorm(tx, stormId, { dispatcherId, closedAt: at(anchorAt, storm.closedH) });
  } else {
    await seedDraft(tx, { stormId, pass: storm.publishedPasses + 1, dispatcherId, workedOutAt: anchorAt });
  }
}
