import { lineNoise } from './random';
import { along, finishedStorm, frostyNightsBeforeAnchor, presence, presentStorm, stationCharacters } from './scenario';
import { skerrowSeed } from './skerrow-seed';

export type PrecipitationType = 'none' | 'rain' | 'drizzle' | 'snow' | 'freezing-drizzle';
export type SurfaceStatus = 'dry' | 'moist' | 'wet' | 'slush' | 'snow' | 'ice' | 'frost';

/** What a station measures: precipitation is the amount of the ten minutes that end at the reading. */
export interface StationWeather {
  pavementTempC: number;
  airTempC: number;
  dewPointC: number;
  /** 0 to 1 */
  relativeHumidity: number;
  windSpeedMPerS: number;
  windGustMPerS: number;
  windDirectionDeg: number;
  precipitationMm: number;
  precipitationType: PrecipitationType;
  subsurfaceTempC: number;
  solarWPerM2: number;
  visibilityM: number;
  waterMm: number;
  surfaceStatus: SurfaceStatus;
}

const hourMs = 3_600_000;
const dayMs = 24 * hourMs;
export const readingStepMs = 600_000;

const noise = (channel: number, t: number) => lineNoise(skerrowSeed * 1000 + channel, t);
const rounded = (value: number, digits: number) => Math.round(value * 10 ** digits) / 10 ** digits;
const hoursFrom = (atMs: number, anchorMs: number) => (atMs - anchorMs) / hourMs;

/** −1 at four in the morning, +1 at two in the afternoon, more or less: Skerrow keeps UTC in winter. */
const dayCycle = (atMs: number) => Math.cos((2 * Math.PI * (atMs / hourMs - 13.5)) / 24);

function frostDepthC(atMs: number, anchorMs: number): number {
  return frostyNightsBeforeAnchor.reduce((sum, nights) => {
    const middleMs = Math.floor(anchorMs / dayMs) * dayMs - nights * dayMs + 4 * hourMs;
    const away = (atMs - middleMs) / (3.8 * hourMs);
    return sum + 5.2 * Math.exp(-away * away);
  }, 0);
}

/** How much of now belongs to a storm, and to which. */
function stormShare(hour: number) {
  const present = presence(presentStorm, hour);
  return present > 0
    ? { script: presentStorm, share: present }
    : { script: finishedStorm, share: presence(finishedStorm, hour) };
}

function openRoadTempC(atMs: number, anchorMs: number): number {
  const hour = hoursFrom(atMs, anchorMs);
  const mild = 3.2 + 1.2 * noise(1, hour / 37) + 0.5 * noise(2, hour / 8) + 0.9 * dayCycle(atMs);
  const { script, share } = stormShare(hour);
  const stormy = along(script.pavementC, hour) + 0.2 * dayCycle(atMs) + 0.12 * noise(3, hour / 1.5);
  return (mild - frostDepthC(atMs, anchorMs)) * (1 - share) + stormy * share;
}

function rateMmPerH(stationIndex: number, atMs: number, anchorMs: number): number {
  const hour = hoursFrom(atMs, anchorMs);
  const { script, share } = stormShare(hour);
  const patchy = 1 + 0.35 * noise(20 + stationIndex, hour / 0.8);
  if (share > 0.5) return Math.max(0, along(script.precipitationMmPerH, hour) * patchy);
  const isDamp = noise(4, hour / 26) > -0.25 && frostDepthC(atMs, anchorMs) < 0.5 && share === 0;
  const shower = noise(5, hour / 4.5) - 0.35;
  return isDamp && shower > 0 ? shower * 2.2 * patchy : 0;
}

/** What falls at the station itself: drizzle is thrown up by the hills more than snow is. */
function fallingMmPerH(stationIndex: number, atMs: number, anchorMs: number): number {
  const { precipitationFactor, drizzleFactor } = characterOf(stationIndex);
  const hour = hoursFrom(atMs, anchorMs);
  const { script, share } = stormShare(hour);
  const isDrizzle = share > 0.5 && hour >= script.drizzleFromH;
  return rateMmPerH(stationIndex, atMs, anchorMs) * (isDrizzle ? drizzleFactor : precipitationFactor);
}

function typeOf(hour: number, mmPerH: number, pavementTempC: number): PrecipitationType {
  if (mmPerH < 0.015) return 'none';
  const { script, share } = stormShare(hour);
  if (share <= 0.5) return mmPerH > 0.4 ? 'rain' : 'drizzle';
  if (hour < script.drizzleFromH) return 'snow';
  return pavementTempC < 0.3 ? 'freezing-drizzle' : 'drizzle';
}

/** Water on the station's own patch of road: what fell of late, going away with a half-life of an hour. */
function waterMmAt(stationIndex: number, atMs: number, anchorMs: number): number {
  let waterMm = 0;
  for (let back = 0; back < 18; back += 1) {
    waterMm += fallingMmPerH(stationIndex, atMs - back * 1_200_000, anchorMs) * (1 / 3) * 0.5 ** (back / 3);
  }
  return waterMm;
}

function statusOf(
  now: Pick<StationWeather, 'pavementTempC' | 'dewPointC' | 'precipitationType' | 'waterMm'>,
): SurfaceStatus {
  const { pavementTempC, dewPointC, precipitationType, waterMm } = now;
  if (pavementTempC > 0.2) return waterMm > 0.25 ? 'wet' : waterMm > 0.04 ? 'moist' : 'dry';
  if (waterMm > 0.04) {
    if (precipitationType === 'snow') return waterMm > 0.9 ? 'snow' : 'slush';
    return waterMm > 0.3 ? 'slush' : 'ice';
  }
  return dewPointC > pavementTempC ? 'frost' : 'dry';
}

