import { type Film } from './film';

export type Surface = 'asphalt' | 'concrete' | 'open-graded' | 'gravel' | 'paving';

/** How a road's film behaves. Every value is a default that an agency may change. */
export interface FilmParameters {
  /** liquid that the texture holds, mm */
  textureMm: number;
  /** time constant with which liquid above that runs off, min */
  drainMin: number;
  /** heat that reaches the film for melting, W/m² */
  meltFluxWPerM2: number;
  /** heat that leaves it for freezing, W/m²; Infinity lets a film freeze as soon as it can, the careful side */
  freezeFluxWPerM2: number;
  /** part of the salt lost per 1,000 vehicles, as the exponent k of exp(−k N) */
  lossPer1000Vehicles: { readonly wet: number; readonly moist: number; readonly dry: number };
  /** liquid at or above `wetFromMm` is wet, at or above `moistFromMm` moist, below it dry */
  wetFromMm: number;
  moistFromMm: number;
  /** what a plough leaves, mm of water */
  ploughResidualMm: number;
  /**
   * Water that leaves (negative: arrives) as vapour in a step, mm. Left out, nothing evaporates: a residue stays wet,
   * which is the careful side, until the energy balance supplies humidity and wind.
   */
  evaporationMm?: (film: Film, step: { tempC: number; durationMin: number }) => number;
}

/** kJ/kg, latent heat of fusion of water. */
export const LATENT_HEAT_KJ_PER_KG = 334;

const TEXTURE_MM: Readonly<Record<Surface, number>> = {
  asphalt: 0.5,
  concrete: 0.8,
  'open-graded': 0.8,
  gravel: 0.8,
  paving: 0.8,
};

/**
 * Defaults: texture 0.5 mm for dense asphalt and 0.8 mm for open or tined surfaces, drain 5–10 min, plough residual
 * 0.3 mm and 120 W/m² are common practice, no source; so are the traffic exponents 0.4 wet, 0.2 moist and 0.02 dry per
 * 1,000 vehicles, whose form (exponential in vehicles, faster when wetter) is published (Lysbakken and Norem 2008), and
 * the limits between wet, moist and dry.
 */
export function filmParametersFor(surface: Surface): FilmParameters {
  return {
    textureMm: TEXTURE_MM[surface],
    drainMin: 7.5,
    meltFluxWPerM2: 120,
    freezeFluxWPerM2: Infinity,
    lossPer1000Vehicles: { wet: 0.4, moist: 0.2, dry: 0.02 },
    wetFromMm: 0.1,
    moistFromMm: 0.02,
    ploughResidualMm: 0.3,
  };
}
