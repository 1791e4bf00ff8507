import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { z } from 'zod';
import { PEOPLE_COLUMNS, RUBBER_GOODS_COLUMNS } from '@/shared/registerCsv';
import { useUser } from '../api/session';
import { useKeptForm } from '../drafts/useKeptForm';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { Button, describeFault, ErrorSummary, Facts, Notice, Screen, Text, TextField } from '../ui';
import { files } from './files';
import { columnName, ImportAnswerView } from './ImportAnswerView';
import { useImport } from './registerMutations';
import type { RegisterViewControl } from './useRegisterView';

const keptSchema = z.object({ csv: z.string() });
const MOST = 500_000;

type ImportSubject = 'people' | 'goods';

const COLUMNS = { people: PEOPLE_COLUMNS, goods: RUBBER_GOODS_COLUMNS } as const;
const NAMES = { people: 'people', goods: 'rubber-goods' } as const;

/** What each column holds, for whoever makes the file. */
function Columns({ subject }: { subject: ImportSubject }) {
  const { csv } = useMessages().register;
  return (
    <View>
      <Text variant="strong">{csv.columns}</Text>
      <Facts
        facts={COLUMNS[subject].map((column) => ({
          label: columnName(column),
          value: csv.column[column],
        }))}
      />
    </View>
  );
}

interface LinesProps {
  subject: ImportSubject;
  csv: string;
  onChange: (csv: string) => void;
  onCheck: (csv: string) => void;
  checking: boolean;
}

function Lines({ subject, csv, onChange, onCheck, checking }: LinesProps) {
  const words = useMessages().register.csv;
  const [fault, setFault] = useState<string>();
  const error = csv.length > MOST ? words.tooLarge : fault;
  async function handlePick() {
    const picked = await files.pickText('.csv,.txt,.tsv,text/csv,text/plain');
    if (picked === null) return;
    if ('fault' in picked) {
      setFault(picked.fault === 'large' ? words.tooLarge : words.notText);
      return;
    }
    setFault(undefined);
    onChange(picked.text);
    if (picked.text.length <= MOST) onCheck(picked.text);
  }
  return (
    <View style={styles.lines}>
      {files.canPick && (
        <View style={styles.buttons}>
          <Button icon="document" label={words.choose} onPress={() => void handlePick()} />
          <Button
            kind="quiet"
            icon="arrow-down"
            label={words.model}
            onPress={() =>
              files.saveText(
                `${NAMES[subject]}-model.csv`,
                `\uFEFF${COLUMNS[subject].join(',')}\r\n`,
                'text/csv;charset=utf-8',
              )
            }
          />
        </View>
      )}
      <TextField
        id="csv-lines"
        label={words.paste}
        value={csv}
        onChangeText={(text) => {
          setFault(undefined);
          onChange(text);
        }}
        error={error}
        multiline
        lines={14}
        exact
      />
      <Button
        kind={csv.trim() === '' ? 'secondary' : 'primary'}
        label={checking ? words.checking : words.check}
        busy={checking}
        onPress={() => {
          if (csv.length <= MOST) onCheck(csv);
        }}
      />
    </View>
  );
}

interface Props {
  subject: ImportSubject;
  view: RegisterViewControl;
}

/** A file of people or rubber goods: every line is checked before the first is taken in. */
export function ImportScreen({ subject, view }: Props) {
  const messages = useMessages();
  const { register } = messages;
  const words = register.csv;
  const user = useUser();
  const { isWide } = useBreakpoint();
  const kept = useKeptForm({
    userId: user.id,
    key: `register/${subject}/import`,
    schema: keptSchema,
    initial: () => ({ csv: '' }),
  });
  const check = useImport(subject);
  const take = useImport(subject);
  if (kept === undefined) return null;
  const { csv } = kept.value;
  const checked = check.data !== undefined && check.variables.csv === csv ? check.data : undefined;
  const ready = checked !== undefined && checked.errors.length === 0 && checked.count > 0;
  const error = take.error ?? check.error;

  function handleCheck(text: string) {
    take.reset();
    check.mutate({ csv: text });
  }
  function handleImport() {
    take.mutate(
      { csv, confirm: true },
      {
        onSuccess: () => {
          check.reset();
          void kept?.clear();
        },
        // Somebody else added one of these meanwhile: the lines are checked again.
        onError: () => check.mutate({ csv }),
      },
    );
  }
  return (
    <Screen
      title={words[subject]}
      back={{ label: register[subject].title, onPress: view.close }}
      width={isWide ? 'full' : 'column'}
    >
      <View style={styles.all}>
        {take.data !== undefined && (
          <Notice
            live
            icon="sent"
            action={<Button kind="quiet" label={register[subject].title} onPress={view.close} />}
          >
            {words.imported(take.data.created)}
          </Notice>
        )}
        <Text style={styles.lead}>{words.lead}</Text>
        {error !== null && !check.isPending && (
          <ErrorSummary faults={[{ message: describeFault(error, messages) }]} />
        )}
        <View style={isWide ? styles.two : styles.one}>
          <View style={isWide && styles.half}>
            <Lines
              subject={subject}
              csv={csv}
              onChange={(text) => kept.change(() => ({ csv: text }))}
              onCheck={handleCheck}
              checking={check.isPending}
            />
          </View>
          {isWide && (
            <View style={styles.half}>
              <Columns subject={subject} />
            </View>
          )}
        </View>
        {checked !== undefined && <ImportAnswerView answer={checked} columns={COLUMNS[subject]} />}
        {ready && (
          <Button
            kind="primary"
            large
            icon="check"
            label={
              subject === 'people'
                ? words.importPeople(checked.count)
                : words.importGoods(checked.count)
            }
            busy={take.isPending}
            onPress={handleImport}
          />
        )}
        {!isWide && <Columns subject={subject} />}
      </View>
    </Screen>
  );
}

const styles = StyleSheet.create({
  all: { gap: space.lg },
  lead: { maxWidth: 720 },
  lines: { gap: space.md },
  buttons: { flexDirection: 'row', flexWrap: 'wrap', gap: space.md },
  two: { flexDirection: 'row', gap: space.xxl, alignItems: 'flex-start' },
  one: { gap: space.lg },
  half: { flex: 1, minWidth: 0 },
});
