import { selectRows } from '../transaction';

export interface PublicStorm {
  id: number;
  number: number;
  name: string;
  openedAt: Date;
  untilAt: Date;
  /** of the newest published plan; null while none is */
  publishedAt: Date | null;
  passNumber: number | null;
}

export interface PublicRoad {
  name: string;
  serviceClass: 'A' | 'B' | 'C' | 'D';
  parts: number;
  /** parts that were spread or ploughed since the storm was opened */
  treatedParts: number;
  lastTreatedAt: Date | null;
}

/** The storm under way, if any, with what the public may know of it. */
export async function findPublicStorm(): Promise<PublicStorm | null> {
  const rows = await selectRows<PublicStorm>(
    `select s.id, s.number, s.name, s.opened_at as "openedAt", s.until_at as "untilAt",
            p.published_at as "publishedAt", p.pass_number as "passNumber"
       from storms s
       left join plans p on p.id = plan_in_force(s.id, now())
      where s.closed_at is null
      order by s.opened_at desc limit 1`,
  );
  return rows[0] ?? null;
}

/** Roads by name, of the plan in force, those not wholly treated first. Rates, materials, trucks and people are nobody's business here. */
export async function listPublicRoads({ stormId }: { stormId: number }): Promise<PublicRoad[]> {
  return selectRows<PublicRoad>(
    `with plan as (
       select plan_in_force(:stormId, now()) as id
     ), storm as (
       select opened_at from storms where id = :stormId
     ), treated as (
       select e.segment_id, max(e.spread_at) as at
         from spread_entries e, storm
        where e.outcome in ('spread', 'ploughed') and e.spread_at >= storm.opened_at
          and not exists (select 1 from spread_entries later where later.amends_id = e.id)
        group by e.segment_id
     )
     select g.name, g.service_class as "serviceClass", count(*)::int as parts,
            count(treated.segment_id)::int as "treatedParts", max(treated.at) as "lastTreatedAt"
       from plan_treatments t
       join plan on plan.id = t.plan_id
       join segments g on g.id = t.segment_id and g.retired_at is null
       left join treated on treated.segment_id = g.id
      group by g.name, g.service_class
      order by g.service_class, count(treated.segment_id) = count(*), g.name`,
    { stormId },
  );
}
