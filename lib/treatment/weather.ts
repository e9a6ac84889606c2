import { type PrecipitationType } from '../road/precipitation';

/**
 * The weather over one road in equal steps. Entry 0 is the moment the series starts; the precipitation of an entry fell
 * in the step that ends there (that of entry 0 is not used).
 */
export interface RoadWeather {
  readonly stepMin: number;
  /** °C of the pavement */
  readonly tempsC: ArrayLike<number>;
  /** mm of water */
  readonly precipitationMm: ArrayLike<number>;
  readonly precipitationTypes: ArrayLike<PrecipitationType>;
}

/** The weather from an index on, as a series of its own. */
export function weatherFrom(weather: RoadWeather, index: number): RoadWeather {
  const { stepMin, tempsC, precipitationMm, precipitationTypes } = weather;
  return {
    stepMin,
    tempsC: Array.from(tempsC).slice(index),
    precipitationMm: Array.from(precipitationMm).slice(index),
    precipitationTypes: Array.from(precipitationTypes).slice(index),
  };
}
