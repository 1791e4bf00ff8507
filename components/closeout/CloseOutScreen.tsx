import { StyleSheet, View } from 'react-native';
import { timeText } from '@/shared/format';
import type { WorksheetRecord } from '@/shared/record';
import { closeOutSchema, type CloseOut } from '@/shared/worksheet';
import { useUser } from '../api/session';
import { useKeptForm } from '../drafts/useKeptForm';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { useToTop } from '../shell/useToTop';
import { Button, LoadingScreen, Notice, Screen, StateMark, Text } from '../ui';
import { WithRecord } from '../worksheet/WithRecord';
import { CloseOutForm } from './CloseOutForm';

const EMPTY = (): CloseOut => ({});

function Closed({ record }: { record: WorksheetRecord }) {
  const words = useMessages();
  const said = words.closeOut;
  const at = record.closeOut?.at ?? record.updatedAt;
  return (
    <View role="status" aria-live="polite" style={styles.box}>
      <StateMark state="complete" word={said.closedTitle(timeText(at, record.timeZone))} />
      <Text variant="answer">{said.closedBody}</Text>
      <Button
        label={words.signing.backToWorksheet}
        href={{ pathname: '/worksheets/[worksheetId]', params: { worksheetId: record.id } }}
      />
    </View>
  );
}

function Content({ record }: { record: WorksheetRecord }) {
  const words = useMessages();
  const said = words.closeOut;
  const user = useUser();
  useToTop(record.state);
  const kept = useKeptForm({
    userId: user.id,
    key: `close/${record.id}/${record.revision}`,
    schema: closeOutSchema,
    initial: EMPTY,
  });
  if (record.state === 'closed') return <Closed record={record} />;
  if (!record.actions.includes('close')) {
    const body =
      record.state === 'in-force' || record.state === 'expired'
        ? said.notYours(record.leadName)
        : said.notHereBody(words.enumerations.state[record.state]);
    return <Notice title={said.notHereTitle}>{body}</Notice>;
  }
  if (kept === undefined) return <LoadingScreen label={said.loading} />;
  return <CloseOutForm record={record} kept={kept} />;
}

/** The end of the job: in the order of making it live again, then the PIN. */
export function CloseOutScreen({ worksheetId }: { worksheetId: string }) {
  const words = useMessages();
  const said = words.closeOut;
  return (
    <WithRecord worksheetId={worksheetId} loading={said.loading}>
      {(record) => {
        const href = {
          pathname: '/worksheets/[worksheetId]',
          params: { worksheetId: record.id },
        } as const;
        return (
          <Screen
            title={said.title}
            subtitle={words.common.numbered(record.number, record.revision)}
            back={{ label: said.back, href }}
            width="column"
          >
            <Content record={record} />
          </Screen>
        );
      }}
    </WithRecord>
  );
}

const styles = StyleSheet.create({ box: { gap: space.sm, paddingVertical: space.md } });
