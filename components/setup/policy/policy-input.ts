import { serviceClasses } from '@/lib/contracts/policy';

type Typed = Readonly<Record<string, FormDataEntryValue>>;

/** The flat fields of the form as the contract wants them. The cycle is typed in hours and kept in minutes. */
export function policyInput(typed: Typed, basedOnVersion: number) {
  const cycle = (text: FormDataEntryValue | undefined) => {
    const hours = String(text ?? '');
    return hours.trim() === '' || Number.isNaN(Number(hours)) ? hours : Math.round(Number(hours) * 60);
  };
  return {
    basedOnVersion,
    rules: {
      marginMin: typed.marginMin,
      maxRateGPerM2: { solid: typed.solid, prewet: typed.prewet, abrasive: typed.abrasive },
      maxLiquidRateMlPerM2: typed.liquid,
      classes: Object.fromEntries(
        serviceClasses.map((name) => [
          name,
          { promise: typed[`promise.${name}`], cycleMin: cycle(typed[`cycle.${name}`]) },
        ]),
      ),
    },
  };
}
