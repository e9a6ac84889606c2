/**
 * Exact conversions between SI and US customary units, each named by both ends.
 *
 * Everything rests on five definitions that are exact by law: the international pound (0.45359237 kg), the
 * international foot (0.3048 m), the statute mile of 5,280 such feet, the US liquid gallon of 231 cubic inches
 * (3.785411784 L), and the short ton of 2,000 lb. Range: any finite number; the functions are linear and never fail.
 */

/** kg in one pound, exact. */
export const KG_PER_LB = 0.45359237;
/** m in one foot, exact. */
export const M_PER_FT = 0.3048;
/** m in one statute mile, exact. */
export const M_PER_MILE = 1609.344;
/** mm in one inch, exact. */
export const MM_PER_INCH = 25.4;
/** L in one US liquid gallon, exact (231 cubic inches). */
export const L_PER_US_GAL = 3.785411784;
/** kg in one short ton (2,000 lb), exact. */
export const KG_PER_SHORT_TON = 907.18474;
/** m in one nautical mile, exact; a knot is one of these an hour. */
export const M_PER_NAUTICAL_MILE = 1852;
/** The lane that "per lane-mile" means unless another width is given: 12 ft, in m. Common practice in US guides. */
export const LANE_WIDTH_12_FT_M = 12 * M_PER_FT;

/** g/m² → lb per lane-mile of a lane `laneWidthM` wide. 1 g/m² is 12.9772 lb/lane-mile on the 12-ft lane. */
export function gPerM2ToLbPerLaneMile(rateGPerM2: number, laneWidthM = LANE_WIDTH_12_FT_M): number {
  return (rateGPerM2 * laneWidthM * M_PER_MILE) / (1000 * KG_PER_LB);
}

/** lb per lane-mile of a lane `laneWidthM` wide → g/m². 100 lb/lane-mile is 7.7058 g/m² on the 12-ft lane. */
export function lbPerLaneMileToGPerM2(rateLbPerLaneMile: number, laneWidthM = LANE_WIDTH_12_FT_M): number {
  return (rateLbPerLaneMile * 1000 * KG_PER_LB) / (laneWidthM * M_PER_MILE);
}

/** g/m² over a spread width in m → kg per km driven. 20 g/m² over 7.3 m is 146 kg/km. */
export function gPerM2ToKgPerKm(rateGPerM2: number, spreadWidthM: number): number {
  return rateGPerM2 * spreadWidthM;
}

/** lb per lane-mile → kg per lane-km; no width enters. 1 lb/lane-mile is 0.281849 kg/lane-km. */
export function lbPerLaneMileToKgPerLaneKm(rateLbPerLaneMile: number): number {
  return (rateLbPerLaneMile * KG_PER_LB * 1000) / M_PER_MILE;
}

/** kg per lane-km → lb per lane-mile; no width enters. */
export function kgPerLaneKmToLbPerLaneMile(rateKgPerLaneKm: number): number {
  return (rateKgPerLaneKm * M_PER_MILE) / (KG_PER_LB * 1000);
}

/** mL/m² → US gal per lane-mile of a lane `laneWidthM` wide. 1 mL/m² is 1.55500 gal/lane-mile on the 12-ft lane. */
export function mLPerM2ToGalPerLaneMile(rateMLPerM2: number, laneWidthM = LANE_WIDTH_12_FT_M): number {
  return (rateMLPerM2 * laneWidthM * M_PER_MILE) / (1000 * L_PER_US_GAL);
}

/** US gal per lane-mile of a lane `laneWidthM` wide → mL/m². 20 gal/lane-mile is 12.8617 mL/m² on the 12-ft lane. */
export function galPerLaneMileToMLPerM2(rateGalPerLaneMile: number, laneWidthM = LANE_WIDTH_12_FT_M): number {
  return (rateGalPerLaneMile * 1000 * L_PER_US_GAL) / (laneWidthM * M_PER_MILE);
}

/** US gal per 1,000 sq ft → US gal per lane-mile. 0.5 gal per 1,000 sq ft is 31.68 gal/lane-mile on the 12-ft lane. */
export function galPer1000SqFtToGalPerLaneMile(rateGalPer1000SqFt: number, laneWidthM = LANE_WIDTH_12_FT_M): number {
  return (rateGalPer1000SqFt * laneWidthM * M_PER_MILE) / (1000 * M_PER_FT * M_PER_FT);
}

/** US gal per short ton → L per tonne, the pre-wetting dose. 8 gal/ton is 33.382 L/t. */
export function galPerShortTonToLPerTonne(doseGalPerShortTon: number): number {
  return (doseGalPerShortTon * L_PER_US_GAL * 1000) / KG_PER_SHORT_TON;
}

