import { selectRows } from '../transaction';
import { listNetworkAttributions } from './network-imports';

export interface AgencyRecord {
  name: string;
  zone: string;
  currency: string;
  /** The agency's own notice and those of the road files in use: shown wherever the roads are. */
  attribution: string;
  isDemo: boolean;
  demoAnchorAt: Date | null;
}

const nameless: AgencyRecord = {
  name: '',
  zone: 'UTC',
  currency: 'EUR',
  attribution: '',
  isDemo: false,
  demoAnchorAt: null,
};

/** The agency whose roads these are; before set-up, a nameless one in UTC. */
export async function findAgency(): Promise<AgencyRecord> {
  const [rows, notices] = await Promise.all([
    selectRows<AgencyRecord>(
      `select name, zone, currency, attribution, is_demo as "isDemo", demo_anchor_at as "demoAnchorAt" from agency`,
    ),
    listNetworkAttributions(),
  ]);
  const agency = rows[0] ?? nameless;
  return { ...agency, attribution: [agency.attribution, ...notices].filter((notice) => notice !== '').join('; ') };
}
