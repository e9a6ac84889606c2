import { selectRows } from '../transaction';

export interface LedgerEntryRecord {
  id: string;
  runId: string;
  segmentId: number;
  roadName: string;
  serviceClass: string;
  lanes: number;
  lengthM: number;
  areaM2: number;
  isSensitive: boolean;
  outcome: 'spread' | 'ploughed' | 'skipped';
  materialId: number | null;
  materialName: string | null;
  rateGPerM2: number | null;
  recommendedMaterialId: number | null;
  recommendedMaterialName: string | null;
  recommendedRateGPerM2: number | null;
  spreadAt: Date;
  recordedAt: Date;
  note: string;
  amendsId: string | null;
}

/** Every entry of a storm that no amendment replaces, in the order spread. */
export async function listLedgerEntries({ stormId }: { stormId: number }): Promise<LedgerEntryRecord[]> {
  return selectRows<LedgerEntryRecord>(
    `select e.id, e.run_id as "runId", e.segment_id as "segmentId", g.name as "roadName",
            g.service_class as "serviceClass", g.lanes, g.length_m as "lengthM", e.area_m2 as "areaM2",
            g.is_sensitive as "isSensitive", e.outcome, e.material_id as "materialId", m.name as "materialName",
            e.rate_g_per_m2 as "rateGPerM2", e.recommended_material_id as "recommendedMaterialId",
            rm.name as "recommendedMaterialName", e.recommended_rate_g_per_m2 as "recommendedRateGPerM2",
            e.spread_at as "spreadAt", e.recorded_at as "recordedAt", e.note, e.amends_id as "amendsId"
       from spread_entries e
       join runs r on r.id = e.run_id
       join segments g on g.id = e.segment_id
       left join materials m on m.id = e.material_id
       left join materials rm on rm.id = e.recommended_material_id
      where r.storm_id = :stormId
        and not exists (select 1 from spread_entries a where a.amends_id = e.id)
      order by e.spread_at, e.id`,
    { stormId },
  );
}
