import { notFound } from 'next/navigation';
import { type StormContent } from '@/components/storm/storm-content';
import { findAgency } from '@/db/queries/agency';
import { findForecast } from '@/db/queries/forecasts';
import { listPlans, type PlanHead } from '@/db/queries/plans';
import { listPolicies } from '@/db/queries/policy';
import { findStormRow, listClassExtents, listStormPasses } from '@/db/queries/storms';
import { PlanInputs, PlanSummary } from '@/lib/contracts/plans';
import { readPolicy } from '@/lib/contracts/policy';
import { StormParams } from '@/lib/contracts/storms';
import { refusal, requirePage } from '@/lib/server/page';
import { StormScreen } from './storm-screen';

export const metadata = { title: 'Storm' };

function planVersion({ workedOutAt, publishedAt, inputs, summary, ...plan }: PlanHead): StormContent['plans'][number] {
  return {
    ...plan,
    workedOutAt: workedOutAt.getTime(),
    publishedAt: publishedAt?.getTime() ?? null,
    inputs: PlanInputs.safeParse(inputs).data ?? null,
    summary: PlanSummary.safeParse(summary).data ?? null,
  };
}

async function readStorm(id: number, now: Date): Promise<StormContent | null> {
  const [storm, passes, plans, extents, forecast, policies, agency] = await Promise.all([
    findStormRow({ id }),
    listStormPasses({ stormId: id }),
    listPlans({ stormId: id }),
    listClassExtents(),
    findForecast({ at: now }),
    listPolicies(),
    findAgency(),
  ]);
  if (!storm) return null;
  const policy = readPolicy(policies[0]?.rules);
  const untilAt = storm.untilAt.getTime();
  return {
    storm: { ...storm, fromAt: storm.fromAt.getTime(), untilAt, closedAt: storm.closedAt?.getTime() ?? null },
    passes: passes.map(({ number, startsAt }, index) => ({
      number,
      startsAt: startsAt.getTime(),
      untilAt: passes[index + 1]?.startsAt.getTime() ?? untilAt,
    })),
    plans: plans.map(planVersion),
    classes: extents.map((extent) => ({ ...extent, promise: policy.promises[extent.serviceClass] })),
    forecast: forecast && {
      source: forecast.source,
      issuedAt: forecast.issuedAt.getTime(),
      untilAt: forecast.untilAt?.getTime() ?? null,
    },
    policyVersion: policies[0]?.version ?? null,
    currency: agency.currency,
    zone: agency.zone,
    nowAt: now.getTime(),
  };
}

export default async function StormPage({ params }: PageProps<'/storm/[id]'>) {
  const actor = await requirePage('storms.view');
  const parsed = StormParams.safeParse(await params);
  const content = parsed.success ? await readStorm(parsed.data.id, new Date()) : null;
  if (!content) notFound();
  return (
    <StormScreen
      content={content}
      refusals={{
        open: refusal(actor, 'storms.open'),
        workOut: refusal(actor, 'plans.work-out'),
        publish: refusal(actor, 'plans.publish'),
      }}
    />
  );
}
