import type { Finding } from '@/hazard';
import type { Messages } from '@/shared/messages';
import type { MarkState } from '../../ui';

export interface SectionState {
  state: MarkState;
  detail?: string;
  caution?: string;
}

/** What the findings of one section add up to. A caution is never a section's state. */
export function sectionState(findings: readonly Finding[], words: Messages): SectionState {
  const count = (severity: Finding['severity']) =>
    findings.filter((finding) => finding.severity === severity).length;
  const stops = count('stop');
  const opens = count('open');
  const cautions = count('caution');
  const caution = cautions === 0 ? undefined : words.common.counts.cautions(cautions);
  if (stops > 0)
    return { state: 'stop', detail: words.common.counts.verdict(stops, opens), caution };
  if (opens > 0) return { state: 'open', detail: words.common.counts.openPoints(opens), caution };
  return { state: 'complete', caution };
}
