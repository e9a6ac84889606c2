import { type RoadSurface, type ServiceClass } from './assumed';
import { type Bounds, type Position } from './position';

export type Tags = Readonly<Record<string, string>>;

/** One line as it stood in the file, with its tags as text. */
export interface SourceLine {
  /** The file's own id of the feature, or '' when it has none. */
  sourceId: string;
  tags: Tags;
  positions: readonly Position[];
  /** Mean of the third coordinates, metres, when there are any. */
  heightM: number | null;
}

/** What can be filled in where the tags are silent. */
export const assumedAttributes = [
  'name',
  'roadClass',
  'lanes',
  'widthM',
  'speedKmPerH',
  'surface',
  'isOneWay',
  'exposure',
] as const;
export type AssumedAttribute = (typeof assumedAttributes)[number];

export interface NetworkNode {
  sourceKey: string;
  position: Position;
  /** Segment ends that meet here; 1 is a dead end. */
  degree: number;
}

/** A piece of road between two nodes. One-way means along `positions` only. */
export interface NetworkSegment {
  /** Stable over repeated imports: source id and a hash of the geometry that does not mind its direction. */
  sourceKey: string;
  sourceId: string;
  fromNode: number;
  toNode: number;
  name: string;
  ref: string;
  roadClass: string;
  serviceClass: ServiceClass;
  lanes: number;
  /** Lanes that may be used in each direction; a single track counts its lane both ways. */
  lanesForward: number;
  lanesBackward: number;
  widthM: number;
  surface: RoadSurface;
  isBridge: boolean;
  isTunnel: boolean;
  isOneWay: boolean;
  speedKmPerH: number;
  heightM: number | null;
  lengthM: number;
  positions: readonly Position[];
  assumed: readonly AssumedAttribute[];
  tags: Tags;
}

export interface DuplicateFinding {
  /** The line that was dropped, whole or in part, and the one that was kept in its place. */
  droppedId: string;
  keptId: string;
  extent: 'whole' | 'part';
  isReversed: boolean;
  lengthM: number;
  /** Attributes in which the dropped copy said something else. */
  differsIn: readonly string[];
  at: Position;
}

export interface ZeroLengthFinding {
  sourceId: string;
  at: Position;
}

export interface ComponentFinding {
  segments: number;
  nodes: number;
  lengthKm: number;
  laneKm: number;
  bounds: Bounds;
  at: Position;
}

export type TrapKind = 'no-way-out' | 'no-way-in' | 'through-only';

/** Roads a truck cannot both reach and leave along the one-way directions. */
export interface TrapFinding {
  kind: TrapKind;
  nodes: number;
  segments: number;
  lengthKm: number;
  at: Position;
}

export type WarningKind =
  | 'unreadable-tag'
  | 'unknown-class'
  | 'closed-road'
  | 'repeated-id'
  | 'near-miss'
  | 'crossing-not-joined'
  | 'levels-meet'
  | 'opposed-one-ways'
  | 'ramp-direction'
  | 'swapped-coordinates'
  | 'far-away';

export interface NetworkWarning {
  kind: WarningKind;
  sentence: string;
  sourceIds: readonly string[];
  at: Position | null;
}

export interface ClassSummary {
  roadClass: string;
  target: ServiceClass | 'leave-out';
  lines: number;
  segments: number;
  lengthKm: number;
  laneKm: number;
}

export interface NetworkReport {
  linesRead: number;
  linesUsed: number;
  segments: number;
  nodes: number;
  lengthKm: number;
  laneKm: number;
  oneWaySegments: number;
  bridges: number;
  deadEnds: number;
  /** Features of the file that are no lines, by what they are. */
  skipped: Readonly<Record<string, number>>;
  classes: readonly ClassSummary[];
  assumedCounts: Readonly<Record<AssumedAttribute, number>>;
  duplicates: readonly DuplicateFinding[];
  zeroLength: readonly ZeroLengthFinding[];
  /** Parts that hang together whatever the direction, the one with most lane-km first. */
  components: readonly ComponentFinding[];
  traps: readonly TrapFinding[];
  warnings: readonly NetworkWarning[];
  bounds: Bounds | null;
}

export interface Network {
  nodes: readonly NetworkNode[];
  segments: readonly NetworkSegment[];
  report: NetworkReport;
}
