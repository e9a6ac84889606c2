import { defaultPolicy } from '@/lib/treatment/policy';
import { type Tx } from '../transaction';
import { insertRows } from './insert-rows';

/** The first version of the policy; supervisors adopt later ones. */
export async function seedPolicy(tx: Tx, adopted: { adoptedAt: Date; adoptedBy: number }): Promise<void> {
  await insertRows(tx, { table: 'policies', rows: [{ version: 1, rules: defaultPolicy, ...adopted }] });
}
