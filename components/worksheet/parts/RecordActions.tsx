import { router } from 'expo-router';
import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import type { WorksheetRecord } from '@/shared/record';
import { apiUrl } from '../../api/request';
import { useLocale } from '../../i18n/preferences';
import { useMessages } from '../../i18n/useMessages';
import { openUrl } from '../../api/openUrl';
import { Button, Notice, describeFault } from '../../ui';
import { useWorksheetAct } from '../worksheetQueries';
import { ReasonForm } from './ReasonForm';

/** A new revision of this worksheet, or a new worksheet made after it. */
function Again({ record }: { record: WorksheetRecord }) {
  const words = useMessages();
  const revise = useWorksheetAct(record.id, 'revise');
  const copy = useWorksheetAct(record.id, 'copy');
  const error = revise.error ?? copy.error;
  return (
    <>
      {error !== null && <Notice live>{describeFault(error, words)}</Notice>}
      {record.actions.includes('revise') && (
        <Button
          kind="primary"
          large
          icon="pen"
          label={words.worksheet.revise(record.revision + 1)}
          busy={revise.isPending}
          onPress={() => revise.mutate({})}
        />
      )}
      {record.actions.includes('copy') && (
        <Button
          icon="document"
          label={words.worksheet.copy}
          busy={copy.isPending}
          onPress={() =>
            copy.mutate(
              {},
              {
                onSuccess: (made) =>
                  router.push({
                    pathname: '/worksheets/[worksheetId]',
                    params: { worksheetId: made.id },
                  }),
              },
            )
          }
        />
      )}
    </>
  );
}

/** What the signed-in person may do with the record now; the server said what. */
export function RecordActions({ record }: { record: WorksheetRecord }) {
  const words = useMessages();
  const locale = useLocale();
  const [asking, setAsking] = useState<'return' | 'void'>();
  const language = locale === 'es-MX' ? 'es' : 'en';
  if (asking !== undefined) {
    return (
      <ReasonForm
        worksheetId={record.id}
        act={asking}
        label={words.worksheet.reasonFor[asking]}
        submit={words.worksheet.actName[asking]}
        onDone={() => setAsking(undefined)}
        onCancel={() => setAsking(undefined)}
      />
    );
  }
  return (
    <View style={styles.box}>
      <Again record={record} />
      <View style={styles.row}>
        <Button
          icon="document"
          label={words.worksheet.openPdf}
          onPress={() => openUrl(apiUrl(`/worksheets/${record.id}/pdf?language=${language}`))}
        />
        <Button
          icon="clock"
          label={words.worksheet.trail}
          href={{ pathname: '/worksheets/[worksheetId]/trail', params: { worksheetId: record.id } }}
        />
        {record.actions.includes('return') && (
          <Button
            icon="left"
            label={words.worksheet.actName.return}
            onPress={() => setAsking('return')}
          />
        )}
        {record.actions.includes('void') && (
          <Button
            icon="close"
            label={words.worksheet.actName.void}
            onPress={() => setAsking('void')}
          />
        )}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  box: { gap: 10 },
  row: { flexDirection: 'row', flexWrap: 'wrap', gap: 10 },
});
