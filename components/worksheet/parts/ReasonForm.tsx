import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { useMessages } from '../../i18n/useMessages';
import { space } from '../../theme/tokens';
import { Button, Notice, TextField, describeFault } from '../../ui';
import { useWorksheetAct } from '../worksheetQueries';

interface Props {
  worksheetId: string;
  act: 'return' | 'void' | 'stop';
  /** What the reason is asked for: "Why do you send it back?" */
  label: string;
  submit: string;
  onDone?: () => void;
  onCancel: () => void;
}

/** An act that needs a reason: the words, then one button that names the act. */
export function ReasonForm({ worksheetId, act, label, submit, onDone, onCancel }: Props) {
  const words = useMessages();
  const [reason, setReason] = useState('');
  const mutation = useWorksheetAct(worksheetId, act);
  return (
    <View style={styles.form}>
      <TextField label={label} value={reason} onChangeText={setReason} multiline maxLength={2000} />
      {mutation.isError && <Notice live>{describeFault(mutation.error, words)}</Notice>}
      <Button
        kind="primary"
        large
        label={submit}
        reason={reason.trim() === '' ? words.worksheet.reasonMissing : undefined}
        busy={mutation.isPending}
        onPress={() => mutation.mutate({ reason: reason.trim() }, { onSuccess: onDone })}
      />
      <Button kind="quiet" label={words.common.buttons.cancel} onPress={onCancel} />
    </View>
  );
}

const styles = StyleSheet.create({ form: { gap: space.sm } });
