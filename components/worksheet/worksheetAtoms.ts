import { atom } from 'jotai';
import type { SectionId } from '@/shared/sections';

/** Which sections stand open, by worksheet and section; absent counts as folded. */
export const openSectionsAtom = atom<Readonly<Record<string, boolean>>>({});

/** Whether the strip is unfolded into the drawing on a phone. */
export const drawingOpenAtom = atom(false);

/** The anchor of a section: what the section list and the verdict bar jump to. */
export function sectionAnchor(section: SectionId): string {
  return `section-${section}`;
}
