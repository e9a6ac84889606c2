import { Figure, FigureBlock } from '@/components/ui/figure';
import { Tag, type TagTone } from '@/components/ui/tag';
import { type NetworkImportView, type RoadChange } from '@/lib/contracts/network';
import { formatNumber } from '@/lib/units/format';
import { counted } from './words';

export type ImportFiguresProps = Readonly<{ view: NetworkImportView }>;

/** What the file became. */
export function ImportFigures({ view: { report } }: ImportFiguresProps) {
  return (
    <dl className="flex flex-wrap gap-x-5 gap-y-5 sm:gap-x-8">
      <FigureBlock label="Roads" beside={`from ${counted(report.linesRead, 'line')}`}>
        {formatNumber(report.segments, 0)}
      </FigureBlock>
      <FigureBlock label="Length" beside={`${formatNumber(report.oneWaySegments, 0)} one-way`}>
        <Figure value={report.lengthKm * 1000} quantity="distance" size="large" />
      </FigureBlock>
      <FigureBlock label="Lanes" beside={counted(report.bridges, 'bridge')}>
        <Figure value={report.laneKm * 1000} quantity="laneDistance" size="large" digits={0} />
      </FigureBlock>
    </dl>
  );
}

const effects: readonly { change: RoadChange; tone: TagTone; one: string; many: string; after: string }[] = [
  { change: 'added', tone: 'lamp', one: 'new road', many: 'new roads', after: '' },
  {
    change: 'changed',
    tone: 'closing',
    one: 'changed road',
    many: 'changed roads',
    after: 'there already; they keep what was set by hand',
  },
  { change: 'same', tone: 'plain', one: 'road as it is', many: 'roads as they are', after: '' },
  {
    change: 'retired',
    tone: 'frozen',
    one: 'road taken out of use',
    many: 'roads taken out of use',
    after: 'no longer in the file; never deleted',
  },
];

/** What saving will do to the network; the strokes are those of the map. */
export function SavingEffects({ view: { changes } }: ImportFiguresProps) {
  return (
    <ul className="grid gap-1.5">
      {effects
        .filter(({ change }) => changes[change] > 0)
        .map(({ change, tone, one, many, after }) => (
          <li key={change} className="flex flex-wrap gap-x-3">
            <Tag tone={tone}>
              <span className="font-semibold text-ink">{counted(changes[change], one, many)}</span>
            </Tag>
            {after ? <span className="text-soft">{after}</span> : null}
          </li>
        ))}
    </ul>
  );
}
