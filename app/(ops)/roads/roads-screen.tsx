'use client';

import { useQuery } from '@tanstack/react-query';
import { type Route } from 'next';
import { decodeRoads } from '@/components/roads/decode-roads';
import { type Curves } from '@/components/roads/brine-of';
import { EmptyState } from '@/components/ui/empty-state';
import { LinkButton } from '@/components/ui/link-button';
import { PageBody, PageHeader } from '@/components/ui/page-header';
import { ProblemNotice } from '@/components/ui/notice';
import { Refused } from '@/lib/client/api';
import { roadMapQuery } from '@/lib/client/queries/road-map';
import { type Decision } from '@/lib/permissions';
import RoadsLoading from './loading';
import { RoadsBoard } from './roads-board';
import { type RoadsAddress } from './use-address';

export interface StormName {
  readonly id: number;
  readonly number: number;
  readonly name: string;
}

export type RoadsScreenProps = Readonly<{
  storm: StormName | null;
  /** the storm closed last, when none is under way */
  before: StormName | null;
  zone: string;
  curves: Curves;
  address: RoadsAddress;
  may: Readonly<{ workOut: Decision; publish: Decision; importRoads: boolean; openStorm: boolean }>;
}>;

/** Which road refreezes first, and will a truck be there before it does? */
export function RoadsScreen(props: RoadsScreenProps) {
  const { data, error } = useQuery(roadMapQuery);
  if (!data) {
    return error ? (
      <PageBody className="pt-6">
        <ProblemNotice problem={error instanceof Refused ? error.view : null} />
      </PageBody>
    ) : (
      <RoadsLoading />
    );
  }
  if (data.ids.length === 0) return <NoRoads mayImport={props.may.importRoads} />;
  return <RoadsBoard {...props} network={decodeRoads(data)} />;
}

function NoRoads({ mayImport }: Readonly<{ mayImport: boolean }>) {
  return (
    <>
      <PageHeader title="Roads" />
      <PageBody>
        <EmptyState
          title="There are no roads yet."
          action={
            mayImport ? (
              <LinkButton href={'/setup/roads' as Route} variant="primary">
                Import a network
              </LinkButton>
            ) : null
          }
        >
          Import a network in Set-up → Roads. Everything here begins with it.
        </EmptyState>
      </PageBody>
    </>
  );
}
