import { type Migration } from '@/db/migrate';

export const up: Migration['up'] = async ({ sql }) => {
  await sql(`
    create table yards (
      id integer generated always as identity primary key,
      name text not null constraint yards_name_once unique,
      position geometry(Point, 4326) not null,
      solid_capacity_kg double precision not null constraint yards_solid_capacity_not_negative check (solid_capacity_kg >= 0),
      brine_capacity_l double precision not null constraint yards_brine_capacity_not_negative check (brine_capacity_l >= 0),
      is_active boolean not null default true
    );

    create table materials (
      id integer generated always as identity primary key,
      name text not null constraint materials_name_once unique,
      form text not null constraint materials_form_known check (form in ('solid', 'prewet', 'liquid', 'abrasive')),
      -- mass fractions of anhydrous salts in the product, {"NaCl": 0.233}; what is left is water or inert
      composition jsonb not null,
      water_mass_fraction double precision not null
        constraint materials_water_is_fraction check (water_mass_fraction between 0 and 1),
      density_kg_per_m3 double precision not null constraint materials_density_in_range check (density_kg_per_m3 between 500 and 3000),
      cost_cents_per_tonne integer not null constraint materials_cost_not_negative check (cost_cents_per_tonne >= 0),
      practical_minimum_c double precision,
      -- a pre-wetted product names the two it is mixed from
      solid_material_id integer references materials,
      liquid_material_id integer references materials,
      liquid_mass_fraction double precision constraint materials_liquid_is_fraction check (liquid_mass_fraction between 0 and 1),
      is_active boolean not null default true,
      constraint materials_prewet_names_its_parts check
        (form <> 'prewet' or (solid_material_id is not null and liquid_material_id is not null and liquid_mass_fraction is not null))
    );

    create table trucks (
      id integer generated always as identity primary key,
      number integer not null constraint trucks_number_once unique,
      name text not null,
      yard_id integer not null references yards,
      plough_width_m double precision constraint trucks_plough_width_in_range check (plough_width_m between 1 and 8),
      is_active boolean not null default true
    );

    create table spreaders (
      id integer generated always as identity primary key,
      truck_id integer not null references trucks,
      name text not null,
      hopper_kg double precision not null constraint spreaders_hopper_not_negative check (hopper_kg >= 0),
      tank_l double precision not null constraint spreaders_tank_not_negative check (tank_l >= 0),
      min_rate_g_per_m2 double precision not null,
      max_rate_g_per_m2 double precision not null,
      max_liquid_rate_ml_per_m2 double precision,
      calibrated_on date,
      constraint spreaders_rates_in_order check (min_rate_g_per_m2 >= 0 and max_rate_g_per_m2 > min_rate_g_per_m2)
    );
    create index spreaders_by_truck on spreaders (truck_id);
  `);
};

export const down: Migration['down'] = async ({ sql }) => {
  await sql('drop table spreaders, trucks, materials, yards');
};
