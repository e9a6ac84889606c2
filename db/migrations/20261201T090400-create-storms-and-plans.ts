import { type Migration } from '@/db/migrate';

export const up: Migration['up'] = async ({ sql }) => {
  await sql(`
    create table storms (
      id integer generated always as identity primary key,
      number integer not null constraint storms_number_once unique,
      name text not null,
      from_at timestamptz not null,
      until_at timestamptz not null,
      opened_at timestamptz not null,
      opened_by integer not null references people,
      closed_at timestamptz,
      closed_by integer references people,
      constraint storms_times_in_order check (until_at > from_at)
    );

    create table storm_passes (
      storm_id integer not null references storms,
      number integer not null,
      starts_at timestamptz not null,
      primary key (storm_id, number)
    );

    create table plans (
      id integer generated always as identity primary key,
      storm_id integer not null,
      pass_number integer not null,
      version integer not null,
      forecast_id integer references forecasts,
      policy_version integer not null references policies,
      worked_out_at timestamptz not null,
      worked_out_by integer not null references people,
      published_at timestamptz,
      published_by integer references people,
      -- what was known: reading ages, forecast issue, policy, materials offered
      inputs jsonb not null,
      summary jsonb not null,
      foreign key (storm_id, pass_number) references storm_passes (storm_id, number),
      constraint plans_version_once unique (storm_id, version)
    );

    create table plan_treatments (
      plan_id integer not null references plans,
      segment_id integer not null references segments,
      action text not null constraint plan_treatments_action_known
        check (action in ('nothing', 'plough', 'anti-ice', 'pre-wet', 'solid', 'abrasives', 'undecided')),
      material_id integer references materials,
      rate_g_per_m2 double precision constraint plan_treatments_rate_in_range check (rate_g_per_m2 between 0 and 1000),
      rate_ml_per_m2 double precision,
      hold_min double precision,
      reason text not null,
      -- inputs, binding moment, losses, limits met, cautions
      why jsonb not null,
      -- the least rate of every material, or why it is refused
      options jsonb not null,
      primary key (plan_id, segment_id)
    );

    create function refuse_change() returns trigger language plpgsql as $$
    begin
      raise exception using errcode = 'RW001', message = format('%s rows are never changed or removed', tg_table_name);
    end $$;

    -- A published plan is what drivers were told: neither it nor its rows may change.
    create function refuse_change_of_published_plan() returns trigger language plpgsql as $$
    begin
      if old.published_at is not null then
        raise exception using errcode = 'RW002', message = format('plan %s is published and cannot change', old.id);
      end if;
      if tg_op = 'DELETE' then return old; end if;
      return new;
    end $$;
    create trigger plans_published_stay before update or delete on plans
      for each row execute function refuse_change_of_published_plan();

    create function refuse_treatment_of_published_plan() returns trigger language plpgsql as $$
    declare
      touched integer := case when tg_op = 'INSERT' then new.plan_id else old.plan_id end;
    begin
      if exists (select 1 from plans where id = touched and published_at is not null) then
        raise exception using errcode = 'RW002', message = format('plan %s is published and cannot change', touched);
      end if;
      if tg_op = 'DELETE' then return old; end if;
      return new;
    end $$;
    create trigger plan_treatments_published_stay before insert or update or delete on plan_treatments
      for each row execute function refuse_treatment_of_published_plan();
    create trigger plan_treatments_keep before truncate on plan_treatments execute function refuse_change();

    create trigger forecasts_keep before update or delete on forecasts for each row execute function refuse_change();
    create trigger forecast_hours_keep before update or delete on forecast_hours for each row execute function refuse_change();
  `);
};

export const down: Migration['down'] = async ({ sql }) => {
  await sql(`
    drop trigger forecasts_keep on forecasts;
    drop trigger forecast_hours_keep on forecast_hours;
    drop table plan_treatments, plans, storm_passes, storms;
    drop function refuse_treatment_of_published_plan();
    drop function refuse_change_of_published_plan();
    drop function refuse_change();
  `);
};
