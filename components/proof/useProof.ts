import { useMemo } from 'react';
import { assess, type Assessment, type Finding } from '@/hazard';
import type { WorksheetRecord } from '@/shared/record';
import { isoInZone } from '@/shared/siteTime';
import type { Proof } from '@/shared/worksheet';
import type { KeptForm } from '../drafts/useKeptForm';
import { useNow } from '../worksheet/useAssessment';
import { readingPlan, type ReadingPlan } from './plan';
import { latestReading, proofOf, type ProofForm } from './proofForm';

export const PROOF_SECTIONS = [
  'ways',
  'controls',
  'before',
  'readings',
  'clamp',
  'others',
  'stored',
  'after',
  'record',
] as const;
export type ProofSection = (typeof PROOF_SECTIONS)[number];

const SECTION_OF: Readonly<Record<string, ProofSection>> = {
  '/proof/openedSources': 'ways',
  '/proof/controlsOperated': 'controls',
  '/proof/provedBefore': 'before',
  '/proof/neutralAmperes': 'clamp',
  '/proof/otherLiveParts': 'others',
  '/proof/storedEnergy': 'stored',
  '/proof/provedAfter': 'after',
  '/job/pointsOfWork': 'readings',
};

/** Where a finding is shown; what is not of the test itself stands at the record. */
export function proofSectionOf({ path }: Pick<Finding, 'path'>): ProofSection {
  if (path.startsWith('/proof/readings')) return 'readings';
  return SECTION_OF[path] ?? 'record';
}

export const VOLTAGE_PRESENT = 'absence.voltage-present';

export interface ProofState {
  record: WorksheetRecord;
  form: ProofForm;
  change: KeptForm<ProofForm>['change'];
  plan: ReadingPlan;
  proof: Proof;
  assessment: Assessment;
  /** What an empty proof would lack: which questions are asked at all. */
  asked: ReadonlySet<ProofSection>;
  findingsOf: (section: ProofSection) => Finding[];
  /** Stops and open points that are left. */
  left: Finding[];
  hasVoltage: boolean;
  /** The present moment on the site's clock. */
  stamp: () => string;
}

/** The form of a test with what the rules say of it now, as the server will judge it. */
export function useProof(
  record: WorksheetRecord,
  { value: form, change }: Pick<KeptForm<ProofForm>, 'value' | 'change'>,
): ProofState {
  const { content, timeZone } = record;
  const now = useNow();
  const plan = useMemo(() => readingPlan(content), [content]);
  const asked = useMemo(() => {
    const { findings } = assess(content, {
      on: isoInZone(now, timeZone),
      stage: 'work',
      proof: {},
    });
    return new Set(findings.map(proofSectionOf));
  }, [content, now, timeZone]);
  const proof = useMemo(() => proofOf(form, content), [form, content]);
  const assessment = useMemo(() => {
    // The clock here ticks twice a minute; a reading that is younger than its tick is not in the future.
    const read = latestReading(proof);
    const on = read !== undefined && Date.parse(read) > now.getTime() ? new Date(read) : now;
    return assess(content, { on: isoInZone(on, timeZone), stage: 'work', proof });
  }, [content, proof, now, timeZone]);
  return useMemo(() => {
    const left = assessment.findings.filter(({ severity }) => severity !== 'caution');
    return {
      record,
      form,
      change,
      plan,
      proof,
      assessment,
      asked,
      left,
      findingsOf: (section) => left.filter((finding) => proofSectionOf(finding) === section),
      hasVoltage: left.some(({ code }) => code === VOLTAGE_PRESENT),
      stamp: () => isoInZone(new Date(), timeZone),
    };
  }, [record, form, change, plan, proof, assessment, asked, timeZone]);
}
