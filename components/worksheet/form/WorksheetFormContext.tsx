import {
  createContext,
  useContext,
  useLayoutEffect,
  useMemo,
  useState,
  useSyncExternalStore,
  type ReactNode,
} from 'react';
import type { Assessment, Finding } from '@/hazard';
import type { WorksheetRecord } from '@/shared/record';
import type { Site } from '@/shared/register';
import type { WorksheetContent } from '@/shared/worksheet';
import { FieldStore } from './fieldStore';
import type { FieldFault } from './rawContent';

/** What every section of the worksheet reads; made once for the whole form. */
export interface WorksheetFormState {
  record: WorksheetRecord;
  site: Site | undefined;
  content: WorksheetContent;
  assessment: Assessment;
  faults: FieldFault[];
  editable: boolean;
}

const WorksheetFormContext = createContext<WorksheetFormState | undefined>(undefined);
const FieldStoreContext = createContext<FieldStore | undefined>(undefined);

interface Props extends WorksheetFormState {
  children: ReactNode;
}

export function WorksheetFormProvider({ children, ...given }: Props) {
  const { record, site, content, assessment, faults, editable } = given;
  const state = useMemo(
    () => ({ record, site, content, assessment, faults, editable }),
    [record, site, content, assessment, faults, editable],
  );
  const [store] = useState(() => {
    const made = new FieldStore();
    made.update(assessment.findings, faults);
    return made;
  });
  useLayoutEffect(() => store.update(assessment.findings, faults), [store, assessment, faults]);
  return (
    <FieldStoreContext value={store}>
      <WorksheetFormContext value={state}>{children}</WorksheetFormContext>
    </FieldStoreContext>
  );
}

export function useWorksheetForm(): WorksheetFormState {
  const state = useContext(WorksheetFormContext);
  if (state === undefined) throw new Error('A section of the worksheet stands outside its form.');
  return state;
}

export interface FieldState {
  /** What the rules say about this very field. */
  findings: readonly Finding[];
  fault: FieldFault | undefined;
  /** Some finding about it is open: it still has to be answered. */
  isOpen: boolean;
  /** A rule refuses its answer. */
  isStopped: boolean;
}

/** The findings and the fault of one field; nothing else of the worksheet is listened to. */
export function useFieldState(name: string): FieldState {
  const store = useContext(FieldStoreContext);
  if (store === undefined) throw new Error('A field of the worksheet stands outside its form.');
  const findings = useSyncExternalStore(store.subscribe, () => store.findingsOf(name));
  const fault = useSyncExternalStore(store.subscribe, () => store.faultOf(name));
  return {
    findings,
    fault,
    isOpen: findings.some(({ severity }) => severity === 'open'),
    isStopped: findings.some(({ severity }) => severity === 'stop'),
  };
}
