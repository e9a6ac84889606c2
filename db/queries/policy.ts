import { selectRows, type Tx } from '../transaction';

export interface PolicyRecord {
  version: number;
  rules: unknown;
  adoptedAt: Date;
  adoptedByName: string | null;
}

/** Every version, the one in force first. */
export async function listPolicies(): Promise<PolicyRecord[]> {
  return selectRows<PolicyRecord>(
    `select p.version, p.rules, p.adopted_at as "adoptedAt", a.name as "adoptedByName"
       from policies p left join people a on a.id = p.adopted_by
      order by p.version desc`,
  );
}

export async function newestPolicyVersion(tx: Tx): Promise<number> {
  const [row] = await selectRows<{ version: number }>(
    'select coalesce(max(version), 0)::int as version from policies',
    {},
    tx,
  );
  return row?.version ?? 0;
}
