import type { Attachment, WorksheetRecord } from '@/shared/record';
import type { SectionId } from '@/shared/sections';

/** Where a photo is shown: several parts of the content stand in one section of the screen. */
const SHOWN_IN: Readonly<Record<Attachment['section'], SectionId>> = {
  job: 'job',
  notes: 'job',
  supply: 'supply',
  egress: 'sources',
  egressSupply: 'sources',
  egressReaches: 'sources',
  sources: 'sources',
  decision: 'decision',
  absenceTest: 'absenceTest',
  arcFlash: 'arcFlash',
  protectiveEquipment: 'protectiveEquipment',
  surroundings: 'surroundings',
  crew: 'crew',
  briefing: 'crew',
  closeOut: 'closeOut',
};

const ASKED_IN = ['supply', 'sources', 'arcFlash', 'closeOut'] as const;
export type AskedSection = (typeof ASKED_IN)[number];

/** Where a photo is asked for: the box cover, each opened way, the label, the finished work. */
export function askedSection(section: SectionId): AskedSection | undefined {
  return ASKED_IN.find((asked) => asked === section);
}

export function photosOf({ attachments }: WorksheetRecord, section: SectionId): Attachment[] {
  return attachments.filter((photo) => SHOWN_IN[photo.section] === section);
}

/** Photos of the plan are frozen with its first signature, those of the close-out when it is closed. */
export function mayChangePhotos({ actions }: WorksheetRecord, section: SectionId): boolean {
  return actions.includes(section === 'closeOut' ? 'attach:closeOut' : 'attach');
}
