import { StyleSheet, View } from 'react-native';
import type { Finding } from '@/hazard';
import { findingWords } from '@/shared/messages';
import { useLocale, useUnits } from '../../i18n/preferences';
import { space } from '../../theme/tokens';
import { CautionPanel, Citation, StateMark, StopPanel, Text } from '../../ui';

/** What the rules say: a stop and a caution as panels, an open point as a line. */
export function FindingPanels({ findings }: { findings: readonly Finding[] }) {
  return (
    <>
      {findings.map((finding) => (
        <FindingPanel
          key={`${finding.code} ${finding.path} ${JSON.stringify(finding.params)}`}
          finding={finding}
        />
      ))}
    </>
  );
}

/** Open because the field itself has no answer, not because of the answer that it has. */
export function isUnanswered({ severity, params }: Finding): boolean {
  return severity === 'open' && params.field !== undefined;
}

function FindingPanel({ finding }: { finding: Finding }) {
  const locale = useLocale();
  const units = useUnits();
  const { title, text } = findingWords(locale, finding, units);
  const citation = <Citation citation={finding.citation} />;
  if (finding.severity === 'stop')
    return <StopPanel title={title} body={text} citation={citation} />;
  if (finding.severity === 'caution') {
    return <CautionPanel title={title} body={text} citation={citation} />;
  }
  // A field not answered yet is marked as such; a line that only repeats its label says nothing.
  if (isUnanswered(finding)) return null;
  return (
    <View role="note" style={styles.open}>
      <StateMark state="open" word={title} />
      {text !== '' && <Text variant="label">{text}</Text>}
      {citation}
    </View>
  );
}

const styles = StyleSheet.create({ open: { gap: 2, paddingLeft: space.sm } });
