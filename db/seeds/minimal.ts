import { randomUUID } from 'node:crypto';
import { type Role, roleNames, roles } from '@/lib/permissions';
import { kmPoint, lineLengthM, type PlanePoint } from '@/lib/skerrow/plane';
import { hashPassword } from '../passwords';
import { execute, inTransaction, type Tx } from '../transaction';
import { idOf, insertKeyed, insertRows } from './insert-rows';
import { seedPolicy } from './policy';
import { lineWkt, pointWkt } from './wkt';

/*
 *   north-west ──── North Road (A, 1 km) ──── north-east
 *       │                                         │
 *   West Lane (C, 0.6 km)               East Bridge (B, 0.6 km, deck)
 *       │                                         │
 *   south-west ◄── South Street (D, one way) ── south-east
 *
 * The yard and the station stand in the middle.
 */
const corners = {
  'north-west': kmPoint(-0.5, 0.3),
  'north-east': kmPoint(0.5, 0.3),
  'south-east': kmPoint(0.5, -0.3),
  'south-west': kmPoint(-0.5, -0.3),
} as const satisfies Record<string, PlanePoint>;
type Corner = keyof typeof corners;

interface MinimalRoad {
  key: string;
  name: string;
  ends: readonly [Corner, Corner];
  serviceClass: 'A' | 'B' | 'C' | 'D';
  lanes: number;
  isBridge?: boolean;
  isOneWay?: boolean;
}

const roads: readonly MinimalRoad[] = [
  { key: 'north', name: 'North Road', ends: ['north-west', 'north-east'], serviceClass: 'A', lanes: 2 },
  { key: 'east', name: 'East Bridge', ends: ['north-east', 'south-east'], serviceClass: 'B', lanes: 2, isBridge: true },
  {
    key: 'south',
    name: 'South Street',
    ends: ['south-east', 'south-west'],
    serviceClass: 'D',
    lanes: 1,
    isOneWay: true,
  },
  { key: 'west', name: 'West Lane', ends: ['south-west', 'north-west'], serviceClass: 'C', lanes: 1 },
];

function roadRow(road: MinimalRoad, nodeIds: ReadonlyMap<string, number>, now: Date) {
  const line = road.ends.map((corner) => corners[corner]);
  return {
    sourceKey: road.key,
    fromNodeId: idOf(nodeIds, road.ends[0]),
    toNodeId: idOf(nodeIds, road.ends[1]),
    name: road.name,
    roadClass: 'tertiary',
    serviceClass: road.serviceClass,
    lanes: road.lanes,
    widthM: road.lanes * 3.5,
    surface: road.isBridge ? 'concrete' : 'asphalt',
    isBridge: road.isBridge ?? false,
    isTunnel: false,
    exposure: 'open',
    speedKmPerH: 60,
    isOneWay: road.isOneWay ?? false,
    isSensitive: false,
    heightM: 40,
    lengthM: lineLengthM(line),
    geometry: lineWkt(line),
    assumed: [],
    edited: [],
    tags: {},
    updatedAt: now,
  };
}

async function addRoads(tx: Tx, now: Date): Promise<ReadonlyMap<string, number>> {
  const nodeIds = await insertKeyed(tx, {
    table: 'nodes',
    key: 'sourceKey',
    rows: Object.entries(corners).map(([sourceKey, at]) => ({ sourceKey, position: pointWkt(at) })),
  });
  return insertKeyed(tx, {
    table: 'segments',
    key: 'sourceKey',
    rows: roads.map((road) => roadRow(road, nodeIds, now)),
  });
}

