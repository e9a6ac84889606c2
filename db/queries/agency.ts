import { selectRows } from '../transaction';

export interface AgencyRecord {
  name: string;
  zone: string;
  currency: string;
  attribution: string;
  isDemo: boolean;
  demoAnchorAt: Date | null;
}

/** The agency whose roads these are; before set-up, a nameless one in UTC. */
export async function findAgency(): Promise<AgencyRecord> {
  const rows = await selectRows<AgencyRecord>(
    `select name, zone, currency, attribution, is_demo as "isDemo", demo_anchor_at as "demoAnchorAt" from agency`,
  );
  return rows[0] ?? { name: '', zone: 'UTC', currency: 'EUR', attribution: '', isDemo: false, demoAnchorAt: null };
}
