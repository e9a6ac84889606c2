import { findRunHead, listRunRoads } from '@/db/queries/runs';
import { type RunView } from '@/lib/contracts/runs';
import { type z } from 'zod';
import { Problem } from '@/lib/problem';

/** A run with its roads, as the cab and the ledger show it. */
export async function readRun(id: string): Promise<z.input<typeof RunView>> {
  const head = await findRunHead({ id });
  if (!head) throw new Problem('not-found', { what: 'run' });
  return { ...head, roads: await listRunRoads({ id }) };
}
