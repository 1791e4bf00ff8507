import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import type { WorksheetRecord } from '@/shared/record';
import type { Locale } from '@/shared/user';
import { LanguageSwitch } from '../i18n/LanguageSwitch';
import { PreferencesProvider, useLocale, useUnits } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { useToTop } from '../shell/useToTop';
import { Stopped } from '../stop/Stopped';
import { space } from '../theme/tokens';
import { NotFoundScreen, Screen, webProps } from '../ui';
import { WithRecord } from '../worksheet/WithRecord';
import { HelperAnswering } from './HelperAnswering';
import type { HelperPage, HelperPageProps } from './helperPage';
import { HelperReading } from './HelperReading';

function Helper({ record, signerId }: { record: WorksheetRecord; signerId: string }) {
  const locale = useLocale();
  const units = useUnits();
  const [chosen, setChosen] = useState<Locale>(locale);
  const [page, setPage] = useState<HelperPage>('read');
  const [asked, setAsked] = useState(false);
  const [read, setRead] = useState(false);
  useToTop(`${record.state === 'stopped'} ${page}`);
  const member = record.content.crew?.find(({ userId }) => userId === signerId);
  if (member === undefined) return <NotFoundScreen />;
  const shown: HelperPageProps = {
    record,
    member: { ...member, userId: signerId },
    page,
    onPage: setPage,
    headerEnd: <LanguageSwitch value={chosen} onChange={setChosen} />,
  };
  return (
    <PreferencesProvider locale={chosen} units={units}>
      <View {...webProps({ lang: chosen })} style={styles.whole}>
        {record.state === 'stopped' ? (
          <StoppedPage shown={shown} />
        ) : page === 'read' ? (
          <HelperReading {...shown} asked={asked} read={read} onRead={() => setRead(true)} />
        ) : (
          <HelperAnswering
            {...shown}
            onAsked={() => {
              setAsked(true);
              setPage('read');
            }}
          />
        )}
      </View>
    </PreferencesProvider>
  );
}

function StoppedPage({ shown }: { shown: HelperPageProps }) {
  const words = useMessages().stop;
  return (
    <Screen title={words.stoppedTitle} hideTitle headerEnd={shown.headerEnd} width="helper">
      <View style={styles.signed}>
        <Stopped record={shown.record} />
      </View>
    </Screen>
  );
}

interface Props {
  worksheetId: string;
  /** The account of the person who is briefed. */
  signerId: string;
}

/**
 * The helper's page, on their own phone or on another's that was handed over:
 * read in one minute, then one of three answers. The language is the reader's,
 * whoever is signed in.
 */
export function HelperScreen({ worksheetId, signerId }: Props) {
  const words = useMessages().helper;
  return (
    <WithRecord worksheetId={worksheetId} loading={words.loading}>
      {(record) => <Helper record={record} signerId={signerId} />}
    </WithRecord>
  );
}

const styles = StyleSheet.create({
  whole: { flexGrow: 1 },
  signed: { gap: space.md, paddingTop: space.md },
});
