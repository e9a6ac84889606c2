import { unboundedDensityKgPerM3 } from '../../../lib/brine/density';
import { saltPerWaterOnIceBranch } from '../../../lib/brine/ice-point';
import { freezingPoint } from '../../../lib/brine/liquidus';
import { massFractionToSaltPerWater, type Salt } from '../../../lib/brine/salts';
import { type DensityTable, type FreezingTable } from './published';

export interface RowError {
  readonly massFraction: number;
  readonly tableC: number;
  /** Model minus table, °C. */
  readonly errorC: number;
  /** Error of kg salt per kg water at the table's temperature; `null` where the table's rounding would be all of it. */
  readonly rateError: number | null;
  readonly solid: string;
}

/** Warmer than this a row's last digit is worth more than a per cent of its rate. */
const RATE_FROM_C = -0.95;

function rateError(salt: Salt, massFraction: number, tableC: number): number | null {
  if (tableC > RATE_FROM_C) return null;
  return saltPerWaterOnIceBranch(salt, tableC) / massFractionToSaltPerWater(massFraction) - 1;
}

/** Every row of a table of freezing points against the model. */
export function freezingErrors(table: FreezingTable): readonly RowError[] {
  return table.rows.map(([percent, tableC]) => {
    const massFraction = percent / 100;
    const result = freezingPoint([{ salt: table.salt, massFraction }]);
    if (!result.ok) throw new Error(`${table.salt} ${percent} % is refused: ${result.reason}`);
    const onIce = table.solid === 'ice';
    return {
      massFraction,
      tableC,
      // A table of ice points is compared with ice points, also just past the eutectic.
      errorC: (onIce ? (result.icePointC ?? Number.NaN) : result.freezingPointC) - tableC,
      rateError: onIce ? rateError(table.salt, massFraction, tableC) : null,
      solid: onIce ? 'ice' : result.solid,
    };
  });
}

/** Every row of a table of densities against the model, kg/m³. */
export function densityErrors(table: DensityTable): readonly { massFraction: number; errorKgPerM3: number }[] {
  return table.rows.map(([percent, density]) => ({
    massFraction: percent / 100,
    errorKgPerM3: unboundedDensityKgPerM3([{ salt: table.salt, massFraction: percent / 100 }], table.tempC) - density,
  }));
}

export interface Spread {
  readonly count: number;
  readonly largest: number;
  readonly mean: number;
}

/** Largest and mean of absolute errors; noughts for none. */
export function spreadOf(errors: readonly number[]): Spread {
  const sizes = errors.map(Math.abs);
  const sum = sizes.reduce((total, size) => total + size, 0);
  return { count: sizes.length, largest: Math.max(0, ...sizes), mean: sizes.length > 0 ? sum / sizes.length : 0 };
}
