'use client';

import { useQuery, useQueryClient } from '@tanstack/react-query';
import { type Route } from 'next';
import Link from 'next/link';
import { useState } from 'react';
import { AssumedList } from '@/components/setup/roads/assumed-list';
import { ClassMappingTable } from '@/components/setup/roads/class-mapping';
import { type Finding } from '@/components/setup/roads/findings';
import { FindingsList } from '@/components/setup/roads/findings-list';
import { ImportFigures, SavingEffects } from '@/components/setup/roads/import-figures';
import { ImportMap } from '@/components/setup/roads/import-map';
import { changeWords } from '@/components/setup/roads/words';
import { LiveText } from '@/components/ui/announcements';
import { Notice, ProblemNotice } from '@/components/ui/notice';
import { PageHeader } from '@/components/ui/page-header';
import { Section } from '@/components/ui/section';
import { useSubmission } from '@/components/ui/use-submission';
import { networkImportQuery } from '@/lib/client/queries/network-imports';
import { type NetworkImportView } from '@/lib/contracts/network';
import { formatDateTime } from '@/lib/time/format';
import { remapNetworkImportAction } from '../actions';
import { ImportActions } from './import-actions';

export type ImportScreenProps = Readonly<{ id: number; zone: string }>;

function stateSentence(view: NetworkImportView, zone: string): string {
  const when = (at: string | null) => (at ? formatDateTime(new Date(at), zone) : '');
  switch (view.state) {
    case 'applied':
      return `Saved ${when(view.appliedAt)} by ${view.appliedByName ?? 'someone'}`;
    case 'undone':
      return `Undone ${when(view.undoneAt)} by ${view.undoneByName ?? 'someone'}`;
    default:
      return 'A preview: nothing is saved yet';
  }
}

/** A file of roads before and after it is saved: map, what was read, what was assumed, what wants a look. */
export function ImportScreen({ id, zone }: ImportScreenProps) {
  const queryClient = useQueryClient();
  const { data: view, error } = useQuery(networkImportQuery(id));
  const [shown, setShown] = useState<Finding | null>(null);
  const [selectedId, setSelectedId] = useState<number | null>(null);
  const reload = () => queryClient.invalidateQueries({ queryKey: networkImportQuery(id).queryKey });
  if (!view) {
    return error ? (
      <div className="p-8">
        <Notice
          tone="problem"
          title="This import could not be read."
          kept="Nothing was changed."
          todo="Reload the page."
        />
      </div>
    ) : null;
  }
  const show = (finding: Finding) => {
    setSelectedId(null);
    setShown(finding);
  };
  const road = selectedId === null ? undefined : view.roads[selectedId];
  return (
    <div className="flex flex-col lg:h-full lg:min-h-0">
      <PageHeader
        look="bar"
        back={
          <Link href={'/setup/roads' as Route} className="link">
            Roads
          </Link>
        }
        title={<span className="break-all">{view.fileName}</span>}
        facts={[stateSentence(view, zone)]}
        actions={<ImportActions view={view} onChanged={() => void reload()} />}
      />
      <div className="grid min-h-0 flex-1 lg:grid-cols-[minmax(0,1fr)_27rem] xl:grid-cols-[minmax(0,1fr)_31rem]">
        <div className="flex min-h-0 flex-col border-b lg:border-r lg:border-b-0">
          <ImportMap
            view={view}
            shown={shown}
            selectedId={selectedId}
            onSelect={setSelectedId}
            className="h-[46dvh] min-h-72 lg:h-auto lg:flex-1"
          />
          <p className="border-t bg-panel px-4 py-2 text-soft">
            {road
              ? `${road.name}: class ${road.serviceClass}, ${road.lanes} ${road.lanes === 1 ? 'lane' : 'lanes'}, ${changeWords[road.change]}. Line ${road.sourceId || 'without id'}.`
              : 'Choose a road on the map to see what it became.'}
          </p>
          <LiveText>{shown ? `Shown on the map: ${shown.what}` : ''}</LiveText>
        </div>
        <div className="grid content-start gap-8 p-4 md:p-5 lg:overflow-y-auto">
          <ImportFigures view={view} />
          {view.state === 'applied' ? null : (
            <Section title={view.state === 'undone' ? 'What saving again will do' : 'What saving will do'}>
              <SavingEffects view={view} />
            </Section>
          )}
          <Section title="Wants a look">
            <FindingsList report={view.report} shownKey={shown?.key ?? null} onShow={show} />
          </Section>
          <Mapping view={view} onChanged={reload} />
          <Section title="Assumed" lead="Marked on every road until someone sets it.">
            <AssumedList report={view.report} />
          </Section>
        </div>
      </div>
    </div>
  );
}

function Mapping({ view, onChanged }: Readonly<{ view: NetworkImportView; onChanged: () => Promise<void> }>) {
  const remap = useSubmission(remapNetworkImportAction, () => void onChanged());
  const isFixed = view.state === 'applied';
  return (
    <Section
      title="Service classes"
      lead={isFixed ? 'As they were when it was saved.' : 'Change them before saving; the preview follows.'}
    >
      <ClassMappingTable
        report={view.report}
        mapping={view.mapping}
        isFixed={isFixed}
        isBusy={remap.isSending}
        onChange={(mapping) => remap.send({ id: view.id, mapping })}
      />
      <ProblemNotice problem={remap.problem} className="mt-3" />
    </Section>
  );
}
