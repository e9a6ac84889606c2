import { type Migration } from '@/db/migrate';

/** Ids of runs, entries and loads are made on the tablet, so that sending twice is harmless. */
export const up: Migration['up'] = async ({ sql }) => {
  await sql(`
    create table runs (
      id uuid primary key,
      storm_id integer references storms,
      plan_id integer references plans,
      route_id integer references routes,
      truck_id integer not null references trucks,
      driver_id integer not null references people,
      started_at timestamptz not null,
      finished_at timestamptz,
      recorded_at timestamptz not null,
      constraint runs_times_in_order check (finished_at is null or finished_at >= started_at)
    );
    create index runs_by_storm on runs (storm_id);
    -- A truck, and a driver, is on one run at a time.
    create unique index runs_truck_on_one_run on runs (truck_id) where finished_at is null;
    create unique index runs_driver_on_one_run on runs (driver_id) where finished_at is null;

    create table run_segments (
      run_id uuid not null references runs,
      position integer not null,
      segment_id integer not null references segments,
      primary key (run_id, position)
    );

    create table spread_entries (
      id uuid primary key,
      run_id uuid not null references runs,
      segment_id integer not null references segments,
      outcome text not null constraint spread_entries_outcome_known check (outcome in ('spread', 'ploughed', 'skipped')),
      material_id integer references materials,
      rate_g_per_m2 double precision constraint spread_entries_rate_in_range check (rate_g_per_m2 between 0 and 1000),
      is_ploughed boolean not null default false,
      -- what the plan asked for when the driver logged it; null when there was none
      plan_id integer references plans,
      recommended_material_id integer references materials,
      recommended_rate_g_per_m2 double precision,
      area_m2 double precision not null constraint spread_entries_area_positive check (area_m2 > 0),
      rate_source text not null constraint spread_entries_rate_source_known
        check (rate_source in ('as-shown', 'typed', 'controller')),
      note text not null default '',
      spread_at timestamptz not null,
      recorded_at timestamptz not null,
      recorded_by integer not null references people,
      -- an amendment stands beside the entry it corrects
      amends_id uuid references spread_entries,
      constraint spread_entries_spread_has_rate check (outcome <> 'spread' or (material_id is not null and rate_g_per_m2 is not null))
    );
    create index spread_entries_by_run on spread_entries (run_id, spread_at);
    create index spread_entries_by_segment on spread_entries (segment_id, spread_at desc);

    create table loads (
      id uuid primary key,
      run_id uuid not null references runs,
      yard_id integer not null references yards,
      material_id integer not null references materials,
      mass_kg double precision not null constraint loads_mass_positive check (mass_kg > 0 and mass_kg <= 60000),
      loaded_at timestamptz not null,
      recorded_at timestamptz not null,
      recorded_by integer not null references people
    );
    create index loads_by_run on loads (run_id);

    create trigger spread_entries_keep before update or delete on spread_entries for each row execute function refuse_change();
    create trigger spread_entries_stay before truncate on spread_entries execute function refuse_change();
    create trigger loads_keep before update or delete on loads for each row execute function refuse_change();
    create trigger loads_stay before truncate on loads execute function refuse_change();

    -- A finished run stays finished, and nothing else of a run ever changes.
    create function refuse_change_of_run() returns trigger language plpgsql as $$
    begin
      if tg_op = 'UPDATE' and old.finished_at is null
        and (to_jsonb(new) - 'finished_at') = (to_jsonb(old) - 'finished_at') then
        return new;
      end if;
      raise exception using errcode = 'RW001', message = 'runs are only ever finished, never changed or removed';
    end $$;
    create trigger runs_keep before update or delete on runs for each row execute function refuse_change_of_run();
  `);
};

export const down: Migration['down'] = async ({ sql }) => {
  await sql(`
    drop table loads, spread_entries, run_segments, runs;
    drop function refuse_change_of_run();
  `);
};
