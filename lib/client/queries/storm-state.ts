import { queryOptions } from '@tanstack/react-query';
import { StormStateView } from '@/lib/contracts/storm-state';
import { ask } from '../api';

/** A storm's state, asked again every half minute; while nothing changed the browser's own cache answers. */
export const stormStateQuery = (stormId: number) =>
  queryOptions({
    queryKey: ['storm-state', stormId],
    queryFn: ({ signal }) => ask(`/api/storms/${stormId}/state`, StormStateView, { signal }),
    refetchInterval: 30_000,
  });
