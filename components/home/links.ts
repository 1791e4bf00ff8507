import type { Href } from 'expo-router';

/** Where a worksheet's acts stand. */
export const links = {
  worksheet: (id: string): Href => `/worksheets/${id}` as Href,
  proof: (id: string): Href => `/worksheets/${id}/proof` as Href,
  sign: (id: string): Href => `/worksheets/${id}/sign` as Href,
  briefing: (id: string): Href => `/worksheets/${id}/briefing` as Href,
  countersign: (id: string): Href => `/worksheets/${id}/countersign` as Href,
  close: (id: string): Href => `/worksheets/${id}/close` as Href,
  newWorksheet: '/worksheets/new' as Href,
  archive: '/archive' as Href,
  board: '/board' as Href,
};
