import { strengthAt, type BrineContent, type BrineState, type CurvePoint } from '@/components/charts/brine-content';
import { DRY_MM } from '@/lib/road/partition';
import { indexAt, timeAt } from '@/lib/time/step-axis';
import { valueAt, type Storm } from './decode-storm';

/** Freezing curves by salt. */
export type Curves = Readonly<
  Record<
    string,
    { readonly name: string; readonly iceBranch: readonly CurvePoint[]; readonly saltBranch: readonly CurvePoint[] }
  >
>;

const pastMin = [-90, -60, -30];
const futureMin = [30, 60, 90, 120, 150, 180];

function stateAt(storm: Storm, row: number, at: number): BrineState | null {
  const step = indexAt(storm.axis, at);
  const tempC = valueAt(storm, 'pavementC', { row, step });
  const massFraction = valueAt(storm, 'massFraction', { row, step });
  const waterMm = valueAt(storm, 'waterMm', { row, step });
  if (tempC === null || massFraction === null || waterMm === null || waterMm < DRY_MM) return null;
  return { at: timeAt(storm.axis, step), tempC, massFraction };
}

function statesAt(storm: Storm, row: number, times: readonly number[]): BrineState[] {
  const states = times.flatMap((at) => stateAt(storm, row, at) ?? []);
  return states.filter((state, index) => state.at !== states[index - 1]?.at);
}

/** The salt that counts on a road: that of its last treatment, else of the planned one. */
function saltOf(storm: Storm, row: number): string {
  const { materials, planned } = storm.view;
  const lastName = storm.lastByRow.get(row)?.materialName;
  const last = materials.find((material) => material.name === lastName)?.mainSalt;
  return last ?? materials[planned?.materials[row] ?? -1]?.mainSalt ?? 'NaCl';
}

/**
 * Strength that just keeps the promise. The margin is against the promise, so that brine `margin` colder than the
 * pavement is what lies there divided by the share promised: the same share of the curve's strength is what is needed.
 */
function promisedAt(now: BrineState | null, marginC: number | null, iceBranch: readonly CurvePoint[]): number | null {
  if (!now || marginC === null || now.massFraction <= 0) return null;
  const reached = strengthAt(iceBranch, now.tempC - marginC);
  const onCurve = strengthAt(iceBranch, now.tempC);
  if (reached === null || onCurve === null || reached <= 0) return null;
  const share = now.massFraction / reached;
  return share > 0 && share < 0.97 ? share * onCurve : null;
}

/** A road's brine around a time, against the curve of its salt; null when its pavement is not known. */
export function brineOf(storm: Storm, road: { row: number; at: number }, curves: Curves): BrineContent | null {
  const { row, at } = road;
  const step = indexAt(storm.axis, at);
  const pavementTempC = valueAt(storm, 'pavementC', { row, step });
  const curve = curves[saltOf(storm, row)] ?? curves['NaCl'];
  if (pavementTempC === null || !curve) return null;
  const nowAt = timeAt(storm.axis, step);
  const now = stateAt(storm, row, at);
  const times = (minutes: readonly number[]) => minutes.map((minute) => at + minute * 60_000);
  return {
    saltName: curve.name,
    iceBranch: curve.iceBranch,
    saltBranch: curve.saltBranch,
    pavementTempC,
    pavementAt: nowAt,
    promisedMassFraction: promisedAt(now, valueAt(storm, 'marginC', { row, step }), curve.iceBranch),
    now,
    past: statesAt(storm, row, times(pastMin)).filter((state) => state.at < nowAt),
    future: statesAt(storm, row, times(futureMin)).filter((state) => state.at > nowAt),
  };
}
