import { queryOptions, useQuery } from '@tanstack/react-query';
import { listSchema } from '@/shared/record';
import { rubberGoodsSchema, siteSchema, type RubberGoods, type Site } from '@/shared/register';
import { personSchema, type Person } from '@/shared/user';
import { request } from '../api/request';

/** The register changes seldom; a worksheet asks again when it is opened. */
const STALE_MS = 60_000;
const ALL = 200;

export const sitesQuery = queryOptions({
  queryKey: ['sites'] as const,
  queryFn: ({ signal }) => request(listSchema(siteSchema), `/sites?limit=${ALL}`, { signal }),
  staleTime: STALE_MS,
});

export const peopleQuery = queryOptions({
  queryKey: ['people'] as const,
  queryFn: ({ signal }) => request(listSchema(personSchema), `/users?limit=${ALL}`, { signal }),
  staleTime: STALE_MS,
});

export const rubberGoodsQuery = queryOptions({
  queryKey: ['rubber-goods'] as const,
  queryFn: ({ signal }) =>
    request(listSchema(rubberGoodsSchema), `/rubber-goods?limit=${ALL}`, { signal }),
  staleTime: STALE_MS,
});

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
