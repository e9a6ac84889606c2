import { type Migration } from '@/db/migrate';

export const up: Migration['up'] = async ({ sql }) => {
  await sql(`
    create extension if not exists postgis;

    create table agency (
      id integer primary key default 1 constraint agency_is_one_row check (id = 1),
      name text not null,
      zone text not null,
      currency text not null default 'EUR',
      attribution text not null default '',
      is_demo boolean not null default false,
      demo_anchor_at timestamptz
    );

    create table people (
      id integer generated always as identity primary key,
      name text not null constraint people_name_filled check (length(trim(name)) > 0),
      email text not null constraint people_email_lower check (email = lower(email)),
      password_hash text not null,
      role text not null constraint people_role_known
        check (role in ('dispatcher', 'driver', 'supervisor', 'yard', 'administrator', 'observer')),
      unit_system text not null default 'metric' constraint people_unit_system_known check (unit_system in ('metric', 'us')),
      theme text not null default 'system' constraint people_theme_known check (theme in ('system', 'dark', 'light')),
      is_disabled boolean not null default false,
      session_version integer not null default 1,
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now()
    );
    create unique index people_email_once on people (email);

    create table sign_in_attempts (
      id integer generated always as identity primary key,
      email text not null,
      address text not null,
      attempted_at timestamptz not null,
      has_succeeded boolean not null
    );
    create index sign_in_attempts_by_email on sign_in_attempts (email, attempted_at);
    create index sign_in_attempts_by_address on sign_in_attempts (address, attempted_at);

    create table policies (
      version integer primary key,
      rules jsonb not null,
      adopted_at timestamptz not null,
      adopted_by integer references people
    );
  `);
};

export const down: Migration['down'] = async ({ sql }) => {
  await sql('drop table policies, sign_in_attempts, people, agency');
};
