import { Figure } from '@/components/ui/figure';
import { type AssessedBrine } from './assess-brine';

export type HowKnownProps = Readonly<{ brine: AssessedBrine | null }>;

/** Error and source of every figure on the bench. */
export function HowKnown({ brine }: HowKnownProps) {
  const error = brine?.error ?? null;
  return (
    <div className="grid gap-2 text-soft">
      <p>
        Freezing point: Pitzer model with the low-temperature parameters of Toner and Catling 2017.{' '}
        {brine === null ? null : error === null ? (
          'This salt was not scored against a published table.'
        ) : (
          <>
            Within <Figure value={error.errorC} quantity="temperatureDifference" size="inline" /> of {error.against}; a
            rate from it within <Figure value={error.rateError} quantity="percent" size="inline" />.
          </>
        )}
      </p>
      <p>
        Density and hydrometer: Laliberté 2009, within 1 kg/m³ for sodium chloride and 3 for the others between 0 and 30
        °C, which is 0.1 to 0.4 % of salt.
      </p>
      <p>A degree of error in the pavement temperature changes a rate by more than all of these.</p>
    </div>
  );
}
