import { StyleSheet, View } from 'react-native';
import type { WorksheetRecord } from '@/shared/record';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { useToTop } from '../shell/useToTop';
import { Button, Notice, Screen, Text } from '../ui';
import { WithRecord } from '../worksheet/WithRecord';
import { Stopped } from './Stopped';
import { StopReasons } from './StopReasons';

function Content({ record }: { record: WorksheetRecord }) {
  const words = useMessages();
  const said = words.stop;
  useToTop(record.state);
  const href = {
    pathname: '/worksheets/[worksheetId]',
    params: { worksheetId: record.id },
  } as const;
  if (record.state === 'stopped') return <Stopped record={record} />;
  if (!record.actions.includes('stop')) {
    return (
      <Notice
        icon="refuse"
        title={said.notHereTitle}
        action={<Button label={said.toWorksheet} href={href} />}
      >
        {said.notHereBody(words.enumerations.state[record.state])}
      </Notice>
    );
  }
  return (
    <View style={styles.box}>
      <Text variant="answer">{said.body}</Text>
      <StopReasons record={record}>
        <Button kind="quiet" icon="left" label={said.noReason} href={href} />
      </StopReasons>
    </View>
  );
}

/** The second of the two taps that stop the work. */
export function StopScreen({ worksheetId }: { worksheetId: string }) {
  const words = useMessages();
  return (
    <WithRecord worksheetId={worksheetId} loading={words.stop.loading}>
      {(record) => (
        <Screen
          title={words.stop.title}
          subtitle={words.common.numbered(record.number, record.revision)}
          back={{
            label: words.stop.back,
            href: {
              pathname: '/worksheets/[worksheetId]',
              params: { worksheetId: record.id },
            },
          }}
          width="helper"
        >
          <Content record={record} />
        </Screen>
      )}
    </WithRecord>
  );
}

const styles = StyleSheet.create({ box: { gap: space.md } });
