import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { v7 as newId } from 'uuid';
import { questionSchema, type Question, type WorksheetRecord } from '@/shared/record';
import { json, request } from '../../api/request';
import { useMessages } from '../../i18n/useMessages';
import { space } from '../../theme/tokens';
import { useTheme } from '../../theme/useTheme';
import { Button, Icon, Notice, Text, TextField, describeFault } from '../../ui';
import { worksheetKeys } from '../worksheetQueries';

function useAnswer(record: WorksheetRecord, question: Question) {
  const client = useQueryClient();
  const [id] = useState(() => newId());
  return useMutation({
    mutationFn: (text: string) =>
      request(
        questionSchema,
        `/worksheets/${record.id}/questions/${question.id}/answer`,
        json('POST', { id, text }),
      ),
    onSuccess: () => client.invalidateQueries({ queryKey: worksheetKeys.all }),
  });
}

function AnswerForm({ record, question }: { record: WorksheetRecord; question: Question }) {
  const words = useMessages();
  const [text, setText] = useState('');
  const answer = useAnswer(record, question);
  return (
    <View style={styles.form}>
      <TextField
        label={words.worksheet.answerLabel}
        value={text}
        onChangeText={setText}
        multiline
        maxLength={2000}
      />
      {answer.isError && <Notice live>{describeFault(answer.error, words)}</Notice>}
      <Button
        kind="primary"
        label={words.worksheet.answer}
        reason={text.trim() === '' ? words.worksheet.writeAnswerFirst : undefined}
        busy={answer.isPending}
        onPress={() => answer.mutate(text.trim())}
      />
    </View>
  );
}

/** What the crew asked, and what the lead answered. An open question blocks the countersignature. */
export function Questions({ record }: { record: WorksheetRecord }) {
  const words = useMessages().worksheet;
  const { colors } = useTheme();
  if (record.questions.length === 0) return null;
  return (
    <View role="list">
      {record.questions.map((question) => (
        <View
          role="listitem"
          key={question.id}
          style={[styles.question, { borderTopColor: colors.hair }]}
        >
          <Icon name="question" />
          <View style={styles.words}>
            <Text variant="strong">{words.asked(question.askedBy.name, question.text)}</Text>
            {question.answer !== null ? (
              <Text>{words.answered(question.answeredBy?.name ?? '', question.answer)}</Text>
            ) : record.actions.includes('answer') ? (
              <AnswerForm record={record} question={question} />
            ) : (
              <Text color="ink2">{words.notAnsweredYet}</Text>
            )}
          </View>
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  question: { flexDirection: 'row', gap: space.sm, paddingVertical: space.sm, borderTopWidth: 1 },
  words: { flex: 1, minWidth: 0, gap: space.xs },
  form: { gap: space.sm },
});
