/** Service classes of the winter policy, most demanding first. */
export const serviceClasses = ['A', 'B', 'C', 'D'] as const;
export type ServiceClass = (typeof serviceClasses)[number];

export const roadSurfaces = ['asphalt', 'concrete', 'open-graded', 'gravel', 'paving'] as const;
export type RoadSurface = (typeof roadSurfaces)[number];

/** A road class goes to a service class, or is left out of the import. */
export type ClassTarget = ServiceClass | 'leave-out';

/** Road class (the `highway` tag) → where it goes. Classes that are not named go by `classAssumption`. */
export type ClassMapping = Readonly<Record<string, ClassTarget>>;

/** What is taken of a road of one class where its tags are silent. */
export interface ClassAssumption {
  target: ClassTarget;
  /** Lanes of a two-way road, both directions together. */
  lanesTwoWay: number;
  lanesOneWay: number;
  laneWidthM: number;
  speedKmPerH: number;
  surface: RoadSurface;
  isOneWay: boolean;
}

type Row = readonly [ClassTarget, number, number, number, number, RoadSurface, boolean];

/** Road class given to lines that carry no class at all. */
export const UNCLASSED = 'no class';

/**
 * Common practice, no source: every figure is a default that is marked as assumed on the road, and the service class
 * can be changed at import. Columns: service class, lanes two-way, lanes one-way, lane width m, speed km/h, surface,
 * one-way unless tagged otherwise.
 */
const rows: Readonly<Record<string, Row>> = {
  motorway: ['A', 4, 2, 3.75, 120, 'asphalt', true],
  motorway_link: ['A', 2, 1, 4, 60, 'asphalt', true],
  trunk: ['A', 2, 2, 3.5, 100, 'asphalt', false],
  trunk_link: ['A', 2, 1, 4, 60, 'asphalt', false],
  primary: ['A', 2, 1, 3.5, 90, 'asphalt', false],
  primary_link: ['A', 2, 1, 3.75, 50, 'asphalt', false],
  secondary: ['B', 2, 1, 3.25, 80, 'asphalt', false],
  secondary_link: ['B', 2, 1, 3.5, 50, 'asphalt', false],
  tertiary: ['B', 2, 1, 3, 70, 'asphalt', false],
  tertiary_link: ['B', 2, 1, 3.25, 50, 'asphalt', false],
  unclassified: ['C', 2, 1, 2.75, 60, 'asphalt', false],
  road: ['C', 2, 1, 2.75, 50, 'asphalt', false],
  busway: ['C', 2, 1, 3.25, 50, 'asphalt', false],
  residential: ['D', 2, 1, 2.75, 40, 'asphalt', false],
  living_street: ['D', 1, 1, 4, 20, 'paving', false],
  service: ['D', 1, 1, 3.5, 30, 'asphalt', false],
  pedestrian: ['leave-out', 1, 1, 4, 10, 'paving', false],
  track: ['leave-out', 1, 1, 3, 20, 'gravel', false],
  [UNCLASSED]: ['C', 2, 1, 2.75, 50, 'asphalt', false],
};

/** Lines that are no road a spreader treats; shown in the report, brought in only if the person says so. */
const leftOut = [
  'footway',
  'path',
  'cycleway',
  'bridleway',
  'steps',
  'corridor',
  'elevator',
  'platform',
  'via_ferrata',
  'raceway',
  'construction',
  'proposed',
  'planned',
  'abandoned',
  'disused',
  'razed',
  'no',
  'escape',
  'rest_area',
  'services',
  'bus_stop',
  'not a road',
];

const pathRow: Row = ['leave-out', 1, 1, 2.5, 10, 'asphalt', false];
const unknownRow: Row = ['C', 2, 1, 2.75, 50, 'asphalt', false];

/**
 * What is assumed of a road class (the value of the `highway` tag). A class that is not in the table is treated like a
 * minor road of service class C; the report says so.
 */
export function classAssumption(roadClass: string): ClassAssumption {
  const row =
    (Object.hasOwn(rows, roadClass) ? rows[roadClass] : undefined) ??
    (leftOut.includes(roadClass) ? pathRow : unknownRow);
  const [target, lanesTwoWay, lanesOneWay, laneWidthM, speedKmPerH, surface, isOneWay] = row;
  return { target, lanesTwoWay, lanesOneWay, laneWidthM, speedKmPerH, surface, isOneWay };
}

/** True when the table names this class, as a road or as something that is none. */
export function isKnownRoadClass(roadClass: string): boolean {
  return Object.hasOwn(rows, roadClass) || leftOut.includes(roadClass);
}

/** Where a road class goes: as the person mapped it, otherwise as the table says. */
export function classTarget(roadClass: string, mapping: ClassMapping): ClassTarget {
  return Object.hasOwn(mapping, roadClass) ? (mapping[roadClass] ?? 'leave-out') : classAssumption(roadClass).target;
}
