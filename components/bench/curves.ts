import { eutecticOf, freezingPoint, saturatedMassFractionAt, type Eutectic } from '@/lib/brine/liquidus';
import { type Salt } from '@/lib/brine/salts';

export interface CurvePoint {
  readonly massFraction: number;
  readonly tempC: number;
}

export interface Curve {
  readonly salt: Salt;
  readonly eutectic: Eutectic;
  /** From water down to the eutectic. */
  readonly ice: readonly CurvePoint[];
  /** From the eutectic up to saturation at the warm end of the chart. */
  readonly salts: readonly CurvePoint[];
}

const ICE_POINTS = 40;
const SALT_POINTS = 12;
/** The salt branch is drawn up to here, °C. */
export const WARMEST_DRAWN_C = 0;

function pointsBetween(salt: Salt, span: readonly [from: number, to: number], count: number): CurvePoint[] {
  const [from, to] = span;
  return Array.from({ length: count + 1 }, (_, index) => {
    const massFraction = from + ((to - from) * index) / count;
    const result = freezingPoint([{ salt, massFraction }]);
    return result.ok ? [{ massFraction, tempC: result.freezingPointC }] : [];
  }).flat();
}

const curves = new Map<Salt, Curve>();

/** The freezing curve of one salt from the model, worked out once. */
export function curveOf(salt: Salt): Curve {
  const known = curves.get(salt);
  if (known !== undefined) return known;
  const eutectic = eutecticOf(salt);
  const end = { massFraction: eutectic.massFraction, tempC: eutectic.tempC };
  const saturated = saturatedMassFractionAt(salt, WARMEST_DRAWN_C);
  const last = saturated.ok ? saturated.massFraction : eutectic.massFraction;
  const curve = {
    salt,
    eutectic,
    ice: [...pointsBetween(salt, [0, eutectic.massFraction * 0.9999], ICE_POINTS), end],
    salts: [end, ...pointsBetween(salt, [eutectic.massFraction * 1.0001, last], SALT_POINTS)],
  };
  curves.set(salt, curve);
  return curve;
}
