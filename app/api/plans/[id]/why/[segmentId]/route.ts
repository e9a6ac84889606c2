import { findPlannedWhy } from '@/db/queries/storm-plans';
import { PlanOptions, PlanWhy } from '@/lib/contracts/plans';
import { PlannedWhyParams, PlannedWhyView } from '@/lib/contracts/storm-state';
import { Problem } from '@/lib/problem';
import { handle } from '@/lib/server/handle';

export const GET = handle(
  { action: 'roads.view', params: PlannedWhyParams, reply: PlannedWhyView },
  async ({ params }) => {
    const row = await findPlannedWhy({ planId: params.id, segmentId: params.segmentId });
    if (!row) throw new Problem('not-found', { what: 'road in this plan' });
    // Kept as it was written: a plan from before a field was added says less, and is not refused for it.
    const why = PlanWhy.safeParse(row.why);
    const options = PlanOptions.safeParse(row.options);
    return {
      why: why.success ? why.data : null,
      options: options.success ? options.data : [],
      forecastIssuedAt: row.forecastIssuedAt?.getTime() ?? null,
      policyVersion: row.policyVersion,
    };
  },
);
