import { Button } from '@/components/ui/button';
import { Figure } from '@/components/ui/figure';
import { Table } from '@/components/ui/table';
import { type FleetChoice, type ListedYard } from './listed-fleet';

export type YardsTableProps = Readonly<{ yards: readonly ListedYard[]; onChoose: (choice: FleetChoice) => void }>;

const degrees = (value: number, positive: string, negative: string) =>
  `${Math.abs(value).toFixed(4)}° ${value < 0 ? negative : positive}`;

export function YardsTable({ yards, onChoose }: YardsTableProps) {
  return (
    <Table
      caption="Yards and what they hold"
      rows={yards}
      rowKey={(yard) => yard.id}
      rowClassName={(yard) => (yard.isActive ? undefined : 'text-soft')}
      columns={[
        {
          key: 'name',
          head: 'Yard',
          isRowHead: true,
          cell: (yard) => (yard.isActive ? yard.name : `${yard.name}, out of use`),
        },
        {
          key: 'solid',
          head: 'Holds salt',
          isNumber: true,
          cell: (yard) => <Figure value={yard.solidCapacityKg} quantity="largeMass" digits={0} />,
        },
        {
          key: 'brine',
          head: 'Holds brine',
          isNumber: true,
          cell: (yard) => <Figure value={yard.brineCapacityL} quantity="volume" />,
        },
        {
          key: 'place',
          head: 'Where',
          isNumber: true,
          cell: (yard) => `${degrees(yard.latitudeDeg, 'N', 'S')}, ${degrees(yard.longitudeDeg, 'E', 'W')}`,
        },
        {
          key: 'change',
          head: <span className="sr-only">Change</span>,
          className: 'text-right print:hidden',
          cell: (yard) => (
            <Button
              size="row"
              variant="quiet"
              aria-label={`Change ${yard.name}`}
              onClick={() => onChoose({ kind: 'yard', id: yard.id })}
            >
              Change
            </Button>
          ),
        },
      ]}
    />
  );
}
