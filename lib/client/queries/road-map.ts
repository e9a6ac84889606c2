import { queryOptions } from '@tanstack/react-query';
import { RoadMapView } from '@/lib/contracts/road-map';
import { ask } from '../api';

/** The network: large, and the same for days. The browser's own cache answers when its tag still holds. */
export const roadMapQuery = queryOptions({
  queryKey: ['road-map'],
  queryFn: ({ signal }) => ask('/api/road-map', RoadMapView, { signal }),
  staleTime: 5 * 60_000,
  refetchOnWindowFocus: false,
});
