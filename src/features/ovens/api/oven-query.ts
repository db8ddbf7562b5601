import { queryOptions } from '@tanstack/react-query';
import { call } from '../../../api/call.ts';
import { getOven } from '../../../../shared/contracts/ovens.ts';

/** An oven's definition and layout: data of the release, the same for as long as the page stands. */
export const ovenQuery = (oven: string) =>
  queryOptions({
    queryKey: ['ovens', oven],
    queryFn: ({ signal }) => call(getOven, { params: { oven }, signal }),
    staleTime: Infinity,
  });
