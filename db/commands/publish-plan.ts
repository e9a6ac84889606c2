import { Problem } from '@/lib/problem';
import { database } from '../connection';
import { inTransaction, selectRows, type Tx } from '../transaction';
import { recordAudit } from './audit';

interface PublishPlan {
  planId: number;
  by: number;
  now: Date;
}

/** In a transaction of the caller's own: see `publishPlan`. */
export async function publishPlanIn(tx: Tx, { planId, by, now }: PublishPlan): Promise<{ planId: number }> {
  const plan = await database().models.Plan.findByPk(planId, { transaction: tx });
  if (!plan) throw new Problem('not-found', { what: 'plan' });
  // The storm is locked as in working out and closing: a newer version or a close cannot come in between.
  const storm = await database().models.Storm.findByPk(plan.stormId, { transaction: tx, lock: tx.LOCK.UPDATE });
  await plan.reload({ transaction: tx });
  if (plan.publishedAt) throw new Problem('plan-published');
  if (storm?.closedAt && storm.closedAt <= now) {
    throw new Problem('not-possible-now', {
      reason: `Storm ${storm.number} is closed.`,
      todo: 'Open a storm before publishing a plan.',
    });
  }
  const [newer] = await selectRows<{ version: number }>(
    'select max(version) as version from plans where storm_id = :stormId having max(version) > :version',
    { stormId: plan.stormId, version: plan.version },
    tx,
  );
  if (newer) {
    throw new Problem('not-possible-now', {
      reason: `Version ${newer.version} was worked out after version ${plan.version}.`,
      todo: `Look at version ${newer.version} and publish that one.`,
    });
  }
  await plan.update({ publishedAt: now, publishedBy: by }, { transaction: tx });
  await recordAudit(tx, {
    personId: by,
    action: 'plans.publish',
    subjectKind: 'plan',
    subjectId: planId,
    detail: { stormId: plan.stormId, passNumber: plan.passNumber, version: plan.version },
    recordedAt: now,
  });
  return { planId };
}

/**
 * Makes a plan what drivers are told. From then on nobody changes it (a trigger of the database holds that); a mistake
 * is mended by working the pass out again. Only the newest version of an open storm can be published.
 */
export async function publishPlan(command: PublishPlan): Promise<{ planId: number }> {
  return inTransaction((tx) => publishPlanIn(tx, command));
}
