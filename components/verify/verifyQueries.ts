import { queryOptions } from '@tanstack/react-query';
import { verifySchema } from '@/shared/record';
import { request } from '../api/request';
import type { Paper } from './papers';

/** Asked anew whenever it is opened: a paper may be superseded since. */
export function verifyQuery({ number, hash }: Paper) {
  return queryOptions({
    queryKey: ['verify', number, hash] as const,
    queryFn: ({ signal }) =>
      request(verifySchema, `/verify/${encodeURIComponent(number)}/${encodeURIComponent(hash)}`, {
        signal,
      }),
    staleTime: 0,
    gcTime: 0,
    retry: false,
  });
}
