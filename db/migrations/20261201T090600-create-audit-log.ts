import { type Migration } from '@/db/migrate';

/** Append-only: the database itself refuses update, delete and truncate. */
export const up: Migration['up'] = async ({ sql }) => {
  await sql(`
    create table audit_log (
      id integer generated always as identity primary key,
      recorded_at timestamptz not null default now(),
      person_id integer references people,
      action text not null,
      subject_kind text not null,
      subject_id text not null,
      detail jsonb not null default '{}'
    );
    create index audit_log_by_subject on audit_log (subject_kind, subject_id, recorded_at);
    create trigger audit_log_keep before update or delete on audit_log for each row execute function refuse_change();
    create trigger audit_log_stay before truncate on audit_log execute function refuse_change();
  `);
};

export const down: Migration['down'] = async ({ sql }) => {
  await sql('drop table audit_log');
};
