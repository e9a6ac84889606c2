import { type Migration } from '@/db/migrate';

export const up: Migration['up'] = async ({ sql }) => {
  await sql(`
    -- files under one source name replace each other: what a later one lacks is retired
    alter table network_imports add column source text not null default '';
    -- attributes set by hand: a repeated import leaves them alone
    alter table segments add column edited text[] not null default '{}';
    create index segments_by_import on segments (import_id);
  `);
};

export const down: Migration['down'] = async ({ sql }) => {
  await sql(`
    drop index segments_by_import;
    alter table segments drop column edited;
    alter table network_imports drop column source;
  `);
};
