import { type Recorded, type SpreadEntryInput } from '@/lib/contracts/runs';
import { Problem } from '@/lib/problem';
import { findRun } from '../queries/runs';
import { inTransaction, selectRows, type Tx } from '../transaction';
import { recordAudit } from './audit';

interface RecordSpreadEntry {
  entry: SpreadEntryInput;
  by: number;
  now: Date;
}

interface Recommendation {
  planId: number | null;
  materialId: number | null;
  rateGPerM2: number | null;
}

/** What the plan in force when the road was spread asked for on it. */
async function recommendationFor(tx: Tx, about: { stormId: number | null; segmentId: number; spreadAt: Date }) {
  const rows = await selectRows<Recommendation>(
    `select t.plan_id as "planId", t.material_id as "materialId", t.rate_g_per_m2 as "rateGPerM2"
       from plan_treatments t
      where t.plan_id = plan_in_force(:stormId, :spreadAt) and t.segment_id = :segmentId`,
    about,
    tx,
  );
  return rows[0] ?? { planId: null, materialId: null, rateGPerM2: null };
}

async function areaOf(tx: Tx, segmentId: number): Promise<number> {
  const rows = await selectRows<{ areaM2: number }>(
    'select length_m * width_m as "areaM2" from segments where id = :segmentId',
    { segmentId },
    tx,
  );
  if (!rows[0]) throw new Problem('not-found', { what: 'road' });
  return rows[0].areaM2;
}

/**
 * One road done (or skipped) on a run. Sent twice, it is recorded once; it is accepted after the run
 * was finished too, since a tablet may have been out of reach: what a truck spread never disappears.
 */
export async function recordSpreadEntry({ entry, by, now }: RecordSpreadEntry): Promise<Recorded> {
  return inTransaction(async (tx) => {
    const run = await findRun({ id: entry.runId }, tx);
    if (!run) throw new Problem('not-found', { what: 'run' });
    const areaM2 = await areaOf(tx, entry.segmentId);
    const recommended = await recommendationFor(tx, {
      stormId: run.stormId,
      segmentId: entry.segmentId,
      spreadAt: entry.spreadAt,
    });
    const inserted = await selectRows<{ id: string }>(
      `insert into spread_entries (id, run_id, segment_id, outcome, material_id, rate_g_per_m2, is_ploughed, plan_id,
         recommended_material_id, recommended_rate_g_per_m2, area_m2, rate_source, note, spread_at, recorded_at, recorded_by, amends_id)
       values (:id, :runId, :segmentId, :outcome, :materialId, :rateGPerM2, :isPloughed, :planId,
         :recommendedMaterialId, :recommendedRateGPerM2, :areaM2, :rateSource, :note, :spreadAt, :now, :by, :amendsId)
       on conflict (id) do nothing returning id`,
      {
        ...entry,
        planId: recommended.planId,
        recommendedMaterialId: recommended.materialId,
        recommendedRateGPerM2: recommended.rateGPerM2,
        areaM2,
        now,
        by,
      },
      tx,
    );
    if (inserted.length === 0) {
      await refuseOtherEntry(tx, entry);
      return { id: entry.id, result: 'already-recorded' };
    }
    await recordAudit(tx, {
      personId: by,
      action: entry.amendsId ? 'run.amend' : 'run.log',
      subjectKind: 'spread-entry',
      subjectId: entry.id,
      detail: { runId: entry.runId, segmentId: entry.segmentId, outcome: entry.outcome, rateGPerM2: entry.rateGPerM2 },
    });
    return { id: entry.id, result: 'recorded' };
  });
}

/** The same id with another content is a fault of the sender: it must hear so, or its entry would be lost. */
async function refuseOtherEntry(tx: Tx, entry: SpreadEntryInput): Promise<void> {
  const rows = await selectRows<{ isSame: boolean }>(
    `select run_id = :runId and segment_id = :segmentId and outcome = :outcome
        and rate_g_per_m2 is not distinct from :rateGPerM2::float8 as "isSame"
       from spread_entries where id = :id`,
    { ...entry },
    tx,
  );
  if (!rows[0]?.isSame) throw new Problem('already-exists', { what: 'an entry with this id and another content' });
}
