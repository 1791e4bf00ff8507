import { createContext, useContext, useMemo, type ReactNode } from 'react';
import type { Assessment, Finding } from '@/hazard';
import { fieldNameOf } from '@/shared/sections';
import type { WorksheetRecord } from '@/shared/record';
import type { Site } from '@/shared/register';
import type { WorksheetContent } from '@/shared/worksheet';
import type { FieldFault } from './rawContent';

/** What every section of the worksheet reads; made once for the whole form. */
export interface WorksheetFormState {
  record: WorksheetRecord;
  site: Site | undefined;
  content: WorksheetContent;
  assessment: Assessment;
  faults: FieldFault[];
  editable: boolean;
  /** Findings about a field itself, by the form's dotted name. */
  findingsOf: (name: string) => Finding[];
  faultOf: (name: string) => FieldFault | undefined;
}

const WorksheetFormContext = createContext<WorksheetFormState | undefined>(undefined);

interface Props extends Omit<WorksheetFormState, 'findingsOf' | 'faultOf'> {
  children: ReactNode;
}

export function WorksheetFormProvider({ children, ...given }: Props) {
  const { record, site, content, assessment, faults, editable } = given;
  const state = useMemo(() => {
    const byName = new Map<string, Finding[]>();
    for (const finding of assessment.findings) {
      const name = fieldNameOf(finding.path);
      byName.set(name, [...(byName.get(name) ?? []), finding]);
    }
    const faultByName = new Map(faults.map((fault) => [fault.name, fault]));
    return {
      record,
      site,
      content,
      assessment,
      faults,
      editable,
      findingsOf: (name: string) => byName.get(name) ?? [],
      faultOf: (name: string) => faultByName.get(name),
    };
  }, [record, site, content, assessment, faults, editable]);
  return <WorksheetFormContext value={state}>{children}</WorksheetFormContext>;
}

export function useWorksheetForm(): WorksheetFormState {
  const state = useContext(WorksheetFormContext);
  if (state === undefined) throw new Error('A section of the worksheet stands outside its form.');
  return state;
}
