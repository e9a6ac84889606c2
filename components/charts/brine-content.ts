export interface CurvePoint {
  /** kg salt per kg brine, 0–1 */
  readonly massFraction: number;
  /** °C at which ice (or past the eutectic the salt) appears */
  readonly tempC: number;
}

export interface BrineState {
  /** ms since 1970 */
  readonly at: number;
  /** all the salt on the road over all its water and salt: what it would be if no ice stood in it */
  readonly massFraction: number;
  /** pavement, °C */
  readonly tempC: number;
}

export interface BrineContent {
  /** The salt whose curve it is, in words: "sodium chloride". */
  readonly saltName: string;
  /** From pure water to the eutectic. */
  readonly iceBranch: readonly CurvePoint[];
  /** From the eutectic on: what crystallises is the salt. May be empty. */
  readonly saltBranch: readonly CurvePoint[];
  readonly pavementTempC: number;
  readonly pavementAt: number;
  /**
   * Strength that keeps what the road was promised at that temperature, where some ice is allowed or snow only has to
   * stay loose; null where it is that of the curve.
   */
  readonly promisedMassFraction: number | null;
  /** The road at that time; null when bare and dry. */
  readonly now: BrineState | null;
  readonly past: readonly BrineState[];
  readonly future: readonly BrineState[];
}

/** Strength at which the ice branch has this temperature; null above 0 °C or below the eutectic. */
export function strengthAt(iceBranch: readonly CurvePoint[], tempC: number): number | null {
  for (let index = 1; index < iceBranch.length; index += 1) {
    const from = iceBranch[index - 1];
    const to = iceBranch[index];
    if (!from || !to || tempC > from.tempC || tempC < to.tempC) continue;
    const share = from.tempC === to.tempC ? 0 : (from.tempC - tempC) / (from.tempC - to.tempC);
    return from.massFraction + share * (to.massFraction - from.massFraction);
  }
  return null;
}
