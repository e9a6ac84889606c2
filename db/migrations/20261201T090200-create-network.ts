import { type Migration } from '@/db/migrate';

export const up: Migration['up'] = async ({ sql }) => {
  await sql(`
    create table network_imports (
      id integer generated always as identity primary key,
      state text not null constraint network_imports_state_known
        check (state in ('previewed', 'applied', 'undone', 'discarded')),
      file_name text not null,
      sha256 text not null,
      attribution text not null default '',
      class_mapping jsonb not null,
      report jsonb not null,
      -- the network as built, kept so that saving needs no second upload
      payload jsonb not null,
      -- rows as they were before saving, for undo
      before_image jsonb,
      created_at timestamptz not null default now(),
      created_by integer references people,
      applied_at timestamptz,
      applied_by integer references people,
      undone_at timestamptz,
      undone_by integer references people
    );

    create table nodes (
      id integer generated always as identity primary key,
      position geometry(Point, 4326) not null,
      source_key text not null constraint nodes_source_key_once unique
    );

    create table segments (
      id integer generated always as identity primary key,
      source_key text not null constraint segments_source_key_once unique,
      import_id integer references network_imports,
      from_node_id integer not null references nodes,
      to_node_id integer not null references nodes,
      name text not null,
      road_class text not null,
      service_class text not null constraint segments_service_class_known check (service_class in ('A', 'B', 'C', 'D')),
      lanes smallint not null constraint segments_lanes_in_range check (lanes between 1 and 12),
      width_m double precision not null constraint segments_width_in_range check (width_m between 1 and 60),
      surface text not null constraint segments_surface_known
        check (surface in ('asphalt', 'concrete', 'open-graded', 'gravel', 'paving')),
      is_bridge boolean not null default false,
      is_tunnel boolean not null default false,
      exposure text not null default 'open' constraint segments_exposure_known
        check (exposure in ('open', 'sheltered', 'shaded', 'ridge', 'shore')),
      speed_km_per_h double precision not null constraint segments_speed_in_range check (speed_km_per_h between 5 and 160),
      -- along the geometry only
      is_one_way boolean not null default false,
      is_sensitive boolean not null default false,
      height_m double precision not null default 0,
      length_m double precision not null constraint segments_length_positive check (length_m > 0),
      geometry geometry(LineString, 4326) not null,
      -- names of attributes filled in from the road's class
      assumed text[] not null default '{}',
      tags jsonb not null default '{}',
      retired_at timestamptz,
      updated_at timestamptz not null default now()
    );
    create index segments_by_place on segments using gist (geometry);
    create index segments_in_use on segments (id) where retired_at is null;

    create table base_features (
      id integer generated always as identity primary key,
      kind text not null constraint base_features_kind_known
        check (kind in ('coast', 'river', 'lake', 'contour', 'town', 'water-name')),
      name text not null default '',
      height_m double precision,
      geometry geometry(Geometry, 4326) not null
    );

    create table routes (
      id integer generated always as identity primary key,
      name text not null constraint routes_name_once unique,
      yard_id integer not null references yards,
      truck_id integer references trucks,
      is_active boolean not null default true
    );

    create table route_segments (
      route_id integer not null references routes on delete cascade,
      position integer not null,
      segment_id integer not null references segments,
      primary key (route_id, position)
    );
  `);
};

export const down: Migration['down'] = async ({ sql }) => {
  await sql('drop table route_segments, routes, base_features, segments, nodes, network_imports');
};
