import { demoPassword } from '@/lib/skerrow/demo-password';
import { people } from '@/lib/skerrow/people';
import { roles, type Role } from '@/lib/permissions';
import { selectRows } from '../transaction';

export interface DemoSignIns {
  password: string;
  people: readonly { name: string; email: string; role: Role }[];
}

/** One person of each role, when this is the demo and they are still there; null everywhere else. */
export async function findDemoSignIns(): Promise<DemoSignIns | null> {
  const firsts = roles.flatMap((role) => people.find((person) => person.role === role) ?? []);
  const rows = await selectRows<{ name: string; email: string; role: Role }>(
    `select name, email, role from people
      where email in (:emails) and not is_disabled and exists (select 1 from agency where is_demo)`,
    { emails: firsts.map(({ email }) => email) },
  );
  const found = roles.flatMap((role) => rows.find((row) => row.role === role) ?? []);
  return found.length > 0 ? { password: demoPassword, people: found } : null;
}
