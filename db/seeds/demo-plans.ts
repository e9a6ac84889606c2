import { type Ask } from '@/lib/skerrow/drive';
import { publishPlanIn } from '../commands/publish-plan';
import { workOutPlanIn } from '../commands/work-out-plan';
import { selectRows, type Tx } from '../transaction';

export interface PlanSetting {
  stormId: number;
  pass: number;
  dispatcherId: number;
  workedOutAt: Date;
}

export interface SeededPlan {
  planId: number;
  /** by the segment's key */
  asks: ReadonlyMap<string, Ask>;
}

async function asksOf(tx: Tx, planId: number): Promise<ReadonlyMap<string, Ask>> {
  const rows = await selectRows<Ask & { key: string }>(
    `select g.source_key as key, m.name as "materialName", t.rate_g_per_m2 as "rateGPerM2",
            (t.action = 'plough' or coalesce((t.why->>'isPloughed')::boolean, false)) as "isPloughed"
       from plan_treatments t join segments g on g.id = t.segment_id left join materials m on m.id = t.material_id
      where t.plan_id = :planId`,
    { planId },
    tx,
  );
  return new Map(rows.map(({ key, ...ask }) => [key, ask]));
}

/** A plan worked out, as a dispatcher would have, from what was known at the time; a draft. */
export async function seedDraft(tx: Tx, { stormId, pass, dispatcherId, workedOutAt }: PlanSetting): Promise<number> {
  const { planId } = await workOutPlanIn(tx, { stormId, passNumber: pass, by: dispatcherId, now: workedOutAt });
  return planId;
}

/** The same, published, with what it asks of every road. */
export async function seedPublished(tx: Tx, setting: PlanSetting & { publishedAt: Date }): Promise<SeededPlan> {
  const planId = await seedDraft(tx, setting);
  await publishPlanIn(tx, { planId, by: setting.dispatcherId, now: setting.publishedAt });
  return { planId, asks: await asksOf(tx, planId) };
}
