import { selectRows } from '../transaction';

export type PlannedAction = 'nothing' | 'plough' | 'anti-ice' | 'pre-wet' | 'solid' | 'abrasives' | 'undecided';

export interface PlanRecord {
  id: number;
  version: number;
  passNumber: number;
  workedOutAt: Date;
  publishedAt: Date | null;
}

/** The newest plan, draft or published, of each pass that is under way or still to come, by pass. */
export async function listCurrentPlans({ stormId, at }: { stormId: number; at: Date }): Promise<PlanRecord[]> {
  return selectRows<PlanRecord>(
    `select distinct on (p.pass_number) p.id, p.version, p.pass_number as "passNumber",
            p.worked_out_at as "workedOutAt", p.published_at as "publishedAt"
       from plans p
       join (select number, lead(starts_at, 1, 'infinity') over (order by starts_at) as until_at
               from storm_passes where storm_id = :stormId) pass on pass.number = p.pass_number
      where p.storm_id = :stormId and pass.until_at > :at
      order by p.pass_number, p.version desc`,
    { stormId, at },
  );
}

export interface PlannedRecord {
  planId: number;
  segmentId: number;
  action: PlannedAction;
  isPloughed: boolean;
  materialId: number | null;
  rateGPerM2: number | null;
  rateMlPerM2: number | null;
  reason: string;
}

/** What plans say of every road. Whether they plough stands in `why`, since plough and salt go together. */
export async function listPlanned({ planIds }: { planIds: readonly number[] }): Promise<PlannedRecord[]> {
  if (planIds.length === 0) return [];
  return selectRows<PlannedRecord>(
    `select plan_id as "planId", segment_id as "segmentId", action,
            (action = 'plough' or coalesce((why->>'isPloughed')::boolean, false)) as "isPloughed",
            material_id as "materialId", rate_g_per_m2 as "rateGPerM2", rate_ml_per_m2 as "rateMlPerM2", reason
       from plan_treatments where plan_id in (:planIds)`,
    { planIds },
  );
}

export interface PlannedWhyRecord {
  why: unknown;
  options: unknown;
  forecastIssuedAt: Date | null;
  policyVersion: number;
}

/** Why a plan says so of one road. */
export async function findPlannedWhy(key: { planId: number; segmentId: number }): Promise<PlannedWhyRecord | null> {
  const rows = await selectRows<PlannedWhyRecord>(
    `select t.why, t.options, f.issued_at as "forecastIssuedAt", p.policy_version as "policyVersion"
       from plan_treatments t
       join plans p on p.id = t.plan_id
       left join forecasts f on f.id = p.forecast_id
      where t.plan_id = :planId and t.segment_id = :segmentId`,
    key,
  );
  return rows[0] ?? null;
}
