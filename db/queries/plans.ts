import { selectRows, type Tx } from '../transaction';

export interface PlanHead {
  id: number;
  stormId: number;
  passNumber: number;
  version: number;
  policyVersion: number;
  workedOutAt: Date;
  workedOutByName: string;
  publishedAt: Date | null;
  publishedByName: string | null;
  inputs: unknown;
  summary: unknown;
}

/** Every version of a storm's plan, newest first. */
export async function listPlans({ stormId }: { stormId: number }): Promise<PlanHead[]> {
  return selectRows<PlanHead>(
    `select p.id, p.storm_id as "stormId", p.pass_number as "passNumber", p.version,
            p.policy_version as "policyVersion", p.worked_out_at as "workedOutAt", w.name as "workedOutByName",
            p.published_at as "publishedAt", b.name as "publishedByName", p.inputs, p.summary
       from plans p
       join people w on w.id = p.worked_out_by
       left join people b on b.id = p.published_by
      where p.storm_id = :stormId
      order by p.version desc`,
    { stormId },
  );
}

export interface PlanTreatmentRecord {
  segmentId: number;
  roadName: string;
  serviceClass: 'A' | 'B' | 'C' | 'D';
  action: string;
  materialName: string | null;
  rateGPerM2: number | null;
  rateMlPerM2: number | null;
  holdMin: number | null;
  reason: string;
}

export async function listPlanTreatments({ planId }: { planId: number }, tx?: Tx): Promise<PlanTreatmentRecord[]> {
  return selectRows<PlanTreatmentRecord>(
    `select t.segment_id as "segmentId", g.name as "roadName", g.service_class as "serviceClass", t.action,
            m.name as "materialName", t.rate_g_per_m2 as "rateGPerM2", t.rate_ml_per_m2 as "rateMlPerM2",
            t.hold_min as "holdMin", t.reason
       from plan_treatments t
       join segments g on g.id = t.segment_id
       left join materials m on m.id = t.material_id
      where t.plan_id = :planId
      order by g.service_class, g.name, g.id`,
    { planId },
    tx,
  );
}
