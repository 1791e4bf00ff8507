import { queryOptions, useQuery } from '@tanstack/react-query';
import type { z } from 'zod';
import { listSchema } from '@/shared/record';
import { rubberGoodsSchema, siteSchema, type RubberGoods, type Site } from '@/shared/register';
import { personSchema, type Person } from '@/shared/user';
import { request } from '../api/request';

/** The register changes seldom; a worksheet asks again when it is opened. */
const STALE_MS = 60_000;
const PAGE = 200;

/** Every page of a list: a company has some hundred of each, and a person must be found on any. */
async function readAll<T extends z.ZodType>(item: T, path: string, signal: AbortSignal) {
  const page = listSchema(item);
  const items: z.output<T>[] = [];
  let cursor: string | null = null;
  do {
    const from: string = cursor === null ? '' : `&cursor=${encodeURIComponent(cursor)}`;
    const answer: z.output<typeof page> = await request(page, `${path}?limit=${PAGE}${from}`, {
      signal,
    });
    items.push(...answer.items);
    cursor = answer.nextCursor;
  } while (cursor !== null);
  return { items, nextCursor: null };
}

export const sitesQuery = queryOptions({
  queryKey: ['sites'] as const,
  queryFn: ({ signal }) => readAll(siteSchema, '/sites', signal),
  staleTime: STALE_MS,
});

export const peopleQuery = queryOptions({
  queryKey: ['people'] as const,
  queryFn: ({ signal }) => readAll(personSchema, '/users', signal),
  staleTime: STALE_MS,
});

export const rubberGoodsQuery = queryOptions({
  queryKey: ['rubber-goods'] as const,
  queryFn: ({ signal }) => readAll(rubberGoodsSchema, '/rubber-goods', signal),
  staleTime: STALE_MS,
});

/** For the lists themselves: who opens one sees it as it stands now. */
export const FRESH = { refetchOnMount: 'always' } as const;

const NO_SITES: Site[] = [];
const NO_PEOPLE: Person[] = [];
const NO_GOODS: RubberGoods[] = [];

/** Sites of the signed-in person; none until they have arrived. */
export function useSites(): Site[] {
  return useQuery(sitesQuery).data?.items ?? NO_SITES;
}

export function usePeople(): Person[] {
  return useQuery(peopleQuery).data?.items ?? NO_PEOPLE;
}

export function useRubberGoods(): RubberGoods[] {
  return useQuery(rubberGoodsQuery).data?.items ?? NO_GOODS;
}
