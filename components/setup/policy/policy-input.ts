import { serviceClasses } from '@/lib/treatment/policy';

type Typed = Readonly<Record<string, FormDataEntryValue>>;

const forms = ['liquid', 'prewet', 'solid'] as const;

/** The flat fields of the form (`promises.A`, `scatter.solid`) as the contract wants them. */
export function policyInput(typed: Typed, basedOnVersion: number) {
  const group = (name: string, keys: readonly string[]) =>
    Object.fromEntries(keys.map((key) => [key, typed[`${name}.${key}`]]));
  const single = Object.fromEntries(Object.entries(typed).filter(([name]) => !name.includes('.')));
  return {
    basedOnVersion,
    rules: {
      ...single,
      promises: group('promises', serviceClasses),
      vehiclesPerH: group('vehiclesPerH', serviceClasses),
      maxRateGPerM2: group('maxRateGPerM2', forms),
      minRateGPerM2: group('minRateGPerM2', forms),
      scatter: group('scatter', forms),
    },
  };
}
