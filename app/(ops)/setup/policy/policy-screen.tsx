'use client';

import { PolicyForm } from '@/components/setup/policy/policy-form';
import { useAnnounce } from '@/components/ui/announcements';
import { PageBody, PageHeader } from '@/components/ui/page-header';
import { Section } from '@/components/ui/section';
import { Table } from '@/components/ui/table';
import { useSubmission } from '@/components/ui/use-submission';
import { type Policy } from '@/lib/treatment/policy';
import { BackToSetup } from '../back';
import { adoptPolicyAction } from './actions';

export interface PolicyVersion {
  version: number;
  adopted: string;
  by: string | null;
}

export type PolicyScreenProps = Readonly<{ policy: Policy; versions: readonly PolicyVersion[] }>;

export function PolicyScreen({ policy, versions }: PolicyScreenProps) {
  const announce = useAnnounce();
  const submission = useSubmission(adoptPolicyAction, ({ version }) =>
    announce(`Version ${version} is in force. Plans already worked out keep theirs.`),
  );
  const [inForce] = versions;
  return (
    <>
      <PageHeader
        back={<BackToSetup />}
        title="Treatment policy"
        facts={[inForce ? `Version ${inForce.version}, in force since ${inForce.adopted}` : 'None adopted yet']}
      />
      <PageBody className="max-w-5xl gap-10 lg:grid-cols-[minmax(0,1fr)_17rem]">
        <PolicyForm policy={policy} basedOnVersion={inForce?.version ?? 0} submission={submission} />
        <Section title="Versions">
          <Table
            caption="Versions of the policy"
            rows={versions}
            rowKey={({ version }) => version}
            columns={[
              { key: 'version', head: 'No.', isRowHead: true, cell: ({ version }) => version },
              { key: 'adopted', head: 'Adopted', cell: ({ adopted }) => adopted },
              { key: 'by', head: 'By', cell: ({ by }) => by ?? 'first set-up' },
            ]}
          />
          <p className="mt-3 text-sm text-faint">
            A plan names the version it was worked out under, so none is removed.
          </p>
        </Section>
      </PageBody>
    </>
  );
}
