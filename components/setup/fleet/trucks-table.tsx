'use client';

import { Button } from '@/components/ui/button';
import { Figure } from '@/components/ui/figure';
import { Table } from '@/components/ui/table';
import { useUnits } from '@/components/ui/units';
import { unitLabel } from '@/lib/units/quantity';
import { type FleetChoice, type ListedSpreader, type ListedTruck } from './listed-fleet';

export type TrucksTableProps = Readonly<{
  trucks: readonly ListedTruck[];
  spreaders: readonly ListedSpreader[];
  onChoose: (choice: FleetChoice) => void;
}>;

interface Row {
  truck: ListedTruck;
  spreader: ListedSpreader | null;
}

/** A row for each spreader, and one for a truck without any. */
function rowsOf(trucks: readonly ListedTruck[], spreaders: readonly ListedSpreader[]): Row[] {
  return trucks.flatMap((truck): Row[] => {
    const own = spreaders.filter((spreader) => spreader.truckId === truck.id);
    return own.length > 0 ? own.map((spreader) => ({ truck, spreader })) : [{ truck, spreader: null }];
  });
}

const lowerFirst = (text: string) => text.charAt(0).toLowerCase() + text.slice(1);

function RateSpan({ spreader }: Readonly<{ spreader: ListedSpreader }>) {
  return (
    <>
      <Figure value={spreader.minRateGPerM2} quantity="rate" digits={0} isUnitHidden />{' '}
      <span className="font-sans">to</span>{' '}
      <Figure value={spreader.maxRateGPerM2} quantity="rate" digits={0} isUnitHidden />
    </>
  );
}

export function TrucksTable({ trucks, spreaders, onChoose }: TrucksTableProps) {
  const system = useUnits();
  return (
    <Table<Row>
      caption="Trucks and their spreaders"
      rows={rowsOf(trucks, spreaders)}
      rowKey={({ truck, spreader }) => `${truck.id} ${spreader?.id ?? 'none'}`}
      rowClassName={({ truck }) => (truck.isActive ? undefined : 'text-soft')}
      columns={[
        {
          key: 'truck',
          head: 'Truck',
          isRowHead: true,
          className: 'min-w-36',
          cell: ({ truck, spreader }) => (
            <>
              Truck {truck.number}
              <span className="block text-sm font-normal text-soft">
                {truck.name}, {spreader ? lowerFirst(spreader.name) : 'no spreader'}
                {truck.isActive ? '' : ', out of use'}
              </span>
            </>
          ),
        },
        { key: 'yard', head: 'Yard', className: 'whitespace-nowrap', cell: ({ truck }) => truck.yardName },
        {
          key: 'plough',
          head: 'Plough',
          isNumber: true,
          cell: ({ truck }) => <Figure value={truck.ploughWidthM} quantity="shortDistance" digits={1} />,
        },
        {
          key: 'hopper',
          head: 'Hopper',
          isNumber: true,
          cell: ({ spreader }) => <Figure value={spreader?.hopperKg} quantity="largeMass" none="" />,
        },
        {
          key: 'tank',
          head: 'Tank',
          isNumber: true,
          cell: ({ spreader }) => <Figure value={spreader?.tankL} quantity="volume" none="" />,
        },
        {
          key: 'rates',
          head: `Rates, ${unitLabel('rate', system)}`,
          isNumber: true,
          cell: ({ spreader }) => (spreader ? <RateSpan spreader={spreader} /> : null),
        },
        {
          key: 'calibrated',
          head: 'Calibrated',
          isNumber: true,
          cell: ({ spreader }) => (spreader ? (spreader.calibratedOn ?? 'never') : null),
        },
        {
          key: 'change',
          head: <span className="sr-only">Change</span>,
          className: 'space-x-3 text-right whitespace-nowrap print:hidden',
          cell: ({ truck, spreader }) => (
            <>
              <Button
                size="row"
                variant="quiet"
                aria-label={`Change truck ${truck.number}`}
                onClick={() => onChoose({ kind: 'truck', id: truck.id })}
              >
                Truck
              </Button>
              <Button
                size="row"
                variant="quiet"
                aria-label={`${spreader ? 'Change' : 'Add'} the spreader of truck ${truck.number}`}
                onClick={() => onChoose({ kind: 'spreader', id: spreader?.id ?? null, truckId: truck.id })}
              >
                {spreader ? 'Spreader' : 'Add spreader'}
              </Button>
            </>
          ),
        },
      ]}
    />
  );
}
