import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { v7 as newId } from 'uuid';
import { questionSchema, type WorksheetRecord } from '@/shared/record';
import { json, request } from '../api/request';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { Button, Notice, Text, TextField, describeFault } from '../ui';
import { worksheetKeys } from '../worksheet/worksheetQueries';
import { firstName } from './brief';

interface Props {
  record: WorksheetRecord;
  /** Who asks, where somebody else's device is used: the question is written under their name. */
  askedBy: string | undefined;
  onAsked: () => void;
  onBack: () => void;
}

function useAsk(record: WorksheetRecord) {
  const client = useQueryClient();
  const [id] = useState(() => newId());
  return useMutation({
    mutationFn: (text: string) =>
      request(questionSchema, `/worksheets/${record.id}/questions`, json('POST', { id, text })),
    onSuccess: () => client.invalidateQueries({ queryKey: worksheetKeys.all }),
  });
}

/** One question to the lead; it blocks the countersignature until it is answered. */
export function AskForm({ record, askedBy, onAsked, onBack }: Props) {
  const words = useMessages();
  const said = words.helper;
  const [text, setText] = useState('');
  const ask = useAsk(record);
  if (!record.actions.includes('ask')) {
    return (
      <View style={styles.form}>
        <Notice icon="question">{said.mayNotAsk}</Notice>
        <Button icon="left" label={said.askBack} onPress={onBack} />
      </View>
    );
  }
  const question = text.trim();
  return (
    <View style={styles.form}>
      <Text variant="answer">{said.askBody(firstName(record.leadName))}</Text>
      <TextField
        id="helper-question"
        label={said.askLabel}
        value={text}
        onChangeText={setText}
        multiline
        maxLength={1800}
        autoFocus
      />
      {ask.isError && <Notice live>{describeFault(ask.error, words)}</Notice>}
      <Button
        kind="primary"
        large
        icon="question"
        label={said.askSend}
        reason={question === '' ? said.askEmpty : undefined}
        busy={ask.isPending}
        onPress={() =>
          ask.mutate(askedBy === undefined ? question : said.askedBy(askedBy, question), {
            onSuccess: onAsked,
          })
        }
      />
      <Button kind="quiet" icon="left" label={said.askBack} onPress={onBack} />
    </View>
  );
}

const styles = StyleSheet.create({ form: { gap: space.md } });
