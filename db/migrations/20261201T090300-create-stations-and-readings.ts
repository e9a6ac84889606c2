import { type Migration } from '@/db/migrate';

/**
 * Readings are one wide row a station and time, not a row a quantity: a station reports all its
 * quantities at once, every screen wants them together, and a row in place of eight makes loading
 * several times faster. A second probe at the same place is a second station.
 */
export const up: Migration['up'] = async ({ sql }) => {
  await sql(`
    create table stations (
      id integer generated always as identity primary key,
      name text not null constraint stations_name_once unique,
      position geometry(Point, 4326) not null,
      height_m double precision not null default 0,
      zone text not null,
      is_active boolean not null default true
    );

    create table sensors (
      id integer generated always as identity primary key,
      station_id integer not null references stations,
      quantity text not null,
      depth_m double precision,
      installed_on date,
      note text not null default '',
      constraint sensors_quantity_once unique (station_id, quantity)
    );

    create table station_keys (
      id integer generated always as identity primary key,
      station_id integer not null references stations,
      key_hash text not null constraint station_keys_hash_once unique,
      hint text not null,
      issued_at timestamptz not null,
      issued_by integer not null references people,
      revoked_at timestamptz
    );

    create table station_mappings (
      station_id integer primary key references stations,
      mapping jsonb not null,
      updated_at timestamptz not null,
      updated_by integer not null references people
    );

    create table uploads (
      id integer generated always as identity primary key,
      station_id integer not null references stations,
      file_name text not null,
      sha256 text not null,
      bytes double precision not null,
      mapping jsonb not null,
      source text not null constraint uploads_source_known check (source in ('screen', 'script')),
      uploaded_by integer references people,
      station_key_id integer references station_keys,
      started_at timestamptz not null,
      finished_at timestamptz not null,
      rows_read integer not null,
      rows_added integer not null,
      rows_filled integer not null,
      rows_unchanged integer not null,
      rows_rejected integer not null,
      rows_flagged integer not null
    );
    create index uploads_by_station on uploads (station_id, started_at desc);

    create table upload_rejects (
      upload_id integer not null references uploads,
      line integer not null,
      column_name text not null,
      reason text not null,
      raw text not null,
      primary key (upload_id, line, column_name)
    );

    create table readings (
      station_id integer not null,
      observed_at timestamptz not null,
      pavement_temp_c double precision,
      air_temp_c double precision,
      dew_point_c double precision,
      relative_humidity double precision,
      wind_speed_m_per_s double precision,
      wind_gust_m_per_s double precision,
      wind_direction_deg double precision,
      precipitation_mm double precision,
      precipitation_type text,
      subsurface_temp_c double precision,
      freezing_point_c double precision,
      solar_w_per_m2 double precision,
      visibility_m double precision,
      water_mm double precision,
      surface_status text,
      -- quantity -> names of the checks it failed; null when none did
      flags jsonb,
      upload_id integer,
      primary key (station_id, observed_at)
    ) partition by range (observed_at);

    -- One partition a month, made when the first reading of that month comes. The lock keeps two
    -- uploads from making the same month at once.
    create function ensure_readings_partition(month_of timestamptz) returns void language plpgsql as $$
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

    create table forecasts (
      id integer generated always as identity primary key,
      source text not null,
      issued_at timestamptz not null,
      received_at timestamptz not null
    );
    create index forecasts_by_issue on forecasts (issued_at desc);

    create table forecast_hours (
      forecast_id integer not null references forecasts,
      station_id integer not null references stations,
      valid_at timestamptz not null,
      pavement_temp_c double precision,
      -- one standard deviation, °C
      pavement_error_c double precision,
      air_temp_c double precision,
      dew_point_c double precision,
      wind_speed_m_per_s double precision,
      -- amount in the hour that ends at valid_at
      precipitation_mm double precision,
      precipitation_type text,
      primary key (forecast_id, station_id, valid_at)
    );
  `);
};

export const down: Migration['down'] = async ({ sql }) => {
  await sql(`
    drop table forecast_hours, forecasts, readings, upload_rejects, uploads, station_mappings, station_keys, sensors, stations;
    drop function ensure_readings_partition(timestamptz);
  `);
};
