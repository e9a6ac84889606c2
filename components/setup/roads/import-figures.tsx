import { Figure, FigureBlock } from '@/components/ui/figure';
import { Tag, type TagTone } from '@/components/ui/tag';
import { type NetworkImportView, type RoadChange } from '@/lib/contracts/network';
import { formatNumber } from '@/lib/units/format';
import { counted } from './words';

export type ImportFiguresProps = Readonly<{ view: NetworkImportView }>;

/** What the file became. */
export function ImportFigures({ view: { report } }: ImportFiguresProps) {
  return (
    <dl className="grid grid-cols-3 gap-x-4 gap-y-5">
      <FigureBlock label="Roads" beside={`from ${counted(report.linesRead, 'line')}`}>
        {formatNumber(report.segments, 0)}
      </FigureBlock>
      <FigureBlock label="Length" beside={`${formatNumber(report.oneWaySegments, 0)} one-way`}>
        <Figure value={report.lengthKm * 1000} quantity="distance" size="inline" />
      </FigureBlock>
      <FigureBlock label="Lanes" beside={counted(report.bridges, 'bridge')}>
        <Figure value={report.laneKm * 1000} quantity="laneDistance" size="inline" digits={0} />
      </FigureBlock>
    </dl>
  );
}

const effects: readonly { change: RoadChange; tone: TagTone; does: string }[] = [
  { change: 'added', tone: 'lamp', does: 'are new' },
  { change: 'changed', tone: 'closing', does: 'are there already and change' },
  { change: 'same', tone: 'plain', does: 'are there already as they are' },
  { change: 'retired', tone: 'frozen', does: 'are not in this file any more: taken out of use, never deleted' },
];

/** What saving will do to the network; the strokes are those of the map. */
export function SavingEffects({ view: { changes } }: ImportFiguresProps) {
  return (
    <ul className="grid gap-1">
      {effects
        .filter(({ change }) => changes[change] > 0)
        .map(({ change, tone, does }) => (
          <li key={change}>
            <Tag tone={tone} className="items-start whitespace-normal [&>span]:mt-2.5 [&>span]:shrink-0">
              <span className="text-ink">
                <strong className="font-mono font-semibold">{formatNumber(changes[change], 0)}</strong> {does}
              </span>
            </Tag>
          </li>
        ))}
    </ul>
  );
}
