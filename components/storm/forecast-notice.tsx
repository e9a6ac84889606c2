'use client';

import { Notice } from '@/components/ui/notice';
import { formatDayTime, formatUtcOffset, spanInWords } from '@/lib/time/format';
import { type ForecastView } from './storm-content';

export type ForecastNoticeProps = Readonly<{ forecast: ForecastView | null; zone: string; nowAt: number }>;

/** Older than this a forecast is pointed out, min; forecasts come hourly. Common practice, no source. */
const OLD_AFTER_MIN = 180;

/** Which forecast a plan would rest on, and how old it is. */
export function ForecastNotice({ forecast, zone, nowAt }: ForecastNoticeProps) {
  if (!forecast) {
    return (
      <Notice
        tone="caution"
        title="No forecast has come in yet."
        todo="A pass can be worked out once one has. What is not known is not clear."
      />
    );
  }
  const ageMin = Math.max(0, (nowAt - forecast.issuedAt) / 60_000);
  const issued = `Forecast issued ${formatDayTime(forecast.issuedAt, zone)} (${formatUtcOffset(forecast.issuedAt, zone)}), ${spanInWords(ageMin)} old, from ${forecast.source}.`;
  const until = forecast.untilAt === null ? '' : `It reaches to ${formatDayTime(forecast.untilAt, zone)}. `;
  return (
    <Notice
      tone={ageMin > OLD_AFTER_MIN ? 'caution' : 'info'}
      title={issued}
      todo={`${until}It may be wrong near freezing: common errors are 1\u00A0°C at 6\u00A0h and 2\u00A0°C at 24\u00A0h.`}
    />
  );
}
