import { queryOptions } from '@tanstack/react-query';
import { RunView } from '@/lib/contracts/runs';
import { ask } from '../api';

/** A run with its roads; asked again every half minute, since a plan may be published under way. */
export const runQuery = (id: string) =>
  queryOptions({
    queryKey: ['run', id],
    queryFn: ({ signal }) => ask(`/api/runs/${id}`, RunView, { signal }),
    refetchInterval: 30_000,
    networkMode: 'always',
  });
