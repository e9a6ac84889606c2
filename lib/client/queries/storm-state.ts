import { queryOptions } from '@tanstack/react-query';
import { PlannedWhyView, StormStateView } from '@/lib/contracts/storm-state';
import { ask } from '../api';

/** A storm's state, asked again every half minute; while nothing changed the browser's own cache answers. */
export const stormStateQuery = (stormId: number) =>
  queryOptions({
    queryKey: ['storm-state', stormId],
    queryFn: ({ signal }) => ask(`/api/storms/${stormId}/state`, StormStateView, { signal }),
    refetchInterval: 30_000,
  });

/** Why a plan says so of one road: a plan's rows never change. */
export const plannedWhyQuery = ({ planId, segmentId }: { planId: number; segmentId: number }) =>
  queryOptions({
    queryKey: ['planned-why', planId, segmentId],
    queryFn: ({ signal }) => ask(`/api/plans/${planId}/why/${segmentId}`, PlannedWhyView, { signal }),
    staleTime: Infinity,
  });
