import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { RETIRED_BECAUSE } from '@/shared/register';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { Button, Choice, describeFault, ErrorSummary, Text } from '../ui';
import { useSaveRecord, type Subject } from './registerMutations';

interface Props {
  subject: Subject;
  recordId: string;
  title: string;
  body: string;
  onDone: () => void;
  onCancel: () => void;
}

/** Asks once more, and for rubber goods why, before a record leaves use. */
export function RetireForm({ subject, recordId, title, body, onDone, onCancel }: Props) {
  const messages = useMessages();
  const { register, enumerations } = messages;
  const save = useSaveRecord(subject, { id: recordId });
  const [because, setBecause] = useState<(typeof RETIRED_BECAUSE)[number]>();
  const [tried, setTried] = useState(false);
  const asksWhy = subject === 'goods';
  const missing = tried && asksWhy && because === undefined ? register.goods.noReason : undefined;
  const faults = [
    ...(missing === undefined
      ? []
      : [{ id: 'retire-why', message: register.fieldFault(register.goods.reason, missing) }]),
    ...(save.isError ? [{ message: describeFault(save.error, messages) }] : []),
  ];
  function handleRetire() {
    setTried(true);
    if (asksWhy && because === undefined) return;
    save.mutate(
      { retired: true, ...(asksWhy && { retiredBecause: because }) },
      { onSuccess: onDone },
    );
  }
  return (
    <View role="form" aria-label={title} style={styles.box}>
      <Text variant="section" level={3}>
        {title}
      </Text>
      <Text>{body}</Text>
      <ErrorSummary faults={faults} />
      {asksWhy && (
        <Choice
          id="retire-why"
          label={register.goods.reason}
          layout="stack"
          options={RETIRED_BECAUSE.map((value) => ({
            value,
            label: enumerations.retiredBecause[value],
          }))}
          value={because}
          onChange={setBecause}
          error={missing}
        />
      )}
      <Button kind="primary" label={title} busy={save.isPending} onPress={handleRetire} />
      <Button label={register.cancel} onPress={onCancel} />
    </View>
  );
}

const styles = StyleSheet.create({ box: { gap: space.md } });
