import { StyleSheet, View } from 'react-native';
import { timeText } from '@/shared/format';
import { enumWord } from '@/shared/messages';
import type { WorksheetRecord } from '@/shared/record';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { Button, StopPanel, Text } from '../ui';

/** The work is stopped: why, by whom, what comes next. */
export function Stopped({ record }: { record: WorksheetRecord }) {
  const words = useMessages().stop;
  const locale = useLocale();
  const { reason, timeZone } = record;
  return (
    <View style={styles.box}>
      <StopPanel title={words.stoppedTitle} body={words.stoppedBody}>
        {reason !== null && (
          <Text variant="strong">
            {words.stoppedLine(
              enumWord(locale, 'stopReason', reason.text),
              reason.byName,
              timeText(reason.at, timeZone),
            )}
          </Text>
        )}
      </StopPanel>
      <Button
        label={words.toWorksheet}
        href={{ pathname: '/worksheets/[worksheetId]', params: { worksheetId: record.id } }}
      />
    </View>
  );
}

const styles = StyleSheet.create({ box: { gap: space.md } });
