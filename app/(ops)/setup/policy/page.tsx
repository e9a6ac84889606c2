import { type Metadata } from 'next';
import { findAgency } from '@/db/queries/agency';
import { listPolicies } from '@/db/queries/policy';
import { readPolicy } from '@/lib/contracts/policy';
import { requirePage } from '@/lib/server/page';
import { formatDateTime } from '@/lib/time/format';
import { PolicyScreen } from './policy-screen';

export const metadata: Metadata = { title: 'Treatment policy' };

export default async function PolicyPage() {
  await requirePage('setup.policy');
  const [policies, agency] = await Promise.all([listPolicies(), findAgency()]);
  const [inForce] = policies;
  const versions = policies.map(({ version, adoptedAt, adoptedByName }) => ({
    version,
    adopted: formatDateTime(adoptedAt, agency.zone),
    by: adoptedByName,
  }));
  return <PolicyScreen key={inForce?.version ?? 0} policy={readPolicy(inForce?.rules)} versions={versions} />;
}
