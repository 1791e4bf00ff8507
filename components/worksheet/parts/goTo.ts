import { useSetAtom } from 'jotai';
import { useCallback } from 'react';
import type { Finding } from '@/hazard';
import { fieldNameOf, sectionOf, type SectionId } from '@/shared/sections';
import { focusField } from '../../ui';
import { fieldId } from '../form/fieldWords';
import { useWorksheetForm } from '../form/WorksheetFormContext';
import { openSectionsAtom, sectionAnchor } from '../worksheetAtoms';

/** Long enough for an unfolded section to be drawn. */
const DRAWN_MS = 80;

/**
 * The field that clears a finding, or what stands nearest to it: a row of a
 * list is reached by its own name, a missing part of it by the row.
 */
function focusNearest(name: string, section: SectionId): void {
  let at = name;
  while (at !== '') {
    if (focusField(fieldId(at))) return;
    at = at.includes('.') ? at.slice(0, at.lastIndexOf('.')) : '';
  }
  focusField(sectionAnchor(section));
}

/** Unfolds the place of a finding or a section, scrolls to it and gives it the focus. */
export function useGoTo() {
  const { record, content } = useWorksheetForm();
  const setOpen = useSetAtom(openSectionsAtom);
  const goToSection = useCallback(
    (section: SectionId) => {
      setOpen((before) => ({ ...before, [`${record.id}/${section}`]: true }));
      setTimeout(() => focusField(sectionAnchor(section)), DRAWN_MS);
    },
    [record.id, setOpen],
  );
  const goToFinding = useCallback(
    (finding: Pick<Finding, 'code' | 'path'>) => {
      const section = sectionOf(finding);
      const row = /^\/sources\/(\d+)/.exec(finding.path)?.[1];
      const sourceId = row === undefined ? undefined : (content.sources?.[Number(row)]?.id ?? row);
      setOpen((before) => ({
        ...before,
        [`${record.id}/${section}`]: true,
        ...(sourceId !== undefined && { [`${record.id}/source/${sourceId}`]: true }),
      }));
      setTimeout(() => focusNearest(fieldNameOf(finding.path), section), DRAWN_MS);
    },
    [record.id, content.sources, setOpen],
  );
  return { goToSection, goToFinding };
}
