import { type Migration } from '@/db/migrate';

/**
 * Which published plan counts at a time: that of the pass whose trucks are out or about to leave (they load three
 * quarters of an hour before it; common practice, no source), in its newest version. A later pass published early does
 * not take over before its time; before the first pass, the first one counts.
 */
export const up: Migration['up'] = async ({ sql }) => {
  await sql(`
    create function plan_in_force(of_storm integer, at_time timestamptz) returns integer language sql stable as $$
      select p.id
        from plans p
        join storm_passes s on s.storm_id = p.storm_id and s.number = p.pass_number
       where p.storm_id = of_storm and p.published_at <= at_time
       order by (s.starts_at <= at_time + interval '45 minutes') desc,
                case when s.starts_at <= at_time + interval '45 minutes' then s.starts_at end desc,
                s.starts_at, p.version desc
       limit 1
    $$;
  `);
};

export const down: Migration['down'] = async ({ sql }) => {
  await sql('drop function plan_in_force(integer, timestamptz)');
};
