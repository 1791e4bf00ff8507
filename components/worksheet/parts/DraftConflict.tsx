import { StyleSheet, View } from 'react-native';
import { ApiProblem } from '../../api/ApiProblem';
import type { DraftStatus } from '../../drafts/useDraft';
import { useMessages } from '../../i18n/useMessages';
import { space } from '../../theme/tokens';
import { Button, ErrorSummary, Notice } from '../../ui';
import { faultWord, fieldId, labelOf } from '../form/fieldWords';

interface Props {
  status: DraftStatus;
  /** What is shown was typed at an earlier visit and had not been sent. */
  restored: boolean;
  onSeen: () => void;
  onTakeTheirs: () => void;
  onKeepMine: () => void;
}

function Refused({ error }: { error: unknown }) {
  const words = useMessages();
  const errors = error instanceof ApiProblem ? error.errors : [];
  const faults = errors.map(({ pointer, code }) => {
    const name = pointer.replace(/^#\/content\//, '').replaceAll('/', '.');
    return { id: fieldId(name), message: `${labelOf(words, name)}: ${faultWord(words, code)}` };
  });
  if (faults.length > 0) return <ErrorSummary faults={faults} />;
  return <Notice icon="kept">{words.worksheet.refusedByServer}</Notice>;
}

/** What happened to what was typed, where a person has to choose or to know. */
export function DraftConflict({ status, restored, onSeen, onTakeTheirs, onKeepMine }: Props) {
  const { worksheet: words, common } = useMessages();
  if (status.state === 'conflict') {
    return (
      <Notice
        icon="kept"
        live
        title={words.conflictTitle}
        action={
          <View style={styles.actions}>
            <Button kind="primary" label={words.keepMine} onPress={onKeepMine} />
            <Button label={words.takeTheirs} onPress={onTakeTheirs} />
          </View>
        }
      >
        {words.conflictBody}
      </Notice>
    );
  }
  if (status.state === 'refused') return <Refused error={status.error} />;
  if (!restored) return null;
  return (
    <Notice icon="kept" action={<Button label={common.buttons.done} onPress={onSeen} />}>
      {words.restored}
    </Notice>
  );
}

const styles = StyleSheet.create({ actions: { gap: 10, paddingTop: space.xs } });
