import { type Quantity } from '@/lib/units/format';

/** Everything a rate was made from: what went in, how, and what bounded it. */
export interface WhyContent {
  readonly inputs: readonly {
    readonly label: string;
    /** SI with its quantity, or words */
    readonly value: { readonly amount: number; readonly quantity: Quantity } | string;
    /** "station Ridge, pavement probe" */
    readonly source: string;
    /** When it was measured or issued, ms since 1970; null when it has no age. */
    readonly at: number | null;
  }[];
  /** The reckoning in words, one step each. */
  readonly steps: readonly string[];
  readonly limits: readonly string[];
  readonly cautions: readonly string[];
  /** The least rate of every material, or why it is refused. */
  readonly options: readonly {
    readonly materialName: string;
    readonly rateGPerM2: number | null;
    readonly refusal: string | null;
    readonly isChosen: boolean;
  }[];
}
