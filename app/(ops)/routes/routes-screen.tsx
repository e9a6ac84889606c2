'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { RouteEditor, type EditedRoute, type RoadOption } from '@/components/routes/route-editor';
import { RouteRoads } from '@/components/routes/route-roads';
import { RoutesTable, type RouteRow } from '@/components/routes/routes-table';
import { useAnnounce } from '@/components/ui/announcements';
import { Button } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { Figure } from '@/components/ui/figure';
import { Notice } from '@/components/ui/notice';
import { PageBody, PageHeader } from '@/components/ui/page-header';
import { Section } from '@/components/ui/section';
import { useSubmission } from '@/components/ui/use-submission';
import { retireRoute, saveRoute } from './actions';

interface Choice {
  id: number;
  name: string;
}

export type RoutesScreenProps = Readonly<{
  attribution: string;
  routes: readonly RouteRow[];
  uncovered: { roads: number; laneKm: number };
  roads: readonly RoadOption[];
  trucks: readonly Choice[];
  yards: readonly Choice[];
  editRefusal: string | null;
}>;

const newRoute: EditedRoute = { id: null, name: '', yardId: 0, truckId: null, segmentIds: [] };

export function RoutesScreen({ routes, uncovered, roads, trucks, yards, editRefusal }: RoutesScreenProps) {
  const router = useRouter();
  const announce = useAnnounce();
  const [chosenId, setChosenId] = useState<number | null>(routes[0]?.id ?? null);
  const [edited, setEdited] = useState<EditedRoute | null>(null);
  const finish = (words: string) => {
    setEdited(null);
    announce(words);
    router.refresh();
  };
  const saving = useSubmission(saveRoute, () => finish('Route saved.'));
  const retiring = useSubmission(retireRoute, () => finish('Route taken out of use.'));
  const chosen = routes.find((route) => route.id === chosenId);
  const byId = new Map(roads.map((road) => [road.id, road]));
  const reason =
    editRefusal ??
    (roads.length === 0 ? 'There are no roads yet.' : yards.length === 0 ? 'There is no yard yet.' : null);
  const firstYard = yards[0]?.id ?? 0;

  return (
    <>
      <PageHeader
        title="Standing routes"
        facts={[`${routes.length} routes`]}
        actions={
          <Button
            variant="primary"
            disabledReason={reason}
            onClick={() => setEdited({ ...newRoute, yardId: firstYard })}
          >
            New route
          </Button>
        }
      />
      <PageBody>
        {uncovered.roads > 0 ? (
          <Notice
            tone="caution"
            title={
              <>
                {uncovered.roads} roads,{' '}
                <Figure value={uncovered.laneKm * 1000} quantity="laneDistance" size="inline" />, are on no route.
              </>
            }
            todo="A driver can still take them as a list of roads."
          />
        ) : null}
        {routes.length === 0 ? (
          <EmptyState title="There is no standing route yet.">
            A route is a list of roads in the order they are treated. Drivers take one, or a list of roads of their own.
          </EmptyState>
        ) : (
          <div className="grid items-start gap-x-10 gap-y-8 xl:grid-cols-[minmax(0,1fr)_minmax(20rem,28rem)]">
            <Section title="Routes">
              <RoutesTable routes={routes} chosenId={chosenId} onChoose={setChosenId} />
            </Section>
            {chosen ? (
              <Section
                title={chosen.name}
                actions={
                  <Button
                    size="small"
                    disabledReason={editRefusal}
                    onClick={() => setEdited({ ...chosen, segmentIds: [...chosen.segmentIds] })}
                  >
                    Change
                  </Button>
                }
              >
                <RouteRoads roads={chosen.segmentIds.flatMap((id) => byId.get(id) ?? [])} />
              </Section>
            ) : null}
          </div>
        )}
      </PageBody>
      {edited ? (
        <RouteEditor
          route={edited}
          roads={roads}
          trucks={trucks}
          yards={yards}
          problem={saving.problem ?? retiring.problem}
          isSending={saving.isSending || retiring.isSending}
          onClose={() => setEdited(null)}
          onSave={saving.send}
          onRetire={(id) => retiring.send({ id })}
        />
      ) : null}
    </>
  );
}
