import { selectRows } from '../transaction';

export type PlannedAction = 'nothing' | 'plough' | 'anti-ice' | 'pre-wet' | 'solid' | 'abrasives' | 'undecided';

export interface PlanRecord {
  id: number;
  version: number;
  passNumber: number;
  workedOutAt: Date;
  publishedAt: Date | null;
}

/** The newest plan of a storm, draft or published. */
export async function findCurrentPlan({ stormId }: { stormId: number }): Promise<PlanRecord | null> {
  const rows = await selectRows<PlanRecord>(
    `select id, version, pass_number as "passNumber", worked_out_at as "workedOutAt", published_at as "publishedAt"
       from plans where storm_id = :stormId order by version desc limit 1`,
    { stormId },
  );
  return rows[0] ?? null;
}

export interface PlannedRecord {
  segmentId: number;
  action: PlannedAction;
  isPloughed: boolean;
  materialId: number | null;
  rateGPerM2: number | null;
  rateMlPerM2: number | null;
  reason: string;
}

/** What a plan says of every road. Whether it ploughs stands in `why`, since plough and salt go together. */
export async function listPlanned({ planId }: { planId: number }): Promise<PlannedRecord[]> {
  return selectRows<PlannedRecord>(
    `select segment_id as "segmentId", action,
            (action = 'plough' or coalesce((why->>'isPloughed')::boolean, false)) as "isPloughed",
            material_id as "materialId", rate_g_per_m2 as "rateGPerM2", rate_ml_per_m2 as "rateMlPerM2", reason
       from plan_treatments where plan_id = :planId`,
    { planId },
  );
}

export interface PlannedWhyRecord {
  why: unknown;
  options: unknown;
}

/** Why a plan says so of one road. */
export async function findPlannedWhy(key: { planId: number; segmentId: number }): Promise<PlannedWhyRecord | null> {
  const rows = await selectRows<PlannedWhyRecord>(
    'select why, options from plan_treatments where plan_id = :planId and segment_id = :segmentId',
    key,
  );
  return rows[0] ?? null;
}
