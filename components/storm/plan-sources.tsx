'use client';

import { type PlanInputs } from '@/lib/contracts/plans';
import { formatDayTime, spanInWords } from '@/lib/time/format';

export type PlanSourcesProps = Readonly<{ inputs: PlanInputs; zone: string }>;

const statusWords = { current: '', stale: ', stale', missing: ', too old to rely on' } as const;

/** What a plan rests on, as it was known then. */
export function PlanSources({ inputs, zone }: PlanSourcesProps) {
  const { forecast, stations, treatmentsLogged, treatmentsPlanned } = inputs;
  return (
    <dl className="grid gap-x-6 gap-y-1.5 text-sm sm:grid-cols-[auto_minmax(0,1fr)]">
      <dt className="text-soft">Has to hold</dt>
      <dd>
        {formatDayTime(inputs.passAt, zone)} to {formatDayTime(inputs.nextPassAt, zone)}
        {inputs.hasNextPass ? ', when the next pass leaves' : ', the end of the storm: no next pass is set'}
      </dd>
      <dt className="text-soft">Forecast</dt>
      <dd>
        {forecast.source}, issued {formatDayTime(forecast.issuedAt, zone)}
      </dd>
      <dt className="text-soft">Readings</dt>
      <dd>
        {stations.length === 0
          ? 'no station: the forecast alone'
          : stations
              .map(
                ({ name, ageMin, status }) =>
                  `${name} ${ageMin === null ? 'no reading' : `${spanInWords(ageMin)} old`}${ageMin === null ? '' : statusWords[status]}`,
              )
              .join('; ')}
      </dd>
      <dt className="text-soft">Salt on the road</dt>
      <dd>
        {treatmentsLogged} logged and {treatmentsPlanned} still planned treatments counted: an estimate, not a
        measurement
      </dd>
      <dt className="text-soft">Policy</dt>
      <dd>version {inputs.policyVersion}</dd>
    </dl>
  );
}