/** Magnus form over water, Alduchov and Eskridge 1996: relative humidity from air temperature and dew point. */
const humidityOf = (airTempC: number, dewPointC: number) =>
  Math.exp((17.625 * dewPointC) / (243.04 + dewPointC) - (17.625 * airTempC) / (243.04 + airTempC));

function windOf(stationIndex: number, hour: number) {
  const { script, share } = stormShare(hour);
  const calm = 4.2 + 2.6 * noise(6, hour / 11);
  const gusty = 1 + 0.22 * noise(40 + stationIndex, hour / 0.7);
  const speed =
    Math.max(0.3, calm * (1 - share) + script.windMPerS * share) * gusty * characterOf(stationIndex).windFactor;
  const bearing = 235 + 70 * noise(7, hour / 30) - 170 * share + 9 * noise(50 + stationIndex, hour / 2);
  return {
    windSpeedMPerS: rounded(speed, 1),
    windGustMPerS: rounded(speed * (1.38 + 0.14 * noise(60 + stationIndex, hour / 0.5)), 1),
    windDirectionDeg: Math.round((bearing + 720) % 360),
  };
}

export const stationCount = stationCharacters.length;

function characterOf(stationIndex: number) {
  const character = stationCharacters[stationIndex];
  if (!character) throw new RangeError(`station ${stationIndex} is not one of 0 to ${stationCount - 1}`);
  return character;
}

/**
 * The invented weather at one of Skerrow's stations: a smooth function of time, given the moment the
 * demo is anchored to, and nothing else, so that it can be read for any time before or after it.
 * Temperatures to 0.1 °C, precipitation to 0.01 mm of water in the ten minutes that end at `at`.
 */
export function weatherAt(stationIndex: number, at: Date, anchorAt: Date): StationWeather {
  const character = characterOf(stationIndex);
  const [atMs, anchorMs] = [at.getTime(), anchorAt.getTime()];
  const hour = hoursFrom(atMs, anchorMs);
  const { share } = stormShare(hour);
  const frostC = frostDepthC(atMs, anchorMs);
  const openC = openRoadTempC(atMs, anchorMs);
  const pavementC = openC + character.pavementOffsetC + 0.15 * noise(70 + stationIndex, hour / 2.2);
  // In a clear night the road is colder than the air above it; in a storm a little warmer or colder.
  const aboveRoadC = 0.35 + 0.45 * noise(8, hour / 9) + 0.22 * frostC - 0.5 * dayCycle(atMs) * (1 - share);
  const airC = openC + character.airOffsetC + aboveRoadC + 0.1 * noise(80 + stationIndex, hour);
  const openDryC = (1 - share) * (0.9 + 0.8 * noise(9, hour / 15)) * (1 - Math.min(0.75, frostC / 5));
  const dryC = 0.35 + openDryC + 0.1 * noise(90 + stationIndex, hour);
  const mmPerH = fallingMmPerH(stationIndex, atMs, anchorMs);
  const pavementTempC = rounded(pavementC, 1);
  const airTempC = rounded(airC, 1);
  const dewPointC = rounded(Math.min(airC, airC - Math.max(0.1, dryC)), 1);
  const precipitationType = typeOf(hour, mmPerH, pavementC);
  const waterMm = rounded(waterMmAt(stationIndex, atMs, anchorMs), 2);
  const daylight = Math.max(0, dayCycle(atMs) - 0.55) / 0.45;
  return {
    pavementTempC,
    airTempC,
    dewPointC,
    relativeHumidity: rounded(Math.min(1, humidityOf(airTempC, dewPointC)), 3),
    ...windOf(stationIndex, hour),
    precipitationMm: precipitationType === 'none' ? 0 : rounded(mmPerH / 6, 2),
    precipitationType,
    subsurfaceTempC: rounded(0.55 * openRoadTempC(atMs - 9 * hourMs, anchorMs) + 1.6, 1),
    solarWPerM2: Math.round(daylight * (95 - 60 * share)),
    visibilityM: Math.round((18_000 - 15_500 * Math.min(1, share * 0.7 + mmPerH * 0.25)) / 100) * 100,
    waterMm,
    surfaceStatus: statusOf({ pavementTempC, dewPointC, precipitationType, waterMm }),
  };
}

export interface StationReading extends StationWeather {
  stationIndex: number;
  observedAt: Date;
}

/** Every station's readings at the ten-minute marks after `fromAt` up to and including `untilAt`. */
export function readingsBetween(span: { fromAt: Date; untilAt: Date; anchorAt: Date }): StationReading[] {
  const readings: StationReading[] = [];
  const firstMs = (Math.floor(span.fromAt.getTime() / readingStepMs) + 1) * readingStepMs;
  for (let atMs = firstMs; atMs <= span.untilAt.getTime(); atMs += readingStepMs) {
    const observedAt = new Date(atMs);
    for (let stationIndex = 0; stationIndex < stationCount; stationIndex += 1) {
      readings.push({ stationIndex, observedAt, ...weatherAt(stationIndex, observedAt, span.anchorAt) });
    }
  }
  return readings;
}
