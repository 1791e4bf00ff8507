import { useState, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { STOP_REASONS, type WorksheetRecord } from '@/shared/record';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { Button, Notice, Text, TextField, describeFault } from '../ui';
import { useStop } from './useStop';

interface Props {
  record: WorksheetRecord;
  /** The reason that is offered first. */
  first?: (typeof STOP_REASONS)[number];
  /** How a reason is written where somebody else presses for the person who gives it. */
  written?: (reason: string) => string;
  /** The way back; not offered once a stop was pressed and waits for signal. */
  children?: ReactNode;
}

/** Eight ready reasons, each one press; or own words. It works at once. */
export function StopReasons({ record, first, written, children }: Props) {
  const words = useMessages();
  const said = words.stop;
  const [own, setOwn] = useState('');
  const stop = useStop(record);
  const reasons =
    first === undefined
      ? STOP_REASONS
      : [first, ...STOP_REASONS.filter((reason) => reason !== first)];
  if (stop.waiting !== undefined && stop.error !== null && !stop.isPending) {
    const { waiting } = stop;
    return (
      <Notice
        live
        icon="refuse"
        title={said.notSentTitle}
        action={
          <Button kind="primary" large label={said.sendAgain} onPress={() => stop.send(waiting)} />
        }
      >
        {said.notSentBody}
      </Notice>
    );
  }
  const give = (reason: string) => stop.send(written === undefined ? reason : written(reason));
  return (
    <View style={styles.box}>
      {stop.error !== null && <Notice live>{describeFault(stop.error, words)}</Notice>}
      {first === undefined && <Text variant="strong">{said.reasons}</Text>}
      {reasons.map((reason) => {
        const word = words.enumerations.stopReason[reason];
        return (
          <Button
            key={reason}
            large
            kind={reason === first ? 'primary' : 'secondary'}
            icon={reason === first ? 'refuse' : undefined}
            label={word}
            busy={stop.isPending}
            onPress={() => give(written === undefined ? reason : word)}
            style={styles.reason}
          />
        );
      })}
      <View style={styles.own}>
        <Text variant="strong">{said.own}</Text>
        <TextField
          label={said.ownLabel}
          value={own}
          onChangeText={setOwn}
          multiline
          maxLength={1900}
        />
        <Button
          large
          label={said.ownSend}
          reason={own.trim() === '' ? said.ownEmpty : undefined}
          busy={stop.isPending}
          onPress={() => give(own.trim())}
        />
      </View>
      {children}
    </View>
  );
}

const styles = StyleSheet.create({
  box: { gap: 10 },
  reason: { justifyContent: 'flex-start' },
  own: { gap: space.xs, paddingTop: space.md },
});
