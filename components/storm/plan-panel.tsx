'use client';

import { Notice } from '@/components/ui/notice';
import { Section } from '@/components/ui/section';
import { cautionWords } from '@/lib/treatment/cautions';
import { ExceptionsList } from './exceptions-list';
import { GroupsTable } from './groups-table';
import { PlanFigures } from './plan-figures';
import { PlanSources } from './plan-sources';
import { RefusedList } from './refused-list';
import { type PlanVersion } from './storm-content';

export type PlanPanelProps = Readonly<{ plan: PlanVersion; currency: string; zone: string }>;

/** One version of the plan: what it comes to, where limits bite, and what it rests on. */
export function PlanPanel({ plan, currency, zone }: PlanPanelProps) {
  const { summary, inputs } = plan;
  const state = plan.publishedAt === null ? 'a draft: drivers do not see it' : 'published: this is what drivers see';
  return (
    <Section title={`Pass ${plan.passNumber}, version ${plan.version}`} lead={state}>
      {summary && inputs ? (
        <div className="grid gap-7">
          <PlanFigures summary={summary} currency={currency} />
          <GroupsTable groups={summary.groups} currency={currency} />
          {summary.exceptions.length > 0 ? (
            <div>
              <h3 className="mb-2 font-bold">
                Beyond the limits until the next pass: {summary.exceptions.length} roads
              </h3>
              <ExceptionsList exceptions={summary.exceptions} passAt={inputs.passAt} zone={zone} />
            </div>
          ) : null}
          {summary.refused.length > 0 ? (
            <div>
              <h3 className="mb-2 font-bold">Products refused</h3>
              <RefusedList refused={summary.refused} />
            </div>
          ) : null}
          <div>
            <h3 className="mb-2 font-bold">What it rests on</h3>
            <PlanSources inputs={inputs} zone={zone} />
          </div>
        </div>
      ) : (
        <Notice title="This version was kept without its summary." todo="Work the pass out again to see it." />
      )}
      <p className="mt-6 max-w-prose text-sm text-soft">
        {cautionWords.advice} {cautionWords['pavement-not-air']} Rates are per lane, grams of product a square metre as
        it leaves the spreader.
      </p>
    </Section>
  );
}