async function addMaterials(tx: Tx) {
  const common = { costCentsPerTonne: 8000, isActive: true };
  const parts = await insertKeyed(tx, {
    table: 'materials',
    key: 'name',
    rows: [
      {
        ...common,
        name: 'Rock salt',
        form: 'solid',
        composition: { NaCl: 0.97 },
        waterMassFraction: 0.01,
        densityKgPerM3: 1280,
        practicalMinimumC: -9,
      },
      {
        ...common,
        name: 'Salt brine',
        form: 'liquid',
        composition: { NaCl: 0.23 },
        waterMassFraction: 0.77,
        densityKgPerM3: 1176,
        practicalMinimumC: -7,
      },
    ],
  });
  const prewet = await insertKeyed(tx, {
    table: 'materials',
    key: 'name',
    rows: [
      {
        ...common,
        name: 'Pre-wet salt',
        form: 'prewet',
        composition: { NaCl: 0.748 },
        waterMassFraction: 0.238,
        densityKgPerM3: 1300,
        practicalMinimumC: -12,
        solidMaterialId: idOf(parts, 'Rock salt'),
        liquidMaterialId: idOf(parts, 'Salt brine'),
        liquidMassFraction: 0.3,
      },
    ],
  });
  return new Map([...parts, ...prewet]);
}

async function addTruck(tx: Tx, yardId: number): Promise<number> {
  const ids = await insertKeyed(tx, {
    table: 'trucks',
    key: 'number',
    rows: [{ number: 1, name: 'Truck', yardId, ploughWidthM: 3, isActive: true }],
  });
  const truckId = idOf(ids, '1');
  await insertRows(tx, {
    table: 'spreaders',
    rows: [
      {
        truckId,
        name: 'Spreader',
        hopperKg: 7500,
        tankL: 1200,
        minRateGPerM2: 5,
        maxRateGPerM2: 60,
        maxLiquidRateMlPerM2: 40,
      },
    ],
  });
  return truckId;
}

async function addPeople(tx: Tx, passwordHash: string): Promise<Record<Role, number>> {
  const ids = await insertKeyed(tx, {
    table: 'people',
    key: 'role',
    rows: roles.map((role) => ({
      name: `A ${roleNames[role].toLowerCase()}`,
      email: `${role}@minimal.example`,
      passwordHash,
      role,
      unitSystem: 'metric',
      theme: 'system',
      isDisabled: false,
      sessionVersion: 1,
      createdAt: new Date(0),
      updatedAt: new Date(0),
    })),
  });
  const id = (role: Role) => idOf(ids, role);
  return {
    dispatcher: id('dispatcher'),
    driver: id('driver'),
    supervisor: id('supervisor'),
    yard: id('yard'),
    administrator: id('administrator'),
    observer: id('observer'),
  };
}

export interface MinimalIds {
  people: Record<Role, number>;
  yardId: number;
  truckId: number;
  stationId: number;
  /** by name: Rock salt, Salt brine, Pre-wet salt */
  materials: ReadonlyMap<string, number>;
  /** by key: north, east, south, west */
  segments: ReadonlyMap<string, number>;
}

/**
 * The smallest agency: a yard, four segments, a truck, three materials, a station without readings, the
 * first policy and one person of each role. Without `password` nobody can sign in.
 */
export async function seedMinimal({ now, password }: { now: Date; password?: string }): Promise<MinimalIds> {
  const passwordHash = await hashPassword(password ?? randomUUID());
  return inTransaction(async (tx) => {
    await execute(tx, `insert into agency (name, zone) values ('Minimal', 'UTC')`);
    const people = await addPeople(tx, passwordHash);
    await seedPolicy(tx, { adoptedAt: now, adoptedBy: people.supervisor });
    const middle = pointWkt(kmPoint(0, 0));
    const yards = await insertKeyed(tx, {
      table: 'yards',
      key: 'name',
      rows: [{ name: 'Yard', position: middle, solidCapacityKg: 100_000, brineCapacityL: 10_000, isActive: true }],
    });
    const stations = await insertKeyed(tx, {
      table: 'stations',
      key: 'name',
      rows: [{ name: 'Station', position: middle, heightM: 40, zone: 'UTC', isActive: true }],
    });
    const yardId = idOf(yards, 'Yard');
    return {
      people,
      yardId,
      truckId: await addTruck(tx, yardId),
      stationId: idOf(stations, 'Station'),
      materials: await addMaterials(tx),
      segments: await addRoads(tx, now),
    };
  });
}
