import type { Finding } from '@/hazard/types';

/** The twelve sections of the worksheet, in the order of the screen and of the printed record. */
export const SECTIONS = [
  'job',
  'supply',
  'sources',
  'decision',
  'absenceTest',
  'boundaries',
  'arcFlash',
  'protectiveEquipment',
  'surroundings',
  'crew',
  'signatures',
  'closeOut',
] as const;
export type SectionId = (typeof SECTIONS)[number];

const SECTION_OF_KEY: Record<string, SectionId> = {
  job: 'job',
  supply: 'supply',
  egressSupply: 'sources',
  egressReaches: 'sources',
  egress: 'sources',
  sources: 'sources',
  decision: 'decision',
  absenceTest: 'absenceTest',
  proof: 'absenceTest',
  arcFlash: 'arcFlash',
  protectiveEquipment: 'protectiveEquipment',
  surroundings: 'surroundings',
  crew: 'crew',
  briefing: 'crew',
  notes: 'job',
  closeOut: 'closeOut',
};

/** The number that people read in front of a section, from 1. */
export function sectionNumber(section: SectionId): number {
  return SECTIONS.indexOf(section) + 1;
}

/** Where a finding is shown: by what it points at; gloves belong with the protective equipment. */
export function sectionOf(finding: Pick<Finding, 'code' | 'path'>): SectionId {
  if (finding.code.startsWith('shock.gloves')) return 'protectiveEquipment';
  const key = finding.path.split('/')[1] ?? '';
  return SECTION_OF_KEY[key] ?? 'job';
}

/**
 * How a person names the place of a finding: the section, and for a row of
 * section 3 the row ("3.3").
 */
export function placeOf(finding: Pick<Finding, 'code' | 'path'>): string {
  const section = sectionOf(finding);
  const row = /^\/sources\/(\d+)/.exec(finding.path)?.[1];
  const number = sectionNumber(section);
  return row === undefined ? String(number) : `${number}.${Number(row) + 1}`;
}

/** The form's dotted name of what a finding points at: `/sources/2/openedAt` is `sources.2.openedAt`. */
export function fieldNameOf(path: string): string {
  return path.slice(1).replaceAll('/', '.');
}
