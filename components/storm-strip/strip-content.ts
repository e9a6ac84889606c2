import { type PrecipitationType } from '@/lib/road/precipitation';

export type { PrecipitationType };

/** Times in ms since 1970; temperatures in °C, amounts in mm of water. */
export interface StripContent {
  readonly fromAt: number;
  readonly untilAt: number;
  readonly nowAt: number;
  readonly measured: readonly { readonly at: number; readonly tempC: number }[];
  readonly forecast: readonly { readonly at: number; readonly tempC: number; readonly errorC: number | null }[];
  readonly precipitation: readonly {
    readonly fromAt: number;
    readonly untilAt: number;
    readonly mm: number;
    readonly type: PrecipitationType;
  }[];
  readonly passes: readonly { readonly number: number; readonly startsAt: number }[];
}

export const precipitationWords: Readonly<Record<PrecipitationType, string>> = {
  none: '',
  snow: 'snow',
  sleet: 'sleet',
  rain: 'rain',
  drizzle: 'drizzle',
  'freezing-rain': 'freezing rain',
  'freezing-drizzle': 'freezing drizzle',
  frost: 'frost',
  unknown: 'precipitation',
};
