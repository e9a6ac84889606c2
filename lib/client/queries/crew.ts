import { queryOptions } from '@tanstack/react-query';
import { CrewView } from '@/lib/contracts/crew';
import { ask } from '../api';

export const crewQuery = queryOptions({
  queryKey: ['crew'],
  queryFn: ({ signal }) => ask('/api/crew', CrewView, { signal }),
  refetchInterval: 20_000,
});
