import { type Land } from '@/lib/skerrow/land';
import { materials, people, stations, trucks, yards } from '@/lib/skerrow/people';
import { type RoadNetwork } from '@/lib/skerrow/roads';
import { placeBeside } from '@/lib/skerrow/standing-routes';
import { execute, type Tx } from '../transaction';
import { idOf, insertKeyed, insertRows } from './insert-rows';
import { pointWkt } from './wkt';

const dayMs = 86_400_000;
const beside = ({ xM, yM }: { xM: number; yM: number }) => ({ xM: xM + 35, yM: yM - 25 });

export async function seedAgency(tx: Tx, anchorAt: Date): Promise<void> {
  await execute(
    tx,
    `insert into agency (name, zone, currency, attribution, is_demo, demo_anchor_at)
     values ('Isle of Skerrow', 'UTC', 'EUR', 'Isle of Skerrow, an invented map', true, :anchorAt)`,
    { anchorAt },
  );
}

/** Ids by e-mail address. */
export async function seedPeople(
  tx: Tx,
  { passwordHash, madeAt }: { passwordHash: string; madeAt: Date },
): Promise<ReadonlyMap<string, number>> {
  return insertKeyed(tx, {
    table: 'people',
    key: 'name',
    rows: people.map(({ name, email, role }) => ({
      name,
      email,
      passwordHash,
      role,
      unitSystem: 'metric',
      theme: 'system',
      isDisabled: false,
      sessionVersion: 1,
      createdAt: madeAt,
      updatedAt: madeAt,
    })),
  });
}

export async function seedYards(tx: Tx, network: RoadNetwork): Promise<ReadonlyMap<string, number>> {
  return insertKeyed(tx, {
    table: 'yards',
    key: 'name',
    rows: yards.map(({ name, besideRoad, solidCapacityKg, brineCapacityL }) => ({
      name,
      position: pointWkt(beside(placeBeside(network, besideRoad))),
      solidCapacityKg,
      brineCapacityL,
      isActive: true,
    })),
  });
}

const materialRow = ({ mixedFrom: _, ...material }: (typeof materials)[number]) => ({ ...material, isActive: true });

export async function seedMaterials(tx: Tx): Promise<ReadonlyMap<string, number>> {
  const single = await insertKeyed(tx, {
    table: 'materials',
    key: 'name',
    rows: materials.filter(({ mixedFrom }) => !mixedFrom).map(materialRow),
  });
  const mixed = await insertKeyed(tx, {
    table: 'materials',
    key: 'name',
    rows: materials.flatMap((material) =>
      material.mixedFrom
        ? [
            {
              ...materialRow(material),
              solidMaterialId: idOf(single, material.mixedFrom.solid),
              liquidMaterialId: idOf(single, material.mixedFrom.liquid),
              liquidMassFraction: material.mixedFrom.liquidMassFraction,
            },
          ]
        : [],
    ),
  });
  return new Map([...single, ...mixed]);
}

/** Ids by number. */
export async function seedTrucks(
  tx: Tx,
  yardIds: ReadonlyMap<string, number>,
  anchorAt: Date,
): Promise<ReadonlyMap<string, number>> {
  const truckIds = await insertKeyed(tx, {
    table: 'trucks',
    key: 'number',
    rows: trucks.map(({ number, name, yard, ploughWidthM }) => ({
      number,
      name,
      yardId: idOf(yardIds, yard),
      ploughWidthM,
      isActive: true,
    })),
  });
  await insertRows(tx, {
    table: 'spreaders',
    rows: trucks.map((truck) => ({
      truckId: idOf(truckIds, String(truck.number)),
      name: truck.tankL > 0 ? 'Spreader with tanks' : 'Spreader',
      hopperKg: truck.hopperKg,
      tankL: truck.tankL,
      minRateGPerM2: truck.minRateGPerM2,
      maxRateGPerM2: truck.maxRateGPerM2,
      maxLiquidRateMlPerM2: truck.maxLiquidRateMlPerM2,
      calibratedOn: new Date(anchorAt.getTime() - truck.calibratedDaysBefore * dayMs).toISOString().slice(0, 10),
    })),
  });
  return truckIds;
}

/** Ids by name. */
export async function seedStations(
  tx: Tx,
  { land, network, anchorAt }: { land: Land; network: RoadNetwork; anchorAt: Date },
): Promise<ReadonlyMap<string, number>> {
  const stationIds = await insertKeyed(tx, {
    table: 'stations',
    key: 'name',
    rows: stations.map(({ name, besideRoad }) => {
      const at = placeBeside(network, besideRoad);
      return {
        name,
        position: pointWkt(at),
        heightM: Math.max(6, Math.round(land.heightAt(at))),
        zone: 'UTC',
        isActive: true,
      };
    }),
  });
  await insertRows(tx, {
    table: 'sensors',
    rows: stations.flatMap(({ name, measures }) =>
      measures.map((quantity) => ({
        stationId: idOf(stationIds, name),
        quantity,
        depthM: quantity === 'subsurfaceTempC' ? 0.3 : null,
        installedOn: new Date(anchorAt.getTime() - 700 * dayMs).toISOString().slice(0, 10),
        note: '',
      })),
    ),
  });
  return stationIds;
}
