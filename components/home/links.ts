import type { Href } from 'expo-router';

const at = (worksheetId: string, act = ''): Href => `/worksheets/${worksheetId}${act}` as Href;

/** Where a worksheet's acts stand. */
export const links = {
  worksheet: (worksheetId: string) => at(worksheetId),
  proof: (worksheetId: string) => at(worksheetId, '/proof'),
  sign: (worksheetId: string) => at(worksheetId, '/sign/prepared'),
  briefing: (worksheetId: string, signerId: string) => at(worksheetId, `/brief/${signerId}`),
  close: (worksheetId: string) => at(worksheetId, '/close'),
  newWorksheet: '/worksheets/new' as Href,
  archive: '/archive' as Href,
};
