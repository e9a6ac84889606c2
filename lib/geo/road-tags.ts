import { classAssumption, type ClassAssumption, type RoadSurface, UNCLASSED } from './assumed';
import { segmentLimits, SINGLE_TRACK_WIDTH_M } from './limits';
import { type Tags } from './network';
import { readLanes, readSpeed, readWidthM } from './tag-values';

/** A value, and whether it was filled in rather than read. */
export interface Attribute<T> {
  value: T;
  isAssumed: boolean;
}

export type Direction = 'both' | 'forward' | 'backward';

/** A tag that was there but said nothing that could be used. */
export interface TagRemark {
  tag: string;
  text: string;
}

export interface RoadAttributes {
  roadClass: Attribute<string>;
  name: Attribute<string>;
  ref: string;
  direction: Attribute<Direction>;
  lanes: Attribute<number>;
  lanesForward: Attribute<number>;
  lanesBackward: Attribute<number>;
  speedKmPerH: Attribute<number>;
  surface: Attribute<RoadSurface>;
  widthM: Attribute<number>;
  isBridge: Attribute<boolean>;
  isTunnel: Attribute<boolean>;
  /** Storey of the road: the layer tag, or 1 on a bridge and −1 in a tunnel. */
  level: number;
  /** Tagged as closed to all motor traffic, or private. */
  isClosed: boolean;
  remarks: readonly TagRemark[];
}

const known = <T>(value: T): Attribute<T> => ({ value, isAssumed: false });
const assumed = <T>(value: T): Attribute<T> => ({ value, isAssumed: true });

const YES = new Set(['yes', 'true', '1', 't']);
const NO = new Set(['no', 'false', '0', 'f', '']);

/**
 * What the usual open road tags say of a line, with the table of `assumed.ts` where they are silent. Every value says
 * whether it was read or filled in; tags that cannot be read are named in `remarks` and filled in. Keys are expected
 * in lower case.
 */
export function readRoadTags(tags: Tags): RoadAttributes {
  const remarks: TagRemark[] = [];
  const roadClass = readRoadClass(tags);
  const assumption = classAssumption(roadClass.value);
  const direction = readDirection(tags, assumption, remarks);
  const taggedWidth = readWidth(tags, remarks);
  const lanes = readLaneCounts(tags, { direction: direction.value, assumption, taggedWidth, remarks });
  const isBridge = isSet(tags.bridge);
  const isTunnel = isSet(tags.tunnel) && tags.tunnel !== 'culvert';
  const layer = Number(tags.layer);
  return {
    roadClass,
    name: tags.name ? known(tags.name) : tags.ref ? known(tags.ref) : assumed(''),
    ref: tags.ref ?? '',
    direction,
    ...lanes,
    speedKmPerH: readSpeedTags(tags, assumption, remarks),
    surface: readSurface(tags, assumption, remarks),
    widthM: taggedWidth ?? assumed(Math.min(lanes.lanes.value * assumption.laneWidthM, segmentLimits.widthM.max)),
    isBridge: known(isBridge),
    isTunnel: known(isTunnel),
    level: tags.layer !== undefined && Number.isFinite(layer) ? layer : Number(isBridge) - Number(isTunnel),
    isClosed: isClosedToTraffic(tags),
    remarks,
  };
}

function isSet(value: string | undefined): boolean {
  return value !== undefined && !NO.has(value.toLowerCase());
}

const classKeys = ['highway', 'fclass', 'road_class', 'roadclass', 'class'];
const otherThings = [
  'railway',
  'waterway',
  'power',
  'boundary',
  'building',
  'natural',
  'landuse',
  'aerialway',
  'barrier',
];

/** The road's class: `highway`, or the column that usual shape files use; `no class` (assumed) without any. */
export function readRoadClass(tags: Tags): Attribute<string> {
  if (isSet(tags.area)) return known('not a road');
  for (const key of classKeys) {
    const value = tags[key]?.split(';')[0]?.trim().toLowerCase();
    if (value) return known(value);
  }
  return otherThings.some((key) => isSet(tags[key])) ? known('not a road') : assumed(UNCLASSED);
}

/** One-way direction against the drawn line; implied by a roundabout, and by classes that the table says. */
function readDirection(tags: Tags, assumption: ClassAssumption, remarks: TagRemark[]): Attribute<Direction> {
  const text = tags.oneway?.toLowerCase();
  if (text !== undefined) {
    // F, T and B are the letters of shape files; T is "against the line", so 't' must not read as "true" here
    if (['yes', 'true', '1', 'f', 'ft'].includes(text)) return known('forward');
    if (['-1', 'reverse', 't', 'tf'].includes(text)) return known('backward');
    if (['no', 'false', '0', 'b', 'reversible', 'alternating'].includes(text)) return known('both');
    remarks.push({ tag: 'oneway', text });
  }
  if (tags.junction === 'roundabout' || tags.junction === 'circular') return known('forward');
  return assumption.isOneWay ? assumed('forward') : known('both');
}

interface LaneContext {
  direction: Direction;
  assumption: ClassAssumption;
  taggedWidth: Attribute<number> | null;
  remarks: TagRemark[];
}

type LaneCounts = Pick<RoadAttributes, 'lanes' | 'lanesForward' | 'lanesBackward'>;

