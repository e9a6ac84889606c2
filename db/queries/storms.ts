import { selectRows, type Tx } from '../transaction';

export interface StormRow {
  id: number;
  number: number;
  name: string;
  fromAt: Date;
  untilAt: Date;
  openedAt: Date;
  openedByName: string;
  closedAt: Date | null;
  closedByName: string | null;
  passes: number;
  publishedPlans: number;
  /** number of the pass that the newest published plan is for */
  newestPublishedPass: number | null;
  runs: number;
}

const columns = `
  select s.id, s.number, s.name, s.from_at as "fromAt", s.until_at as "untilAt", s.opened_at as "openedAt",
         o.name as "openedByName", s.closed_at as "closedAt", c.name as "closedByName",
         (select count(*) from storm_passes p where p.storm_id = s.id)::int as passes,
         (select count(*) from plans p where p.storm_id = s.id and p.published_at is not null)::int as "publishedPlans",
         (select p.pass_number from plans p where p.storm_id = s.id and p.published_at is not null
           order by p.published_at desc limit 1) as "newestPublishedPass",
         (select count(*) from runs r where r.storm_id = s.id)::int as runs
    from storms s
    join people o on o.id = s.opened_by
    left join people c on c.id = s.closed_by`;

/** Storms, newest first. */
export async function listStorms(): Promise<StormRow[]> {
  return selectRows<StormRow>(`${columns} order by s.opened_at desc`);
}

export async function findStormRow({ id }: { id: number }): Promise<StormRow | null> {
  const rows = await selectRows<StormRow>(`${columns} where s.id = :id`, { id });
  return rows[0] ?? null;
}

export interface StormPassRow {
  number: number;
  startsAt: Date;
}

export async function listStormPasses({ stormId }: { stormId: number }, tx?: Tx): Promise<StormPassRow[]> {
  return selectRows<StormPassRow>(
    'select number, starts_at as "startsAt" from storm_passes where storm_id = :stormId order by starts_at',
    { stormId },
    tx,
  );
}

export interface ClassExtent {
  serviceClass: 'A' | 'B' | 'C' | 'D';
  roads: number;
  laneKm: number;
}

/** How much road each class has. */
export async function listClassExtents(): Promise<ClassExtent[]> {
  return selectRows<ClassExtent>(
    `select service_class as "serviceClass", count(*)::int as roads, sum(length_m * lanes) / 1000 as "laneKm"
       from segments where retired_at is null group by service_class order by service_class`,
  );
}