/** L per tonne → US gal per short ton. */
export function lPerTonneToGalPerShortTon(doseLPerTonne: number): number {
  return (doseLPerTonne * KG_PER_SHORT_TON) / (L_PER_US_GAL * 1000);
}

/** kg → lb. */
export function kgToLb(massKg: number): number {
  return massKg / KG_PER_LB;
}

/** lb → kg. */
export function lbToKg(massLb: number): number {
  return massLb * KG_PER_LB;
}

/** kg → short tons of 2,000 lb. */
export function kgToShortTon(massKg: number): number {
  return massKg / KG_PER_SHORT_TON;
}

/** Short tons of 2,000 lb → kg. */
export function shortTonToKg(massShortTon: number): number {
  return massShortTon * KG_PER_SHORT_TON;
}

/** L → US liquid gallons. */
export function litresToUsGal(volumeL: number): number {
  return volumeL / L_PER_US_GAL;
}

/** US liquid gallons → L. */
export function usGalToLitres(volumeUsGal: number): number {
  return volumeUsGal * L_PER_US_GAL;
}

/** °C → °F. −40 is −40. */
export function cToF(tempC: number): number {
  return tempC * 1.8 + 32;
}

/** °F → °C. */
export function fToC(tempF: number): number {
  return (tempF - 32) / 1.8;
}

/** A difference of temperature, °C → °F: no offset. */
export function cDifferenceToF(differenceC: number): number {
  return differenceC * 1.8;
}

/** A difference of temperature, °F → °C: no offset. */
export function fDifferenceToC(differenceF: number): number {
  return differenceF / 1.8;
}

/** km → statute miles. */
export function kmToMile(distanceKm: number): number {
  return (distanceKm * 1000) / M_PER_MILE;
}

/** Statute miles → km. */
export function mileToKm(distanceMile: number): number {
  return (distanceMile * M_PER_MILE) / 1000;
}

/** m → ft. */
export function mToFt(lengthM: number): number {
  return lengthM / M_PER_FT;
}

/** ft → m. */
export function ftToM(lengthFt: number): number {
  return lengthFt * M_PER_FT;
}

/** mm → inches. */
export function mmToInch(depthMm: number): number {
  return depthMm / MM_PER_INCH;
}

/** Inches → mm. */
export function inchToMm(depthInch: number): number {
  return depthInch * MM_PER_INCH;
}

/** m/s → km/h. */
export function mPerSToKmPerH(speedMPerS: number): number {
  return speedMPerS * 3.6;
}

/** km/h → m/s. */
export function kmPerHToMPerS(speedKmPerH: number): number {
  return speedKmPerH / 3.6;
}

/** m/s → miles an hour. */
export function mPerSToMph(speedMPerS: number): number {
  return (speedMPerS * 3600) / M_PER_MILE;
}

/** Miles an hour → m/s. */
export function mphToMPerS(speedMph: number): number {
  return (speedMph * M_PER_MILE) / 3600;
}

/** km/h → miles an hour. */
export function kmPerHToMph(speedKmPerH: number): number {
  return (speedKmPerH * 1000) / M_PER_MILE;
}

/** Miles an hour → km/h. */
export function mphToKmPerH(speedMph: number): number {
  return (speedMph * M_PER_MILE) / 1000;
}

/** Knots → m/s. */
export function knotsToMPerS(speedKnots: number): number {
  return (speedKnots * M_PER_NAUTICAL_MILE) / 3600;
}

/** kg/m³ → lb per US gallon. 1,000 kg/m³ is 8.3454 lb/gal. */
export function kgPerM3ToLbPerUsGal(densityKgPerM3: number): number {
  return (densityKgPerM3 * L_PER_US_GAL) / (1000 * KG_PER_LB);
}

/** lb per US gallon → kg/m³. */
export function lbPerUsGalToKgPerM3(densityLbPerUsGal: number): number {
  return (densityLbPerUsGal * 1000 * KG_PER_LB) / L_PER_US_GAL;
}

/** kg/m³ → lb per cubic foot (bulk density of a pile). 1 lb/cu ft is 16.0185 kg/m³. */
export function kgPerM3ToLbPerCuFt(densityKgPerM3: number): number {
  return (densityKgPerM3 * M_PER_FT ** 3) / KG_PER_LB;
}

/** lb per cubic foot → kg/m³. */
export function lbPerCuFtToKgPerM3(densityLbPerCuFt: number): number {
  return (densityLbPerCuFt * KG_PER_LB) / M_PER_FT ** 3;
}
