import { type z } from 'zod';
import { findAgency } from '@/db/queries/agency';
import { findRunHead, listRunRoads } from '@/db/queries/runs';
import { PlanWhy } from '@/lib/contracts/plans';
import { type RunView } from '@/lib/contracts/runs';
import { Problem } from '@/lib/problem';
import { reasonSentence } from '@/lib/treatment/reason';
import { type UnitSystem } from '@/lib/units/format';

/** A run with its roads as the cab shows it: reasons are written in the reader's units, on the agency's clock. */
export async function readRun(id: string, system: UnitSystem): Promise<z.input<typeof RunView>> {
  const head = await findRunHead({ id });
  if (!head) throw new Problem('not-found', { what: 'run' });
  const [roads, agency] = await Promise.all([listRunRoads({ id }), findAgency()]);
  return {
    ...head,
    roads: roads.map(({ why, ...road }) => {
      const read = PlanWhy.safeParse(why);
      if (!read.success) return { ...road, reason: null, pavementTempC: null, isPloughed: false };
      const { parts, passAt, pavementTempC, isPloughed } = read.data;
      return {
        ...road,
        reason: reasonSentence(parts, { zone: agency.zone, system, startAt: passAt }),
        pavementTempC,
        isPloughed,
      };
    }),
  };
}
