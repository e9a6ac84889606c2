'use client';

import { Field } from '@/components/ui/field';
import { Figure } from '@/components/ui/figure';
import { NumberInput } from '@/components/ui/number-input';
import { saltToStrengthenKg, waterToDiluteKg } from '@/lib/brine/batch';
import { eutecticOf } from '@/lib/brine/liquidus';
import { type BenchQuery } from '@/lib/contracts/bench';
import { type AssessedBrine } from './assess-brine';

export type TankChangeProps = Readonly<{
  bench: BenchQuery;
  brine: AssessedBrine;
  onChange: (change: Partial<BenchQuery>) => void;
}>;

/** What to stir into the tank to have the strength that is wanted. */
function Advice({ bench, brine }: Omit<TankChangeProps, 'onChange'>) {
  const massKg = (bench.tankL * (brine.densityAt60FKgPerM3 ?? 0)) / 1000;
  if (!(massKg > 0)) return null;
  const change = { massKg, fromMassFraction: brine.massFraction, toMassFraction: bench.wanted };
  if (Math.abs(bench.wanted - brine.massFraction) < 0.0005)
    return <p className="text-soft">The tank is at the strength wanted.</p>;
  if (bench.wanted > brine.massFraction)
    return (
      <p className="text-soft">
        Stir in{' '}
        <strong className="text-ink">
          <Figure value={saltToStrengthenKg(change)} quantity="mass" size="inline" />
        </strong>{' '}
        of dry salt, counted pure: divide by its purity. Dissolving changes the temperature, so read again when it has
        settled.
      </p>
    );
  if (brine.massFraction === 0) return null;
  return (
    <p className="text-soft">
      Add{' '}
      <strong className="text-ink">
        {/* A litre of water is a kilogram here: the difference is under 0.2 %. */}
        <Figure value={waterToDiluteKg(change)} quantity="volume" size="inline" />
      </strong>{' '}
      of water, if the tank has room for it, and read again.
    </p>
  );
}

export function TankChange({ bench, brine, onChange }: TankChangeProps) {
  const isPast = bench.wanted > eutecticOf(brine.salt).massFraction;
  return (
    <div className="grid gap-3">
      <div className="grid grid-cols-2 gap-3">
        <Field label="In the tank">
          <NumberInput
            quantity="volume"
            digits={0}
            defaultValue={bench.tankL > 0 ? bench.tankL : null}
            onValue={(tankL) => onChange({ tankL: tankL ?? 0 })}
          />
        </Field>
        <Field label="Strength wanted">
          <NumberInput
            quantity="percent"
            digits={1}
            defaultValue={bench.wanted}
            onValue={(wanted) => wanted !== null && wanted > 0 && wanted < 0.46 && onChange({ wanted })}
          />
        </Field>
      </div>
      <Advice bench={bench} brine={brine} />
      {isPast ? (
        <p className="text-sm text-soft">
          That is past the eutectic: the salt itself separates in the cold and can block lines and nozzles.
        </p>
      ) : null}
    </div>
  );
}
