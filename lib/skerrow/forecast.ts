import { lineNoise } from './random';
import { skerrowSeed } from './skerrow-seed';
import { type PrecipitationType, readingStepMs, type StationWeather, stationCount, weatherAt } from './weather';

export interface ForecastHour {
  stationIndex: number;
  validAt: Date;
  pavementTempC: number;
  /** one standard deviation */
  pavementErrorC: number;
  airTempC: number;
  dewPointC: number;
  windSpeedMPerS: number;
  /** in the hour that ends at `validAt` */
  precipitationMm: number;
  precipitationType: PrecipitationType;
}

const hourMs = 3_600_000;
export const forecastHours = 36;
const rounded = (value: number, digits: number) => Math.round(value * 10 ** digits) / 10 ** digits;

/** Stated error of the pavement forecast, one standard deviation, °C: ±0.4 at once, about ±1 at 12 h and ±2 at 36 h. */
export const pavementErrorC = (leadH: number) => rounded(0.4 + 0.048 * leadH, 2);

function hourOfWeather(stationIndex: number, validAt: Date, anchorAt: Date): StationWeather[] {
  return [5, 4, 3, 2, 1, 0].map((back) =>
    weatherAt(stationIndex, new Date(validAt.getTime() - back * readingStepMs), anchorAt),
  );
}

function mainType(parts: readonly StationWeather[]): PrecipitationType {
  const amounts = new Map<PrecipitationType, number>();
  for (const part of parts) {
    if (part.precipitationType !== 'none') {
      amounts.set(part.precipitationType, (amounts.get(part.precipitationType) ?? 0) + part.precipitationMm);
    }
  }
  return [...amounts].reduce<[PrecipitationType, number]>((a, b) => (b[1] > a[1] ? b : a), ['none', 0])[0];
}

function forecastHour(stationIndex: number, validAt: Date, issue: { issueAt: Date; anchorAt: Date }): ForecastHour {
  const parts = hourOfWeather(stationIndex, validAt, issue.anchorAt);
  const truth = weatherAt(stationIndex, validAt, issue.anchorAt);
  const leadH = (validAt.getTime() - issue.issueAt.getTime()) / hourMs;
  // One seed an issue: its errors hang together over hours and differ from those of the issue before.
  const seed = skerrowSeed * 7919 + Math.round(issue.issueAt.getTime() / hourMs);
  const drift = 0.75 * lineNoise(seed, leadH / 7) + 0.25 * lineNoise(seed + 13 + stationIndex, leadH / 4);
  const missC = drift * pavementErrorC(leadH) * 1.5;
  const wetness = Math.exp(0.55 * Math.min(1, leadH / 14) * lineNoise(seed + 5, leadH / 5));
  const amountMm = parts.reduce((sum, part) => sum + part.precipitationMm, 0) * wetness;
  const airTempC = rounded(truth.airTempC + 0.8 * missC, 1);
  return {
    stationIndex,
    validAt,
    pavementTempC: rounded(truth.pavementTempC + missC, 1),
    pavementErrorC: pavementErrorC(leadH),
    airTempC,
    dewPointC: Math.min(airTempC, rounded(truth.dewPointC + 0.7 * missC, 1)),
    windSpeedMPerS: rounded(Math.max(0, truth.windSpeedMPerS * (1 + 0.2 * lineNoise(seed + 6, leadH / 6))), 1),
    precipitationMm: amountMm < 0.02 ? 0 : rounded(amountMm, 2),
    precipitationType: amountMm < 0.02 ? 'none' : mainType(parts),
  };
}

/** The forecast made at `issueAt` (a whole hour): 36 hours, every station, wrong by more the further ahead. */
export function forecastIssuedAt(issueAt: Date, anchorAt: Date): ForecastHour[] {
  return Array.from(
    { length: forecastHours },
    (_, index) => new Date(issueAt.getTime() + (index + 1) * hourMs),
  ).flatMap((validAt) =>
    Array.from({ length: stationCount }, (_, stationIndex) =>
      forecastHour(stationIndex, validAt, { issueAt, anchorAt }),
    ),
  );
}
