import { useFormContext } from 'react-hook-form';
import { StyleSheet, View } from 'react-native';
import { GLOVE_CLASSES, type RequiredItem } from '@/hazard';
import { itemWords } from '@/shared/messages';
import { dateText } from '@/shared/format';
import type { RubberGoods } from '@/shared/register';
import { daysBetween, latestTest } from '@/shared/registerState';
import { useLocale } from '../../i18n/preferences';
import { useMessages } from '../../i18n/useMessages';
import { useToday } from '../../register/useToday';
import { space } from '../../theme/tokens';
import { CheckRow, Citation, Select, StateMark, Text } from '../../ui';
import { FieldCheck } from '../form/FieldCheck';
import { FieldChoice, FieldDate } from '../form/fields';
import { toggled, useListField } from '../form/useListField';
import { useShowField } from '../form/shownFields';
import { useFieldState, useWorksheetForm } from '../form/WorksheetFormContext';
import { FindingPanels } from '../parts/FindingPanels';
import { SectionFacts } from '../parts/SectionFacts';
import { SectionFrame } from '../parts/SectionFrame';
import { useRubberGoods } from '../registerQueries';

const BY_HAND = 'by hand';

/** Until when a pair may be worn and how long that is, or why it may not. */
function useGloveNote() {
  const { worksheet: words, register } = useMessages();
  const locale = useLocale();
  const { site } = useWorksheetForm();
  const today = useToday()(site?.timeZone);
  return (item: RubberGoods) => {
    const due = dateText(locale, item.dueOn);
    const left = daysBetween(today, item.dueOn);
    if (item.inTest) return words.gloveDates(dateText(locale, item.lastTestedOn), due, left);
    const failed = latestTest(item)?.passed === false;
    if (!failed && left < 0) return words.gloveRanOut(due);
    return failed ? register.goods.outBecause : register.goods.notIssuedYet;
  };
}

/** The glove set from the register: class and dates come with it, and the server puts them in again. */
function GloveChoice() {
  const words = useMessages();
  const goods = useRubberGoods();
  const noteOf = useGloveNote();
  const { content, site } = useWorksheetForm();
  const { setValue } = useFormContext();
  const chosen = content.protectiveEquipment?.rubberGoodsId;
  const offered = goods.filter(
    ({ kind, retired, siteId }) =>
      kind === 'gloves' && !retired && (site === undefined || siteId === site.id),
  );
  const handleChange = (id: string) => {
    const item = goods.find((each) => each.id === id);
    const set = (field: string, value: unknown) =>
      setValue(`protectiveEquipment.${field}`, value, { shouldDirty: true });
    set('rubberGoodsId', item?.id);
    set('gloves.gloveClass', item?.gloveClass);
    set('gloves.lastTestedOn', item?.lastTestedOn);
    set('gloves.issuedOn', item?.issuedOn ?? undefined);
    // Yesterday's air test was of another pair.
    set('gloves.airTested', undefined);
  };
  return (
    <>
      <Select
        id="field-protectiveEquipment-rubberGoodsId"
        label={words.fields['protectiveEquipment.rubberGoodsId']}
        value={chosen ?? BY_HAND}
        onChange={handleChange}
        options={[
          ...offered.map((item) => ({
            value: item.id,
            label: words.worksheet.gloveName(
              item.serial,
              words.enumerations.gloveClass[item.gloveClass],
            ),
            note: noteOf(item),
            icon: 'glove' as const,
            refused: !item.inTest,
          })),
          { value: BY_HAND, label: words.worksheet.glovesByHand },
        ]}
      />
      {chosen === undefined && (
        <>
          <FieldChoice
            name="protectiveEquipment.gloves.gloveClass"
            values={GLOVE_CLASSES}
            group="gloveClass"
          />
          <FieldDate name="protectiveEquipment.gloves.lastTestedOn" />
          <FieldDate name="protectiveEquipment.gloves.issuedOn" />
        </>
      )}
    </>
  );
}

/** The list that follows from the answers, checked item by item. */
function RequiredItems() {
  const words = useMessages().worksheet;
  const { assessment } = useWorksheetForm();
  useShowField('protectiveEquipment.ready');
  return (
    <View>
      <Text variant="strong">{words.requiredItems}</Text>
      {assessment.equipment.map((item) => (
        <ItemRow key={item.id} item={item} />
      ))}
    </View>
  );
}

function ItemRow({ item }: { item: RequiredItem }) {
  const locale = useLocale();
  const { findings } = useFieldState('protectiveEquipment.ready');
  const [ready, change] = useListField<string>('protectiveEquipment.ready');
  const checked = ready.includes(item.id);
  const others = findings.filter(
    ({ severity, params }) => severity !== 'open' && params.item === item.id,
  );
  return (
    <>
      <CheckRow
        label={itemWords(locale, item)}
        checked={checked}
        unanswered={!checked}
        onChange={(now) => change((list) => toggled(list, item.id, now))}
      />
      <FindingPanels findings={others} />
    </>
  );
}

/** The sources of the list, each once: under every row they would drown the rows. */
function ItemSources() {
  const { equipment } = useWorksheetForm().assessment;
  return <Citation citation={equipment.map((item) => item.citation)} />;
}

function EquipmentSummary() {
  const words = useMessages();
  const locale = useLocale();
  const { assessment, content } = useWorksheetForm();
  const ready = new Set(content.protectiveEquipment?.ready ?? []);
  return (
    <>
      {assessment.equipment.map((item) => (
        <View key={item.id} style={styles.summary}>
          <StateMark
            state={ready.has(item.id) ? 'complete' : 'open'}
            word={itemWords(locale, item)}
            detail={ready.has(item.id) ? undefined : words.worksheet.notAtHand}
          />
        </View>
      ))}
    </>
  );
}

/** 8. What must be worn and at hand. */
export function ProtectiveEquipmentSection() {
  const words = useMessages().worksheet;
  const { assessment, content } = useWorksheetForm();
  const ready = new Set(content.protectiveEquipment?.ready ?? []);
  const gloved = assessment.equipment.some(({ id }) => id === 'rubber-insulating-gloves');
  const atHand = assessment.equipment.filter(({ id }) => ready.has(id)).length;
  return (
    <SectionFrame
      section="protectiveEquipment"
      folded={<EquipmentSummary />}
      readOnly={
        <>
          <SectionFacts section="protectiveEquipment" />
          <EquipmentSummary />
          <ItemSources />
        </>
      }
      detail={words.atHand(atHand, assessment.equipment.length)}
    >
      {gloved && (
        <>
          <GloveChoice />
          <View>
            <FieldCheck name="protectiveEquipment.gloves.airTested" />
            <FieldCheck name="protectiveEquipment.gloves.leatherProtectors" />
          </View>
        </>
      )}
      <RequiredItems />
      <ItemSources />
    </SectionFrame>
  );
}

const styles = StyleSheet.create({ summary: { paddingVertical: space.xxs } });
