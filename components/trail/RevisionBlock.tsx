import { StyleSheet, View } from 'react-native';
import { dateTimeText } from '@/shared/format';
import { STATES, type Signature, type WorksheetState } from '@/shared/record';
import { apiUrl } from '../api/request';
import { openUrl } from '../api/openUrl';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { HashLine } from '../signing/HashLine';
import { space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Button, Text } from '../ui';
import type { Revision } from './trailQueries';

interface SignatureProps {
  signature: Signature;
  timeZone: string;
}

function SignatureLine({ signature, timeZone }: SignatureProps) {
  const { trail, enumerations } = useMessages();
  const locale = useLocale();
  const { signer, enteredById, enteredByName, method } = signature;
  const at = dateTimeText(locale, signature.signedAt, timeZone);
  const notes = [
    enteredById !== signer.id ? trail.onDeviceOf(enteredByName ?? trail.somebody) : '',
    method === 'device'
      ? trail.withoutSignal(dateTimeText(locale, signature.receivedAt, timeZone))
      : '',
  ].filter((note) => note !== '');
  return (
    <View role="listitem" style={styles.signature}>
      <Text variant="strong">{signer.name}</Text>
      <Text variant="note" color="ink2">
        {trail.signedLine(enumerations.meaning[signature.meaning], at)}
      </Text>
      {notes.length > 0 && (
        <Text variant="note" color="ink2">
          {notes.join(', ')}
        </Text>
      )}
    </View>
  );
}

interface Props {
  worksheetId: string;
  number: string;
  revision: Revision;
  current: boolean;
  signatures: readonly Signature[] | undefined;
  timeZone: string;
}

const isState = (state: string): state is WorksheetState =>
  (STATES as readonly string[]).includes(state);

/** One revision: who began it, who signed it, the hash that stands for it, its PDF. */
export function RevisionBlock(props: Props) {
  const { worksheetId, number, revision, current, signatures, timeZone } = props;
  const { trail, enumerations, common } = useMessages();
  const locale = useLocale();
  const { colors } = useTheme();
  const language = locale === 'es-MX' ? 'es' : 'en';
  const { state } = revision;
  const stateWord = isState(state) ? enumerations.state[state] : state;
  const signed = signatures !== undefined && signatures.length > 0;
  return (
    <View role="listitem" style={[styles.block, { borderTopColor: colors.hair }]}>
      <View style={styles.head}>
        <Text variant="value" level={3}>
          {common.revision(revision.revision)}
        </Text>
        <Text variant="answer">{current ? `${stateWord}, ${trail.current}` : stateWord}</Text>
      </View>
      <Text variant="note" color="ink2">
        {`${trail.revisionLine(revision.createdBy.name, dateTimeText(locale, revision.createdAt, timeZone))}. ${revision.edition}`}
      </Text>
      {signed ? (
        <View role="list" aria-label={trail.signatures} style={styles.signatures}>
          {signatures.map((signature) => (
            <SignatureLine key={signature.id} signature={signature} timeZone={timeZone} />
          ))}
        </View>
      ) : (
        signatures !== undefined && <Text>{trail.neverSigned}</Text>
      )}
      <HashLine hash={revision.contentHash} />
      <View style={styles.buttons}>
        <Button
          icon="document"
          label={trail.pdf}
          aria-label={trail.pdfOf(revision.revision)}
          onPress={() =>
            openUrl(
              apiUrl(
                `/worksheets/${worksheetId}/pdf?revision=${revision.revision}&language=${language}`,
              ),
            )
          }
        />
        {signed && (
          <Button
            icon="seal"
            label={trail.verify}
            aria-label={trail.verifyOf(revision.revision)}
            href={{
              pathname: '/verify/[number]/[hash]',
              params: { number, hash: revision.contentHash },
            }}
          />
        )}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  block: { borderTopWidth: 1, paddingVertical: space.sm, gap: space.xs },
  head: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'baseline',
    justifyContent: 'space-between',
    columnGap: space.md,
  },
  signatures: { gap: space.xs },
  signature: { gap: 1 },
  buttons: { flexDirection: 'row', flexWrap: 'wrap', gap: 10 },
});
