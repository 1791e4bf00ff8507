import { StyleSheet, View } from 'react-native';
import { ARC_FLASH_EQUIPMENT, ARC_FLASH_TASKS, NORMAL_CONDITIONS, pathOf } from '@/hazard';
import { calories } from '@/shared/format';
import { useLocale } from '../../i18n/preferences';
import { useMessages } from '../../i18n/useMessages';
import { space } from '../../theme/tokens';
import { Citation, StateMark, Text } from '../../ui';
import { FieldCheck } from '../form/FieldCheck';
import { FieldClearing } from '../form/FieldClearing';
import { FieldDistance, FieldNumber, FieldSelect, FieldYesNo } from '../form/fields';
import { useWorksheetForm } from '../form/WorksheetFormContext';
import { SectionFacts } from '../parts/SectionFacts';
import { SectionFrame } from '../parts/SectionFrame';
import { LabelFields, TransformerFields } from './ArcFlashLimits';

/** What the method gives: likely or not, the category or the energy, the rating to wear. */
export function ArcFlashResult() {
  const words = useMessages();
  const locale = useLocale();
  const { arcFlash } = useWorksheetForm().assessment;
  const { likely, method, ppeCategory, requiredArcRatingCalPerCm2: rating, citations } = arcFlash;
  return (
    <View style={styles.result} aria-live="polite">
      <Text variant="answer">
        {likely ? words.worksheet.arcFlashLikely : words.worksheet.arcFlashNotLikely}
      </Text>
      {method === 'study needed' && <StateMark state="stop" word={words.worksheet.studyNeeded} />}
      {(ppeCategory !== null || rating !== null) && (
        <View style={styles.figures}>
          {ppeCategory !== null && (
            <View>
              <Text variant="label" color="ink2">
                {words.worksheet.ppeCategory}
              </Text>
              <Text variant="figureL">{String(ppeCategory)}</Text>
            </View>
          )}
          {rating !== null && (
            <View>
              <Text variant="label" color="ink2">
                {words.worksheet.arcRating}
              </Text>
              <Text variant="figureL">{calories(locale, rating)}</Text>
            </View>
          )}
        </View>
      )}
      {likely && <Text>{words.enumerations.arcFlashMethod[method]}</Text>}
      <Citation citation={citations} />
    </View>
  );
}

function NormalCondition() {
  const words = useMessages();
  return (
    <View>
      <Text variant="strong">{words.worksheet.normalQuestion}</Text>
      <Text variant="label" color="ink2" weight="400">
        {words.worksheet.normalHint}
      </Text>
      <View style={styles.list}>
        {NORMAL_CONDITIONS.map((condition) => (
          <FieldCheck
            key={condition}
            name={`arcFlash.normal.${condition}`}
            label={words.enumerations.normal[condition]}
          />
        ))}
      </View>
    </View>
  );
}

/** 7. Is an arc flash likely, and by which one method it is met. */
export function ArcFlashSection() {
  const { content, assessment } = useWorksheetForm();
  const off = pathOf(content) === 'off';
  const arc = content.arcFlash ?? {};
  const rated = assessment.arcFlash.requiredArcRatingCalPerCm2 !== null;
  return (
    <SectionFrame
      section="arcFlash"
      folded={<ArcFlashResult />}
      readOnly={
        <>
          <SectionFacts section="arcFlash" />
          <ArcFlashResult />
        </>
      }
    >
      <FieldSelect
        name="arcFlash.equipment"
        values={ARC_FLASH_EQUIPMENT}
        group="arcFlashEquipment"
      />
      {!off && <FieldSelect name="arcFlash.task" values={ARC_FLASH_TASKS} group="arcFlashTask" />}
      <NormalCondition />
      <FieldDistance name="arcFlash.workingDistanceInches" keptIn="in" />
      <FieldYesNo name="arcFlash.noLabel" />
      {(arc.noLabel === false || arc.label !== undefined) && <LabelFields />}
      {arc.noLabel === true && (
        <>
          <FieldNumber name="arcFlash.availableFaultKiloamperes" unit="kA" />
          <TransformerFields />
          <FieldClearing name="arcFlash.clearingSeconds" />
          <FieldCheck name="arcFlash.limitsNotKnown" />
        </>
      )}
      <ArcFlashResult />
      {rated && <FieldNumber name="arcFlash.clothingRatingCalPerCm2" unit="cal/cm²" />}
    </SectionFrame>
  );
}

const styles = StyleSheet.create({
  result: { gap: space.sm },
  figures: { flexDirection: 'row', flexWrap: 'wrap', gap: space.xl },
  list: { marginTop: space.xs },
});
