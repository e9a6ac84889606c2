import { type MarginBand } from './margin-band';

/** A road at the time of the cursor, as the list and the panel show it. */
export interface RoadNow {
  readonly id: number;
  /** Its place in the map's arrays. */
  readonly index: number;
  readonly name: string;
  readonly serviceClass: string;
  readonly band: MarginBand;
  readonly pavementTempC: number | null;
  readonly freezeMarginC: number | null;
  /** Until it refreezes; Infinity when not within the forecast, null when not known. */
  readonly holdMin: number | null;
  readonly nextPassMin: number | null;
  readonly slackMin: number | null;
  readonly truckNumber: number | null;
}

export interface RoadFacts {
  readonly laneM: number;
  readonly lengthM: number;
  readonly lanes: number;
  readonly surface: string;
  readonly isBridge: boolean;
  readonly isSensitive: boolean;
}

/** "concrete bridge deck", "asphalt, sensitive water beside it". */
export function surfaceInWords({ surface, isBridge, isSensitive }: RoadFacts): string {
  const words = `${surface === 'open-graded' ? 'open-graded asphalt' : surface}${isBridge ? ' bridge deck' : ''}`;
  return isSensitive ? `${words}, sensitive` : words;
}
