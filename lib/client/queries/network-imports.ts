import { queryOptions } from '@tanstack/react-query';
import { NetworkImportView } from '@/lib/contracts/network';
import { ask } from '../api';

/** An import of roads with its report; changes only when somebody maps classes, saves or undoes. */
export const networkImportQuery = (id: number) =>
  queryOptions({
    queryKey: ['network-import', id],
    queryFn: ({ signal }) => ask(`/api/import/network/${id}`, NetworkImportView, { signal }),
    staleTime: Infinity,
    refetchOnWindowFocus: false,
  });
