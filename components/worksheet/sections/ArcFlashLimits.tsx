import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { boltedFaultAmperes } from '@/hazard';
import { kiloamperes } from '@/shared/format';
import { useLocale } from '../../i18n/preferences';
import { useMessages } from '../../i18n/useMessages';
import { space } from '../../theme/tokens';
import { Button, Text } from '../../ui';
import { FieldChoice, FieldDate, FieldDistance, FieldNumber, FieldYesNo } from '../form/fields';
import { useWorksheetForm } from '../form/WorksheetFormContext';

/** What is printed on the equipment's arc flash label; one of the three ratings. */
export function LabelFields() {
  const words = useMessages();
  const at = (field: string) => `arcFlash.label.${field}`;
  return (
    <View style={styles.group}>
      <Text variant="strong">{words.fields['arcFlash.label']}</Text>
      <FieldYesNo name={at('ofThisEquipment')} />
      <FieldNumber name={at('systemVolts')} unit="V" />
      <FieldDistance name={at('arcFlashBoundaryInches')} keptIn="in" />
      <Text variant="label" color="ink2">
        {words.worksheet.oneRating}
      </Text>
      <FieldNumber name={at('incidentEnergyCalPerCm2')} unit="cal/cm²" />
      <FieldDistance name={at('workingDistanceInches')} keptIn="in" />
      <FieldNumber name={at('minimumArcRatingCalPerCm2')} unit="cal/cm²" />
      <FieldChoice name={at('ppeCategory')} values={[1, 2, 3, 4]} />
      <FieldDate name={at('reviewedOn')} />
    </View>
  );
}

function Estimate() {
  const words = useMessages();
  const locale = useLocale();
  const { transformer } = useWorksheetForm().content.arcFlash ?? {};
  const { kilovoltAmperes, secondaryVolts, impedancePercent, phases } = transformer ?? {};
  if (!kilovoltAmperes || !secondaryVolts || !impedancePercent || phases === undefined) return null;
  const amperes = boltedFaultAmperes({ kilovoltAmperes, secondaryVolts, impedancePercent, phases });
  return (
    <View aria-live="polite">
      <Text variant="answer">{words.worksheet.estimate(kiloamperes(locale, amperes / 1000))}</Text>
      <Text variant="label" color="ink2" weight="400">
        {words.worksheet.estimateNote}
      </Text>
    </View>
  );
}

/** The fault current estimated from the nameplate: an upper bound, folded until asked for. */
export function TransformerFields() {
  const words = useMessages();
  const { content } = useWorksheetForm();
  const [open, setOpen] = useState(content.arcFlash?.transformer !== undefined);
  const at = (field: string) => `arcFlash.transformer.${field}`;
  return (
    <View style={styles.group}>
      <Button
        kind="quiet"
        icon={open ? 'up' : 'down'}
        label={words.worksheet.fromNameplate}
        aria-expanded={open}
        onPress={() => setOpen(!open)}
      />
      {open && (
        <>
          <FieldNumber name={at('kilovoltAmperes')} unit="kVA" />
          <FieldNumber name={at('secondaryVolts')} unit="V" />
          <FieldNumber name={at('impedancePercent')} unit="%" />
          <FieldChoice
            name={at('phases')}
            values={[1, 3]}
            wordFor={(phases) => words.worksheet.phases[phases === 1 ? 'one' : 'three']}
          />
          <Estimate />
        </>
      )}
    </View>
  );
}

const styles = StyleSheet.create({ group: { gap: space.lg } });
