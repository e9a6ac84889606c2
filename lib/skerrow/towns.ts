import { kmPoint, type PlanePoint } from './plane';
import { planeNoise, type Random } from './random';
import { type RouteName, type ServiceClass } from './road-words';
import { type TownName } from './rural-roads';
import { streetNames } from './street-names';

/** One street: the town's nodes it runs through, in order. */
export interface Street {
  name: string;
  nodes: number[];
  serviceClass: ServiceClass;
  lanes: 1 | 2 | 3;
  /** along `nodes`, or against them */
  oneWay?: 'along' | 'against';
  /** streets that are never broken up */
  isMain: boolean;
  route: RouteName;
}

export interface Town {
  name: TownName;
  labelAt: PlanePoint;
  nodes: PlanePoint[];
  streets: Street[];
}

interface Style {
  main: readonly number[];
  oneWay: ReadonlyMap<number, 'along' | 'against'>;
  lanes: readonly number[];
  route: RouteName;
  mainRoute: RouteName;
}

/** Streets of a lattice of `columns` × `rows` nodes numbered column by column; −1 marks a missing node. */
function latticeStreets(lattice: readonly (readonly number[])[], names: readonly string[], style: Style): Street[] {
  const rowCount = Math.max(...lattice.map((column) => column.length));
  const rows = Array.from({ length: rowCount }, (_, row) => lattice.map((column) => column[row] ?? -1));
  return [...lattice, ...rows].flatMap((line, index): Street[] => {
    const nodes = line.filter((node) => node >= 0);
    const isMain = style.main.includes(index);
    const oneWay = style.oneWay.get(index);
    if (nodes.length < 2) return [];
    const isLane = style.lanes.includes(index);
    return [
      {
        name: names[index] ?? `Street ${index + 1}`,
        nodes,
        serviceClass: isMain ? 'B' : isLane ? 'D' : 'C',
        lanes: isLane ? 1 : 2,
        ...(oneWay ? { oneWay } : {}),
        isMain: isMain || oneWay !== undefined,
        route: isMain ? style.mainRoute : style.route,
      },
    ];
  });
}

/** Bends a regular place a little, differently everywhere, so that no street is a ruler. */
function bent(seed: number, eastKm: number, northKm: number, reachKm: number): PlanePoint {
  return kmPoint(
    eastKm + reachKm * planeNoise(seed, eastKm * 1.4, northKm * 1.4),
    northKm + reachKm * planeNoise(seed + 1, eastKm * 1.4, northKm * 1.4),
  );
}

function lattice(
  columns: readonly number[],
  rows: readonly number[],
  place: (u: number, v: number) => PlanePoint | undefined,
) {
  const nodes: PlanePoint[] = [];
  const numbers = columns.map((u) =>
    rows.map((v) => {
      const at = place(u, v);
      return at ? nodes.push(at) - 1 : -1;
    }),
  );
  return { nodes, numbers };
}

const turned = (u: number, v: number, degrees: number): [number, number] => {
  const angle = (degrees * Math.PI) / 180;
  return [u * Math.cos(angle) - v * Math.sin(angle), u * Math.sin(angle) + v * Math.cos(angle)];
};

/** Ring road around the old town: a ring node outside every second edge node of the lattice, and a spoke to it. */
function ringAround(nodes: PlanePoint[], edge: readonly number[], centre: PlanePoint, random: Random): Street[] {
  const chosen = edge.filter((_, index) => index % 4 !== 2);
  const spokes = chosen.map((node): [number, number] => {
    const from = nodes[node] ?? centre;
    const angle = Math.atan2(from.yM - centre.yM, from.xM - centre.xM);
    const reach = 1 + 0.06 * (random() - 0.5);
    const at = {
      xM: centre.xM + Math.cos(angle) * 1340 * reach,
      yM: centre.yM + Math.sin(angle) * 1180 * reach,
    };
    return [node, nodes.push(at) - 1];
  });
  const ringNodes = spokes.map(([, outer]) => outer);
  const first = ringNodes[0] ?? 0;
  const common = { lanes: 2, isMain: true } as const;
  return [
    { ...common, name: 'Brannoch Ring', nodes: [...ringNodes, first], serviceClass: 'A', route: 'Brannoch town' },
    ...spokes.map((spoke, index): Street => ({
      ...common,
      name: streetNames.spokes[index] ?? `Spoke ${index + 1}`,
      nodes: spoke,
      serviceClass: 'C',
      route: 'Brannoch town',
    })),
  ];
}

