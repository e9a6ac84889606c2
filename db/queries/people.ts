import { type Role } from '@/lib/permissions';
import { selectRows } from '../transaction';

export interface PersonRecord {
  id: number;
  name: string;
  email: string;
  role: Role;
  unitSystem: 'metric' | 'us';
  theme: 'system' | 'dark' | 'light';
  isDisabled: boolean;
  sessionVersion: number;
}

const columns = `id, name, email, role, unit_system as "unitSystem", theme, is_disabled as "isDisabled", session_version as "sessionVersion"`;

export async function findPerson({ id }: { id: number }): Promise<PersonRecord | null> {
  const rows = await selectRows<PersonRecord>(`select ${columns} from people where id = :id`, { id });
  return rows[0] ?? null;
}

export async function listPeople(): Promise<PersonRecord[]> {
  return selectRows<PersonRecord>(`select ${columns} from people order by is_disabled, name`);
}
