import { demoPassword } from '@/lib/skerrow/demo-password';
import { people } from '@/lib/skerrow/people';
import { makeLand } from '@/lib/skerrow/land';
import { createRandom } from '@/lib/skerrow/random';
import { makeRoads } from '@/lib/skerrow/roads';
import { skerrowSeed } from '@/lib/skerrow/skerrow-seed';
import { storms } from '@/lib/skerrow/storms';
import { readingStepMs } from '@/lib/skerrow/weather';
import { hashPassword } from '../passwords';
import { inTransaction, selectRows, type Tx } from '../transaction';
import { seedNetwork, seedRoutes } from './demo-network';
import { seedAgency, seedMaterials, seedPeople, seedStations, seedTrucks, seedYards } from './demo-setup';
import { seedStorm } from './demo-storms';
import { addDemoForecast, addDemoReadings, issueTimes } from './demo-weather-rows';
import { idOf } from './insert-rows';
import { seedPolicy } from './policy';

export { demoPassword };

export interface DemoSignIn {
  name: string;
  role: string;
  email: string;
  password: string;
}

/** Everybody of the demo; nowhere else is there a password that is written down. */
export const demoSignIns: readonly DemoSignIn[] = people.map(({ name, role, email }) => ({
  name,
  role,
  email,
  password: demoPassword,
}));

const hourMs = 3_600_000;
const hoursFrom = (at: Date, hours: number) => new Date(at.getTime() + hours * hourMs);

/** The demo's now: the last ten-minute mark. */
export const anchorOf = (now: Date) => new Date(Math.floor(now.getTime() / readingStepMs) * readingStepMs);

/** Whether nothing has been set up yet. */
export async function isEmptyDatabase(): Promise<boolean> {
  const [row] = await selectRows<{ isEmpty: boolean }>(
    'select not exists (select 1 from people) and not exists (select 1 from agency) as "isEmpty"',
  );
  return row?.isEmpty ?? true;
}

async function seedWeather(tx: Tx, stationIds: ReadonlyMap<string, number>, anchorAt: Date): Promise<void> {
  await addDemoReadings(tx, stationIds, { fromAt: hoursFrom(anchorAt, -14 * 24), untilAt: anchorAt, anchorAt });
  for (const { openedH, closedH } of storms) {
    const span = { fromAt: hoursFrom(anchorAt, openedH - 7), untilAt: hoursFrom(anchorAt, closedH ?? 0) };
    for (const issueAt of issueTimes(span)) {
      await addDemoForecast(tx, stationIds, { issueAt, anchorAt, receivedAt: new Date(issueAt.getTime() + 240_000) });
    }
  }
}

async function seedEverything(tx: Tx, anchorAt: Date, passwordHash: string): Promise<void> {
  const land = makeLand(skerrowSeed);
  const network = makeRoads(land, skerrowSeed);
  const island = { land, network, anchorAt };
  const madeAt = hoursFrom(anchorAt, -15 * 24);
  await seedAgency(tx, anchorAt);
  const personIds = await seedPeople(tx, { passwordHash, madeAt });
  await seedPolicy(tx, { adoptedAt: madeAt, adoptedBy: idOf(personIds, 'Greer Maddock') });
  const yardIds = await seedYards(tx, network);
  const materialIds = await seedMaterials(tx);
  const truckIds = await seedTrucks(tx, yardIds, anchorAt);
  const segmentIds = await seedNetwork(tx, island);
  const routes = await seedRoutes(tx, network, { segments: segmentIds, yards: yardIds, trucks: truckIds });
  await seedWeather(tx, await seedStations(tx, island), anchorAt);
  const ids = { people: personIds, trucks: truckIds, yards: yardIds, materials: materialIds, segments: segmentIds };
  const random = createRandom(skerrowSeed + 900);
  for (const storm of storms) await seedStorm(tx, { storm, anchorAt, network, routes, ids }, random);
}

/**
 * The Isle of Skerrow with two weeks of weather, one storm over and one under way, as of `now`. In one transaction: the
 * demo is there whole or not at all.
 */
export async function seedDemo({ now }: { now: Date }): Promise<{ anchorAt: Date; signIns: readonly DemoSignIn[] }> {
  const anchorAt = anchorOf(now);
  const passwordHash = await hashPassword(demoPassword);
  await inTransaction((tx) => seedEverything(tx, anchorAt, passwordHash));
  return { anchorAt, signIns: demoSignIns };
}