function brannoch(seed: number, random: Random): Town {
  const columns = [-0.86, -0.52, -0.17, 0.13, 0.47, 0.8];
  const rows = [-0.66, -0.36, -0.08, 0.24, 0.55];
  const { nodes, numbers } = lattice(columns, rows, (u, v) => {
    const [east, north] = turned(u * (1 - 0.18 * v * v), v + 0.1 * u * u, 13);
    return bent(seed, 3.4 + east, -2.25 + north, 0.11);
  });
  const streets = latticeStreets(numbers, streetNames.brannoch, {
    main: [2, 8],
    oneWay: new Map([
      [3, 'along'],
      [4, 'against'],
    ]),
    lanes: [0, 10],
    route: 'Brannoch town',
    mainRoute: 'Quay and High Street',
  });
  const firstColumn = numbers[0] ?? [];
  const lastColumn = numbers.at(-1) ?? [];
  const inner = numbers.slice(1, -1);
  const bottom = inner.map((column) => column[0] ?? -1);
  const top = inner.map((column) => column.at(-1) ?? -1);
  const edge = [...lastColumn, ...top.reverse(), ...[...firstColumn].reverse(), ...bottom];
  streets.push(...ringAround(nodes, edge, kmPoint(3.4, -2.25), random));
  return { name: 'Brannoch', labelAt: kmPoint(3.0, -0.6), nodes, streets };
}

/** Arcs around the harbour, and streets that climb away from it. */
function hallowQuay(seed: number): Town {
  const bearings = [-72, -50, -29, -9, 13, 34, 56, 78];
  const reaches = [0.5, 0.79, 1.1, 1.46];
  const { nodes, numbers } = lattice(bearings, reaches, (u, v) => {
    if (v > 1.4 && (u < -60 || u > 60)) return undefined;
    const angle = ((u + 4 * Math.sin(v * 4)) * Math.PI) / 180;
    return bent(seed, -8.12 + v * Math.cos(angle) * 1.12, 1.58 + v * Math.sin(angle) * 0.98, 0.09);
  });
  const streets = latticeStreets(numbers, streetNames.hallowQuay, {
    main: [3, 8],
    oneWay: new Map([
      [2, 'along'],
      [4, 'against'],
    ]),
    lanes: [0, 7, 11],
    route: 'West shore',
    mainRoute: 'Quay and High Street',
  });
  return { name: 'Hallow Quay', labelAt: kmPoint(-7.0, 3.0), nodes, streets };
}

/** Two grids that meet at an angle between the bay and the inlet. */
function skail(seed: number): Town {
  const columns = [-0.82, -0.5, -0.2, 0.12, 0.42, 0.74];
  const rows = [-0.62, -0.32, -0.02, 0.28, 0.58];
  const { nodes, numbers } = lattice(columns, rows, (u, v) => {
    if (u > 0.7 && v > 0.5) return undefined;
    if (u < -0.7 && v < -0.5) return undefined;
    const kinked = u > 0.12 ? turned(u - 0.12, v, -21) : ([u - 0.12, v] as const);
    const [east, north] = turned(kinked[0] + 0.12, kinked[1], 18);
    return bent(seed, 5.45 + east, 4.25 + north, 0.1);
  });
  const streets = latticeStreets(numbers, streetNames.skail, {
    main: [3, 8],
    oneWay: new Map(),
    lanes: [0, 6],
    route: 'Skail bridges',
    mainRoute: 'Skail bridges',
  });
  return { name: 'Skail', labelAt: kmPoint(5.6, 5.35), nodes, streets };
}

/** A long village along its road. */
function netherToll(seed: number): Town {
  const columns = [-1.12, -0.8, -0.49, -0.16, 0.15, 0.46, 0.78, 1.08];
  const rows = [-0.46, -0.2, 0.09, 0.4];
  const { nodes, numbers } = lattice(columns, rows, (u, v) => {
    if (Math.abs(u) > 0.9 && Math.abs(v) > 0.3) return undefined;
    if (u > 0.7 && v < -0.3) return undefined;
    const [east, north] = turned(u, v * (1 - 0.2 * u) + 0.16 * u * u, 7);
    return bent(seed, -4.95 + east, -4.4 + north, 0.1);
  });
  const streets = latticeStreets(numbers, streetNames.netherToll, {
    main: [4, 9],
    oneWay: new Map(),
    lanes: [1, 8, 11],
    route: 'Toll loop',
    mainRoute: 'Toll loop',
  });
  return { name: 'Nether Toll', labelAt: kmPoint(-6.0, -3.2), nodes, streets };
}

export function makeTowns(seed: number, random: Random): Town[] {
  return [brannoch(seed + 101, random), hallowQuay(seed + 103), skail(seed + 105), netherToll(seed + 107)];
}
