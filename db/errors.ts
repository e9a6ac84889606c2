import { Problem } from '@/lib/problem';

/** Constraint names → what a person is told. */
const constraints: Readonly<Record<string, () => Problem>> = {
  people_email_once: () =>
    new Problem(
      'already-exists',
      { what: 'a person with this e-mail address' },
      { email: 'Someone else has this address.' },
    ),
  yards_name_once: () =>
    new Problem('already-exists', { what: 'a yard of this name' }, { name: 'Another yard has this name.' }),
  materials_name_once: () =>
    new Problem('already-exists', { what: 'a material of this name' }, { name: 'Another material has this name.' }),
  trucks_number_once: () =>
    new Problem('already-exists', { what: 'a truck with this number' }, { number: 'Another truck has this number.' }),
  stations_name_once: () =>
    new Problem('already-exists', { what: 'a station of this name' }, { name: 'Another station has this name.' }),
  routes_name_once: () =>
    new Problem('already-exists', { what: 'a route of this name' }, { name: 'Another route has this name.' }),
  storms_number_once: () => new Problem('changed-meanwhile', { what: 'The list of storms' }),
  plans_version_once: () => new Problem('changed-meanwhile', { what: 'The plan of this storm' }),
  runs_truck_on_one_run: () =>
    new Problem('not-possible-now', {
      reason: 'This truck is already out on a run.',
      todo: 'Finish that run first, or take another truck.',
    }),
  runs_driver_on_one_run: () =>
    new Problem('not-possible-now', {
      reason: 'You are already out on a run.',
      todo: 'Finish it first, then start the next.',
    }),
};

interface PostgresError {
  code?: string;
  constraint?: string;
  message?: string;
}

function postgresError(error: unknown): PostgresError | null {
  if (typeof error !== 'object' || error === null) return null;
  const inner = 'parent' in error ? error.parent : 'original' in error ? error.original : error;
  return typeof inner === 'object' && inner !== null ? (inner as PostgresError) : null;
}

/** The database's refusals as Problems; anything unknown is handed back as it came. */
export function translateDatabaseError(error: unknown): unknown {
  if (error instanceof Problem) return error;
  const cause = postgresError(error);
  const byName = cause?.constraint ? constraints[cause.constraint] : undefined;
  if (byName) return byName();
  switch (cause?.code) {
    case 'RW001':
      return new Problem('never-changed');
    case 'RW002':
      return new Problem('plan-published');
    case '23503':
      return new Problem('not-found', { what: 'record that this one refers to' });
    case '23514':
      return new Problem('out-of-range', { what: `A value (${cause.constraint ?? 'unnamed rule'})` });
    case '40001':
    case '40P01':
    case '55P03':
    case '57014':
    case '57P03':
    case '53300':
    case 'ECONNREFUSED':
      return new Problem('busy');
    default:
      return error;
  }
}
