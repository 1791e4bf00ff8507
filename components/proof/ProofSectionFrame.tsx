import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { Section, type MarkState } from '../ui';
import { FindingPanels } from '../worksheet/parts/FindingPanels';
import { PROOF_SECTIONS, type ProofSection, type ProofState } from './useProof';

export const proofAnchor = (section: ProofSection) => `proof-${section}`;

/** Not answered is marked by the section itself; a panel says only what an answer broke. */
const isAnswered = (params: Readonly<Record<string, unknown>>) => params['field'] === undefined;

interface Props {
  state: ProofState;
  section: ProofSection;
  title: string;
  /** Instead of what the findings say. */
  mark?: MarkState;
  word?: string;
  detail?: string;
  open: boolean;
  onToggle: (section: ProofSection) => void;
  children: ReactNode;
}

/**
 * One numbered part of the test, with its state and what the rules refuse in
 * it. The readings show their own stops, directly below the matrix.
 */
export function ProofSectionFrame(props: Props) {
  const { state, section, title, mark, word, detail, open, onToggle, children } = props;
  const words = useMessages();
  const findings = state.findingsOf(section);
  const stops = findings.filter(({ severity }) => severity === 'stop');
  const own: MarkState = stops.length > 0 ? 'stop' : findings.length > 0 ? 'open' : 'complete';
  const shown = stops.length > 0 ? own : (mark ?? own);
  const panels = findings.filter(
    ({ severity, params }) =>
      section !== 'readings' &&
      (severity === 'stop' || (section !== 'record' && isAnswered(params))),
  );
  return (
    <Section
      id={proofAnchor(section)}
      number={PROOF_SECTIONS.indexOf(section) + 1}
      title={title}
      state={shown}
      stateWord={word ?? words.ui.state[shown]}
      detail={detail}
      open={open}
      onToggle={() => onToggle(section)}
    >
      <View style={styles.body}>
        {children}
        <FindingPanels findings={panels} />
      </View>
    </Section>
  );
}

const styles = StyleSheet.create({ body: { gap: space.md } });
