import { type Migration } from '@/db/migrate';

/**
 * A month is now made beside the table and attached: `create table … partition of` would wait for every reader of the
 * readings and keep all later ones waiting behind it; attaching an empty table waits for nobody.
 *
 * `first_known`: the first value that is not null, in the order the rows come. The step function is strict and there is
 * no initial value, so that for the usual one value a group it is never called.
 */
export const up: Migration['up'] = async ({ sql }) => {
  await sql(`
    create or replace function ensure_readings_partition(month_of timestamptz) returns void language plpgsql as $$
    declare
      first_at timestamptz := date_trunc('month', month_of at time zone 'UTC') at time zone 'UTC';
      next_at timestamptz := (date_trunc('month', month_of at time zone 'UTC') + interval '1 month') at time zone 'UTC';
      partition_name text := 'readings_' || to_char(first_at at time zone 'UTC', 'YYYY_MM');
    begin
      if to_regclass(partition_name) is null then
        perform pg_advisory_xact_lock(hashtext('readings-partition'));
        if to_regclass(partition_name) is null then
          execute format('create table %I (like readings including all)', partition_name);
          execute format('alter table readings attach partition %I for values from (%L) to (%L)', partition_name, first_at, next_at);
        end if;
      end if;
    end $$;

    create function first_known_step(anyelement, anyelement) returns anyelement
      language sql immutable strict parallel safe as 'select $1';
    create aggregate first_known(anyelement) (sfunc = first_known_step, stype = anyelement);
    alter table uploads add column rows_empty integer not null default 0;
    create index uploads_by_content on uploads (station_id, sha256);
  `);
};

export const down: Migration['down'] = async ({ sql }) => {
  await sql(`
    drop index uploads_by_content;
    alter table uploads drop column rows_empty;
    drop aggregate first_known(anyelement);
    drop function first_known_step(anyelement, anyelement);
    create or replace function ensure_readings_partition(month_of timestamptz) returns void language plpgsql as $$
    declare
      first_at timestamptz := date_trunc('month', month_of at time zone 'UTC') at time zone 'UTC';
      next_at timestamptz := (date_trunc('month', month_of at time zone 'UTC') + interval '1 month') at time zone 'UTC';
      partition_name text := 'readings_' || to_char(first_at at time zone 'UTC', 'YYYY_MM');
    begin
      if to_regclass(partition_name) is null then
        perform pg_advisory_xact_lock(hashtext('readings-partition'));
        if to_regclass(partition_name) is null then
          execute format('create table %I partition of readings for values from (%L) to (%L)', partition_name, first_at, next_at);
        end if;
      end if;
    end $$;
  `);
};
