import { useController } from 'react-hook-form';
import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { clearingSecondsOfCycles } from '@/hazard';
import { useMessages } from '../../i18n/useMessages';
import { space } from '../../theme/tokens';
import { Choice, NumberField } from '../../ui';
import { FieldNumber } from './fields';

/**
 * The clearing time, in seconds or in cycles of 60 Hz. Cycles are turned into
 * seconds by the pairs that the table prints.
 */
export function FieldClearing({ name }: { name: string }) {
  const words = useMessages();
  const { field } = useController({ name });
  const [unit, setUnit] = useState<'seconds' | 'cycles'>('seconds');
  return (
    <View style={styles.box}>
      <FieldNumber key={unit} name={name} unit="s" />
      <Choice
        label={words.worksheet.clearingGivenIn}
        options={[
          { value: 'seconds', label: words.worksheet.seconds },
          { value: 'cycles', label: words.worksheet.cycles },
        ]}
        value={unit}
        onChange={setUnit}
      />
      {unit === 'cycles' && (
        <NumberField
          label={words.worksheet.cyclesLabel}
          unit={words.worksheet.cyclesUnit}
          min={0}
          value={undefined}
          onChange={(cycles) => {
            if (cycles !== undefined && cycles > 0) field.onChange(clearingSecondsOfCycles(cycles));
          }}
        />
      )}
    </View>
  );
}

const styles = StyleSheet.create({ box: { gap: space.sm } });
