import { type Route } from 'next';
import { classNames } from '@/components/ui/class-names';
import { EmptyState } from '@/components/ui/empty-state';
import { LinkButton } from '@/components/ui/link-button';
import { type RoadsScreenProps } from './roads-screen';

type NoStormProps = Pick<RoadsScreenProps, 'before' | 'may'> & Readonly<{ isLoading: boolean; className?: string }>;

/** What stands beside the map while there is nothing to work out. */
export function NoStorm({ before, may, isLoading, className }: NoStormProps) {
  return (
    <section aria-label="Storm" className={classNames('bg-panel px-5 py-2 md:border-l', className)}>
      {isLoading ? (
        <p role="status" className="py-8 text-soft">
          Working out every road
        </p>
      ) : (
        <EmptyState
          title="No storm is open."
          action={
            <>
              {may.openStorm ? (
                <LinkButton href={'/storm' as Route} variant="primary">
                  Open a storm
                </LinkButton>
              ) : null}
              {before ? (
                <LinkButton href={`/roads?storm=${before.id}` as Route}>
                  Look back at storm {String(before.number).padStart(2, '0')}
                </LinkButton>
              ) : null}
            </>
          }
        >
          Roads are worked out while a storm is under way. A dispatcher opens one in Storm.
        </EmptyState>
      )}
    </section>
  );
}
