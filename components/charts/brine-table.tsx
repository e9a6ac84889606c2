'use client';

import { Figure } from '@/components/ui/figure';
import { formatDayTime } from '@/lib/time/format';
import { strengthAt, type BrineContent } from './brine-content';

/** The chart in figures, for screen readers. */
export function BrineTable({ content, zone }: Readonly<{ content: BrineContent; zone: string }>) {
  const states = [...content.past, ...(content.now ? [content.now] : []), ...content.future];
  return (
    <div className="sr-only">
      <table>
        <caption>Brine on this road against the freezing curve of {content.saltName}</caption>
        <thead>
          <tr>
            <th scope="col">Time</th>
            <th scope="col">Pavement</th>
            <th scope="col">Salt in the water on the road</th>
            <th scope="col">Salt at which it freezes</th>
          </tr>
        </thead>
        <tbody>
          {states.map((state) => (
            <tr key={state.at}>
              <th scope="row">{formatDayTime(state.at, zone)}</th>
              <td>
                <Figure value={state.tempC} quantity="temperature" />
              </td>
              <td>
                <Figure value={state.massFraction} quantity="percent" />
              </td>
              <td>
                <Figure value={strengthAt(content.iceBranch, state.tempC)} quantity="percent" none="no limit here" />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
