'use client';

import { type Mapping } from '@/lib/readings/mapping';
import { type Preview } from '@/lib/readings/preview';
import { formatNumber } from '@/lib/units/format';
import { PreviewTable } from './preview-table';

export type SeenProps = Readonly<{ preview: Preview; mapping: Mapping; zone: string; isWhole: boolean }>;

/** What a preview found: how many rows are good, and the first of them as they will be understood. */
export function Seen({ preview, mapping, zone, isWhole }: SeenProps) {
  const { rows, firstBad, goodCount, badCount } = preview;
  if (rows.length === 0) return null;
  return (
    <section aria-label="Preview" className="grid gap-2">
      <p>
        <span className="font-semibold">
          {isWhole ? 'The file has' : 'Its beginning has'} {formatNumber(goodCount, 0)} good rows
          {badCount > 0 ? ` and ${formatNumber(badCount, 0)} bad` : ''}.
        </span>{' '}
        <span className="text-soft">
          {badCount > 0 ? 'Bad rows are kept apart with their reason. ' : ''}The first {rows.length}
          {firstBad ? ' and the first bad one' : ''}, as they will be understood:
        </span>
      </p>
      <PreviewTable rows={firstBad ? [...rows, firstBad] : rows} columns={mapping.columns} zone={zone} />
    </section>
  );
}
