import { fastLiquidus, fastMixtureFreezingPointC, type FastLiquidus } from '../brine/fast';
import { salts, type Salt } from '../brine/salts';
import { dissolvedGPerM2, waterMmOf, type Film, type SaltMasses } from './film';

let curves: Record<Salt, FastLiquidus> | undefined;

/** The tabulated curve of each salt, built when first asked for. */
export function curveOf(salt: Salt): FastLiquidus {
  curves ??= {
    NaCl: fastLiquidus('NaCl'),
    CaCl2: fastLiquidus('CaCl2'),
    MgCl2: fastLiquidus('MgCl2'),
    KCl: fastLiquidus('KCl'),
  };
  return curves[salt];
}

/** Below this much water a road counts as dry, mm; common practice, no source. */
export const DRY_MM = 0.02;

/**
 * kg/m² of water that these salts (g/m²) keep liquid at a pavement temperature in °C, however much there is:
 * `Σ m_j / x°_j(T)` with x°_j kg of salt per kg of water on the freezing curve (Zdanovskii's rule). A salt below its own
 * eutectic keeps none. Infinity at or above 0 °C. NaCl 15.4 g/m² at −5 °C: 0.180.
 */
export function heldLiquidMm(masses: SaltMasses, tempC: number): number {
  if (tempC >= 0) return Infinity;
  let heldMm = 0;
  for (const salt of salts) {
    const mass = masses[salt];
    if (mass > 0) heldMm += mass / (1000 * curveOf(salt).saltPerWaterAt(tempC));
  }
  return heldMm;
}

/**
 * The part of what lies on the road, by mass, that is brine, 0 to 1: `(liquid + salts)/(water + salts)`. A dry road is 1.
 */
export function brineShare(film: Film): number {
  const waterMm = waterMmOf(film);
  if (waterMm < DRY_MM) return 1;
  const saltKg = dissolvedGPerM2(film) / 1000;
  return (film.liquidMm + saltKg) / (waterMm + saltKg);
}

const perWater: SaltMasses = { NaCl: 0, CaCl2: 0, MgCl2: 0, KCl: 0 };

/**
 * °C, the freezing point of all that lies on the road taken as one brine: ice in it counts as water. So the freeze
 * margin, pavement temperature minus this, is below 0 exactly when ice stays or will form. 0 for plain water and for a dry road.
 */
export function filmFreezingPointC(film: Film): number {
  const waterMm = waterMmOf(film);
  if (waterMm < DRY_MM) return 0;
  for (const salt of salts) perWater[salt] = film.dissolved[salt] / (1000 * waterMm);
  return fastMixtureFreezingPointC(perWater);
}

/** kg of salt per kg of the film taken as one brine, 0 to 1. */
export function filmMassFraction(film: Film): number {
  const saltKg = dissolvedGPerM2(film) / 1000;
  const totalKg = saltKg + waterMmOf(film);
  return totalKg > 0 ? saltKg / totalKg : 0;
}
