import { curveOf } from '../road/partition';

/**
 * The freeze margin against what a road was promised, °C: how far its pavement may cool before the promise breaks.
 * Where no ice is allowed (target 1) that is the freeze margin itself, pavement temperature minus the freezing point of
 * what lies there. Where snow only has to stay loose, or a class allows some ice, brine of strength `w/φ` is what would
 * just keep the promise, so its freezing point takes the place: `T − Tf(w/φ)`, with `w` the strength of all that lies
 * there and `φ` the brine share promised. Below 0 exactly when the promise is broken, once heat has had its time.
 *
 * Salts other than NaCl count by the NaCl strength of the same freezing point (within 0.3 °C for CaCl2 and MgCl2).
 * −5 °C, margin −4.08 °C (1.55 % NaCl), target 0.16: +1.36. NaN in, NaN out: not known stays not known.
 */
export function promiseMarginC(at: { tempC: number; freezeMarginC: number; targetPhi: number }): number {
  const { tempC, freezeMarginC, targetPhi } = at;
  if (!(targetPhi < 1)) return freezeMarginC;
  const freezingPointC = tempC - freezeMarginC;
  const curve = curveOf('NaCl');
  const perWater = freezingPointC <= curve.eutecticC ? Infinity : curve.saltPerWaterAt(freezingPointC);
  const strength = Number.isFinite(perWater) ? perWater / (1 + perWater) : curve.eutecticMassFraction;
  const needed = Math.min(curve.eutecticMassFraction, strength / Math.max(1e-6, targetPhi));
  return tempC - curve.freezingPointC(needed / (1 - needed));
}