function readLaneCounts(tags: Tags, context: LaneContext): LaneCounts {
  const total = laneTag(tags, 'lanes', context.remarks);
  const forward = laneTag(tags, 'lanes:forward', context.remarks);
  const backward = laneTag(tags, 'lanes:backward', context.remarks);
  const summed = forward !== null && backward !== null ? Math.min(forward + backward, segmentLimits.lanes.max) : null;
  const read = total ?? summed;
  const lanes = read === null ? assumed(assumedLanes(context, forward, backward)) : known(read);
  if (context.direction !== 'both') {
    const isForward = context.direction === 'forward';
    return {
      lanes,
      lanesForward: { ...lanes, value: isForward ? lanes.value : 0 },
      lanesBackward: { ...lanes, value: isForward ? 0 : lanes.value },
    };
  }
  return { lanes, ...splitLanes(lanes, forward, backward) };
}

function splitLanes(lanes: Attribute<number>, forward: number | null, backward: number | null) {
  const rest = (other: number | null) => (other === null ? null : Math.max(lanes.value - other, 1));
  const forwardGuess = rest(backward) ?? Math.max(Math.ceil(lanes.value / 2), 1);
  const backwardGuess = rest(forward) ?? Math.max(lanes.value - Math.ceil(lanes.value / 2), 1);
  const isSure = !lanes.isAssumed && (forward !== null || backward !== null || lanes.value <= 2);
  return {
    lanesForward: { value: forward ?? forwardGuess, isAssumed: forward === null && !isSure },
    lanesBackward: { value: backward ?? backwardGuess, isAssumed: backward === null && !isSure },
  };
}

function assumedLanes(context: LaneContext, forward: number | null, backward: number | null): number {
  const { direction, assumption, taggedWidth } = context;
  if (direction !== 'both') return assumption.lanesOneWay;
  if (forward !== null || backward !== null) return (forward ?? 0) + (backward ?? 0) + 1;
  return taggedWidth && taggedWidth.value < SINGLE_TRACK_WIDTH_M ? 1 : assumption.lanesTwoWay;
}

function laneTag(tags: Tags, tag: string, remarks: TagRemark[]): number | null {
  const text = tags[tag];
  if (text === undefined) return null;
  const lanes = readLanes(text);
  if (lanes !== null && lanes <= segmentLimits.lanes.max) return lanes;
  remarks.push({ tag, text });
  return null;
}

function readWidth(tags: Tags, remarks: TagRemark[]): Attribute<number> | null {
  for (const tag of ['width', 'est_width'] as const) {
    const text = tags[tag];
    if (text === undefined) continue;
    const widthM = readWidthM(text);
    if (widthM !== null && widthM >= segmentLimits.widthM.min && widthM <= segmentLimits.widthM.max) {
      return { value: widthM, isAssumed: tag === 'est_width' };
    }
    remarks.push({ tag, text });
  }
  return null;
}

function readSpeedTags(tags: Tags, assumption: ClassAssumption, remarks: TagRemark[]): Attribute<number> {
  const text = tags.maxspeed ?? joined(tags['maxspeed:forward'], tags['maxspeed:backward']);
  if (text !== undefined && text !== '0') {
    const reading = readSpeed(text);
    if (reading.kind === 'speed' && isInLimits(reading.speedKmPerH)) return known(reading.speedKmPerH);
    if (reading.kind !== 'no-limit') remarks.push({ tag: 'maxspeed', text });
  }
  for (const tag of ['maxspeed:type', 'source:maxspeed', 'zone:maxspeed', 'zone:traffic']) {
    const reading = readSpeed(tags[tag] ?? '');
    if (text === undefined && reading.kind === 'speed' && isInLimits(reading.speedKmPerH)) {
      return known(reading.speedKmPerH);
    }
  }
  return assumed(assumption.speedKmPerH);
}

function isInLimits(speedKmPerH: number): boolean {
  return speedKmPerH >= segmentLimits.speedKmPerH.min && speedKmPerH <= segmentLimits.speedKmPerH.max;
}

function joined(...parts: (string | undefined)[]): string | undefined {
  const present = parts.filter((part) => part !== undefined);
  return present.length > 0 ? present.join(';') : undefined;
}

const surfaceWords: readonly (readonly [RoadSurface, readonly string[]])[] = [
  ['asphalt', ['asphalt', 'tarmac', 'bitumen', 'chipseal', 'tar']],
  ['open-graded', ['porous_asphalt', 'open_graded_asphalt', 'open-graded']],
  ['concrete', ['concrete', 'concrete:plates', 'concrete:lanes', 'cement']],
  [
    'paving',
    [
      'paving_stones',
      'sett',
      'cobblestone',
      'unhewn_cobblestone',
      'cobblestone:flattened',
      'bricks',
      'brick',
      'paving',
    ],
  ],
  [
    'gravel',
    [
      'gravel',
      'fine_gravel',
      'compacted',
      'unpaved',
      'ground',
      'dirt',
      'earth',
      'sand',
      'grass',
      'mud',
      'pebblestone',
      'rock',
      'soil',
      'clay',
    ],
  ],
];
const surfaceOf = new Map(surfaceWords.flatMap(([surface, words]) => words.map((word) => [word, surface] as const)));

function readSurface(tags: Tags, assumption: ClassAssumption, remarks: TagRemark[]): Attribute<RoadSurface> {
  const text = tags.surface?.toLowerCase();
  if (text === undefined) return assumed(assumption.surface);
  const surface = surfaceOf.get(text.split(';')[0]?.trim() ?? '');
  if (surface) return known(surface);
  // "paved" says that it is no gravel, but not what it is
  if (text === 'paved') return assumed(assumption.surface === 'gravel' ? 'asphalt' : assumption.surface);
  remarks.push({ tag: 'surface', text });
  return assumed(assumption.surface);
}

function isClosedToTraffic(tags: Tags): boolean {
  const closed = (value: string | undefined) => value === 'no' || value === 'private';
  const motor = tags.motor_vehicle ?? tags.vehicle ?? tags.access;
  return closed(motor) && !YES.has(tags.service_vehicle ?? '');
}
