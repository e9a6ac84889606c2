'use client';

import { classNames } from '@/components/ui/class-names';
import { Field } from '@/components/ui/field';
import { Figure } from '@/components/ui/figure';
import { NumberInput } from '@/components/ui/number-input';
import { Table, type Column } from '@/components/ui/table';
import { useUnits } from '@/components/ui/units';
import { LANE_WIDTH_12_FT_M, M_PER_MILE } from '@/lib/units/convert';
import { formatQuantity } from '@/lib/units/format';
import { type BenchQuery } from '@/lib/contracts/bench';
import { tonightRow, type BenchProduct, type TonightRow } from './tonight-row';

export type TonightTableProps = Readonly<{
  products: readonly BenchProduct[];
  roadC: number;
  waterMm: number;
  currency: string;
  onChange: (change: Partial<BenchQuery>) => void;
}>;

const refusals: Readonly<Record<string, string>> = {
  'below-eutectic': 'freezes whatever the rate',
  'product-too-weak': 'freezes itself',
  'above-freezing': 'not needed',
};

/** Gallons per lane-mile stand under their number: beside it they would push the cost off the side. */
function RateCell({ row }: Readonly<{ row: TonightRow }>) {
  const system = useUnits();
  if (!row.result.ok || row.rate === null) {
    const reason = row.result.ok ? '' : refusals[row.result.reason];
    return <span className="font-sans whitespace-normal text-frozen">{reason}</span>;
  }
  const { value, unit } = formatQuantity(row.rate, row.product.isLiquid ? 'liquidRate' : 'rate', system);
  return (
    <>
      {value} <span className={classNames('font-sans text-sm text-soft', system === 'us' && 'block')}>{unit}</span>
    </>
  );
}

function useColumns(currency: string): readonly Column<TonightRow>[] {
  const isUs = useUnits() === 'us';
  const money = new Intl.NumberFormat('en-IE', { style: 'currency', currency });
  const laneM = isUs ? M_PER_MILE : 1000;
  return [
    {
      key: 'name',
      head: 'Material',
      isRowHead: true,
      className: 'font-normal whitespace-normal',
      cell: ({ product, isBelowWorkingRange }) => (
        <>
          {product.name}
          {isBelowWorkingRange && product.practicalMinimumC !== null ? (
            <span className="block text-sm text-urgent">
              colder than its working range,{' '}
              <Figure value={product.practicalMinimumC} quantity="temperature" size="inline" digits={0} />
            </span>
          ) : null}
        </>
      ),
    },
    { key: 'rate', head: 'Rate', isNumber: true, cell: (row) => <RateCell row={row} /> },
    {
      key: 'cost',
      head: isUs ? 'Per lane-mile' : 'Per lane-km',
      isNumber: true,
      cell: ({ costCentsPerLaneM }) =>
        costCentsPerLaneM === null ? (
          <span className="text-faint">—</span>
        ) : (
          money.format((costCentsPerLaneM * laneM) / 100)
        ),
    },
  ];
}

/** The least of each material that keeps a film of water unfrozen at the road's temperature. */
export function TonightTable({ products, roadC, waterMm, currency, onChange }: TonightTableProps) {
  const columns = useColumns(currency);
  const rows = products.map((product) =>
    tonightRow(product, { tempC: roadC, waterMm, laneWidthM: LANE_WIDTH_12_FT_M }),
  );
  return (
    <div className="grid gap-3">
      <div className="grid grid-cols-2 gap-3">
        <Field label="Pavement">
          <NumberInput
            quantity="temperature"
            digits={1}
            defaultValue={roadC}
            onValue={(next) => next !== null && onChange({ roadC: next })}
          />
        </Field>
        <Field label="Water on it">
          <NumberInput
            quantity="depth"
            defaultValue={waterMm}
            onValue={(next) => next !== null && next >= 0.01 && next <= 20 && onChange({ waterMm: next })}
          />
        </Field>
      </div>
      <Table
        caption="Least rate of each material to keep that water unfrozen, and its cost"
        columns={columns}
        rows={rows}
        rowKey={({ product }) => product.key}
      />
      <p className="text-sm text-soft">
        In the end and with nothing lost: no traffic, run-off or melting time. Work out real rates in Roads. Cost is for
        a 12-ft (3.66 m) lane.
      </p>
    </div>
  );
}
