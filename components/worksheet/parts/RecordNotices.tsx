import { StyleSheet, View } from 'react-native';
import { dateTimeText } from '@/shared/format';
import { useLocale } from '../../i18n/preferences';
import { useMessages } from '../../i18n/useMessages';
import { space } from '../../theme/tokens';
import { Notice } from '../../ui';
import { useWorksheetForm } from '../form/WorksheetFormContext';
import { NotProvedPanel } from './NotProvedPanel';
import { Questions } from './Questions';
import { RecordActions } from './RecordActions';

/** What has to be known before the sections of a signed record are read, and what may be done with it. */
export function RecordNotices() {
  const words = useMessages().worksheet;
  const locale = useLocale();
  const { record } = useWorksheetForm();
  const { reason } = record;
  return (
    <View style={styles.box}>
      {record.state === 'in-force' && <NotProvedPanel record={record} />}
      {reason !== null && (
        <Notice
          icon={record.state === 'stopped' ? 'refuse' : 'left'}
          title={words.reasonTitle[record.state] ?? words.reasonBy}
        >
          {words.reasonLine(
            reason.text,
            reason.byName,
            dateTimeText(locale, reason.at, record.timeZone),
          )}
        </Notice>
      )}
      <Questions record={record} />
      <RecordActions record={record} />
    </View>
  );
}

const styles = StyleSheet.create({ box: { gap: space.md } });
