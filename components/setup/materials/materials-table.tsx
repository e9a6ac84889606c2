'use client';

import { Button } from '@/components/ui/button';
import { Figure } from '@/components/ui/figure';
import { Table } from '@/components/ui/table';
import { useUnits } from '@/components/ui/units';
import { formatMoney, pricePerMass, priceMass } from '@/lib/units/money';
import { unitLabel } from '@/lib/units/quantity';
import { compositionWords, formNames, type ListedMaterial } from './listed-material';

export type MaterialsTableProps = Readonly<{
  materials: readonly ListedMaterial[];
  currency: string;
  onChange: (id: number) => void;
}>;

export function MaterialsTable({ materials, currency, onChange }: MaterialsTableProps) {
  const system = useUnits();
  const priceOf = (material: ListedMaterial) =>
    formatMoney(Math.round(pricePerMass(material.costCentsPerTonne, system) * 100), currency);
  return (
    <Table
      caption="Materials"
      rows={materials}
      rowKey={(material) => material.id}
      rowClassName={(material) => (material.isActive ? undefined : 'text-soft')}
      columns={[
        {
          key: 'name',
          head: 'Material',
          isRowHead: true,
          className: 'min-w-44',
          cell: (material) => (
            <>
              {material.name}
              <span className="block text-sm font-normal text-soft">
                {formNames[material.form]}
                {material.isActive ? '' : ', out of use'}
              </span>
            </>
          ),
        },
        {
          key: 'composition',
          head: 'Made of',
          className: 'min-w-36',
          cell: (material) => compositionWords(material.composition),
        },
        {
          key: 'water',
          head: 'Water',
          isNumber: true,
          cell: (material) => <Figure value={material.waterMassFraction} quantity="percent" />,
        },
        {
          key: 'density',
          head: `Density, ${unitLabel('density', system)}`,
          isNumber: true,
          cell: (material) => <Figure value={material.densityKgPerM3} quantity="density" isUnitHidden />,
        },
        {
          key: 'freezes',
          head: 'Freezes at',
          isNumber: true,
          cell: (material) => <Figure value={material.freezesAtC} quantity="temperature" none="" />,
        },
        {
          key: 'minimum',
          head: 'Works down to',
          isNumber: true,
          cell: (material) => (
            <Figure
              value={material.practicalMinimumC}
              quantity="temperature"
              digits={0}
              none={material.form === 'abrasive' ? 'any' : 'not set'}
            />
          ),
        },
        { key: 'cost', head: `Cost per ${priceMass[system]}`, isNumber: true, cell: priceOf },
        {
          key: 'change',
          head: <span className="sr-only">Change</span>,
          className: 'text-right print:hidden',
          cell: (material) => (
            <Button
              size="row"
              variant="quiet"
              aria-label={`Change ${material.name}`}
              onClick={() => onChange(material.id)}
            >
              Change
            </Button>
          ),
        },
      ]}
    />
  );
}
