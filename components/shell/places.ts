import type { Href } from 'expo-router';
import type { Role } from '@/shared/user';

export type PlaceKey =
  'home' | 'board' | 'archive' | 'insights' | 'people' | 'sites' | 'rubberGoods';

const HREFS: Readonly<Record<PlaceKey, Href>> = {
  home: '/',
  board: '/board',
  archive: '/archive',
  insights: '/insights',
  people: '/people',
  sites: '/sites',
  rubberGoods: '/rubber-goods',
};

const PLACES: Readonly<Record<Role, readonly PlaceKey[]>> = {
  lead: ['home', 'archive', 'rubberGoods'],
  helper: ['home', 'archive'],
  supervisor: ['home', 'board', 'archive', 'insights', 'rubberGoods'],
  safety: ['board', 'archive', 'insights', 'people', 'sites', 'rubberGoods'],
};

/** Where each role can go, in the order of the header. */
export function placesOf(role: Role): readonly { key: PlaceKey; href: Href }[] {
  return PLACES[role].map((key) => ({ key, href: HREFS[key] }));
}
