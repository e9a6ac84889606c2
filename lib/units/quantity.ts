import {
  KG_PER_LB,
  KG_PER_SHORT_TON,
  LANE_WIDTH_12_FT_M,
  L_PER_US_GAL,
  M_PER_FT,
  M_PER_MILE,
  MM_PER_INCH,
} from './convert';

/** The units a person has chosen to read and type. */
export type UnitSystem = 'metric' | 'us';

/**
 * What a number is, and with it the unit it must come in:
 * rate g/m², liquidRate mL/m², temperature and temperatureDifference °C, distance and shortDistance m,
 * laneDistance m of lane, mass and largeMass kg, volume L, speed and windSpeed m/s, depth mm,
 * precipitationRate mm/h, area m², percent a fraction (1 is 100 %), density and bulkDensity kg/m³,
 * prewetDose L/t, chlorideMass kg, concentration mg/L, heatFlux W/m², specificGravity a plain number,
 * salometer °S, durationHours h.
 */
export type Quantity =
  | 'rate'
  | 'liquidRate'
  | 'temperature'
  | 'temperatureDifference'
  | 'distance'
  | 'laneDistance'
  | 'shortDistance'
  | 'mass'
  | 'largeMass'
  | 'chlorideMass'
  | 'volume'
  | 'speed'
  | 'windSpeed'
  | 'depth'
  | 'precipitationRate'
  | 'area'
  | 'percent'
  | 'density'
  | 'bulkDensity'
  | 'prewetDose'
  | 'concentration'
  | 'heatFlux'
  | 'specificGravity'
  | 'salometer'
  | 'durationHours';

/** How a quantity is shown: shown = SI × scale + offset. */
export interface DisplayUnit {
  readonly unit: string;
  readonly scale: number;
  readonly offset: number;
  /** Decimals shown unless the caller asks for others. */
  readonly digits: number;
}

const shown = (unit: string, digits: number, scale = 1, offset = 0): DisplayUnit => ({ unit, scale, offset, digits });
const same = (unit: string, digits: number, scale = 1) => ({
  metric: shown(unit, digits, scale),
  us: shown(unit, digits, scale),
});
const lanePerMile = (LANE_WIDTH_12_FT_M * M_PER_MILE) / 1000;

/** Every quantity in both systems. Rates per lane-mile are for the 12-ft lane. */
export const displayUnits: Readonly<Record<Quantity, Readonly<Record<UnitSystem, DisplayUnit>>>> = {
  rate: { metric: shown('g/m²', 1), us: shown('lb/lane-mile', 0, lanePerMile / KG_PER_LB) },
  liquidRate: { metric: shown('mL/m²', 1), us: shown('gal/lane-mile', 0, lanePerMile / L_PER_US_GAL) },
  temperature: { metric: shown('°C', 1), us: shown('°F', 1, 1.8, 32) },
  temperatureDifference: { metric: shown('°C', 1), us: shown('°F', 1, 1.8) },
  distance: { metric: shown('km', 1, 1 / 1000), us: shown('miles', 1, 1 / M_PER_MILE) },
  laneDistance: { metric: shown('lane-km', 1, 1 / 1000), us: shown('lane-miles', 1, 1 / M_PER_MILE) },
  shortDistance: { metric: shown('m', 0), us: shown('ft', 0, 1 / M_PER_FT) },
  mass: { metric: shown('kg', 0), us: shown('lb', 0, 1 / KG_PER_LB) },
  largeMass: { metric: shown('t', 1, 1 / 1000), us: shown('tons', 1, 1 / KG_PER_SHORT_TON) },
  chlorideMass: { metric: shown('kg Cl', 0), us: shown('lb Cl', 0, 1 / KG_PER_LB) },
  volume: { metric: shown('L', 0), us: shown('gal', 0, 1 / L_PER_US_GAL) },
  speed: { metric: shown('km/h', 0, 3.6), us: shown('mph', 0, 3600 / M_PER_MILE) },
  windSpeed: { metric: shown('m/s', 1), us: shown('mph', 0, 3600 / M_PER_MILE) },
  depth: { metric: shown('mm', 1), us: shown('in', 2, 1 / MM_PER_INCH) },
  precipitationRate: { metric: shown('mm/h', 1), us: shown('in/h', 2, 1 / MM_PER_INCH) },
  area: { metric: shown('m²', 0), us: shown('sq ft', 0, 1 / (M_PER_FT * M_PER_FT)) },
  percent: same('%', 1, 100),
  density: { metric: shown('kg/m³', 0), us: shown('lb/gal', 2, L_PER_US_GAL / (1000 * KG_PER_LB)) },
  bulkDensity: { metric: shown('kg/m³', 0), us: shown('lb/cu ft', 1, M_PER_FT ** 3 / KG_PER_LB) },
  prewetDose: { metric: shown('L/t', 0), us: shown('gal/ton', 1, KG_PER_SHORT_TON / (1000 * L_PER_US_GAL)) },
  concentration: same('mg/L', 0),
  heatFlux: same('W/m²', 0),
  specificGravity: same('', 3),
  salometer: same('°S', 1),
  durationHours: same('h', 1),
};

/** The unit's label alone, for a column head or an axis. */
export function unitLabel(quantity: Quantity, system: UnitSystem): string {
  return displayUnits[quantity][system].unit;
}

/** SI → the number on the glass, unrounded (for axes and charts). −5 °C as a temperature in the US system is 23. */
export function toDisplay(value: number, quantity: Quantity, system: UnitSystem): number {
  const { scale, offset } = displayUnits[quantity][system];
  return value * scale + offset;
}

/** The number on the glass → SI; the inverse of `toDisplay`. */
export function fromDisplay(displayed: number, quantity: Quantity, system: UnitSystem): number {
  const { scale, offset } = displayUnits[quantity][system];
  return (displayed - offset) / scale;
}
