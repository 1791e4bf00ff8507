import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { timeText } from '@/shared/format';
import type { Meaning, WorksheetRecord } from '@/shared/record';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { Button, PinField, SignaturePad, type StrokeList } from '../ui';
import { useNow } from '../worksheet/useAssessment';
import { HashLine } from './HashLine';
import { SigningProblem, usePinFault } from './SigningProblem';
import { useSign } from './useSign';

const PIN_LENGTH = 6;
/** The record takes no fewer points. */
const LEAST_POINTS = 2;

interface Props {
  record: WorksheetRecord;
  meaning: Meaning;
  signer: { id: string; name: string };
  pinLabel?: string;
  /** Why it cannot be signed at all now; inside the button. */
  blocked?: string;
  onSigned: (signedAt: string) => void;
}

function useMissing(pin: string, strokes: StrokeList): string | undefined {
  const words = useMessages().signing.missing;
  const digits = PIN_LENGTH - pin.length;
  const points = strokes.reduce((sum, stroke) => sum + stroke.length, 0);
  const unsigned = points < LEAST_POINTS;
  if (digits === PIN_LENGTH && unsigned) return words.both;
  if (digits > 0) return words.digits(digits);
  return unsigned ? words.strokes : undefined;
}

/** PIN, strokes, the hash of what is signed, and the one button that names the role. */
export function SignatureForm({ record, meaning, signer, pinLabel, blocked, onSigned }: Props) {
  const words = useMessages().signing;
  const [pin, setPin] = useState('');
  const [strokes, setStrokes] = useState<StrokeList>([]);
  const now = useNow();
  const sign = useSign({ record, meaning, signerId: signer.id });
  const pinFault = usePinFault(sign.error);
  const missing = useMissing(pin, strokes);
  return (
    <View style={styles.form}>
      <PinField
        id="signing-pin"
        label={pinLabel}
        value={pin}
        onChange={(next) => {
          setPin(next);
          if (pinFault !== undefined) sign.reset();
        }}
        error={pinFault}
      />
      <SignaturePad
        id="signing-strokes"
        label={words.signature}
        value={strokes}
        onChange={setStrokes}
        name={signer.name}
        time={timeText(now.toISOString(), record.timeZone)}
      />
      <HashLine hash={record.contentHash} />
      <SigningProblem error={sign.error} record={record} />
      <Button
        kind="primary"
        large
        icon={blocked === undefined && missing === undefined ? 'pen' : undefined}
        label={words.button[meaning]}
        reason={blocked ?? missing}
        busy={sign.isPending}
        onPress={() =>
          sign.mutate({ pin, strokes }, { onSuccess: ({ signedAt }) => onSigned(signedAt) })
        }
      />
    </View>
  );
}

const styles = StyleSheet.create({ form: { gap: space.md } });
