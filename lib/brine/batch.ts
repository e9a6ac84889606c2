/** Mass balance of brine making and pre-wetting: no chemistry, only what goes in and what comes out. */

function requireFraction(name: string, value: number): void {
  if (!(value > 0 && value < 1)) throw new RangeError(`${name} lies between 0 and 1, not ${value}`);
}

export interface StrengthChange {
  /** Mass of the brine there is, kg. */
  readonly massKg: number;
  readonly fromMassFraction: number;
  readonly toMassFraction: number;
}

/**
 * kg of water that weaken a brine: `m (w1/w2 − 1)`. RangeError when the target is the stronger.
 * 1,000 kg at 25 % to 23.3 %: 73.0 kg.
 */
export function waterToDiluteKg({ massKg, fromMassFraction, toMassFraction }: StrengthChange): number {
  requireFraction('Strength', fromMassFraction);
  requireFraction('Target strength', toMassFraction);
  if (toMassFraction > fromMassFraction) throw new RangeError('Water cannot make a brine stronger');
  return massKg * (fromMassFraction / toMassFraction - 1);
}

/**
 * kg of dry anhydrous salt that strengthen a brine: `m (w2 − w1)/(1 − w2)`. Divide by the purity of the salt at hand.
 * RangeError when the target is the weaker. 1,000 kg at 20 % to 23.3 %: 43.0 kg.
 */
export function saltToStrengthenKg({ massKg, fromMassFraction, toMassFraction }: StrengthChange): number {
  if (!(fromMassFraction >= 0 && fromMassFraction < 1)) throw new RangeError(`No strength: ${fromMassFraction}`);
  requireFraction('Target strength', toMassFraction);
  if (toMassFraction < fromMassFraction) throw new RangeError('Salt cannot make a brine weaker');
  return (massKg * (toMassFraction - fromMassFraction)) / (1 - toMassFraction);
}

/** mL/m² of liquid that a pre-wetting dose in L/t of solid gives at a rate of solid in g/m². 15.4 at 33.4: 0.514. */
export function prewetLiquidRateMLPerM2(rateGPerM2: number, doseLPerTonne: number): number {
  return (rateGPerM2 * doseLPerTonne) / 1000;
}

export interface PrewetMix {
  /** Solid and liquid together, g/m². */
  readonly rateGPerM2: number;
  /** Share of the solid by mass, 0.7 for 70:30. */
  readonly solidMassFraction: number;
  /** Salt in the liquid, mass fraction. */
  readonly brineMassFraction: number;
}

/**
 * What a pre-wetted mix by mass puts down, g/m²: dry solid, brine, and salt of both.
 * 18 g/m² at 70:30 with 23 % brine: 12.6 solid, 5.4 brine, 13.842 salt.
 */
export function prewetByMass({ rateGPerM2, solidMassFraction, brineMassFraction }: PrewetMix) {
  const solidGPerM2 = rateGPerM2 * solidMassFraction;
  const brineGPerM2 = rateGPerM2 - solidGPerM2;
  return { solidGPerM2, brineGPerM2, saltGPerM2: solidGPerM2 + brineGPerM2 * brineMassFraction };
}
