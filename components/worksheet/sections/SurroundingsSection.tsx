import { useFormContext } from 'react-hook-form';
import { StyleSheet, View } from 'react-native';
import {
  ACCESS,
  CEILINGS,
  GROUNDED_SURFACE_KINDS,
  LADDER_MATERIALS,
  OVERHEAD_LINES,
  minimumStepladder,
} from '@/hazard';
import { list, typedDistance, typedFeet } from '@/shared/format';
import { useLocale, useUnits } from '../../i18n/preferences';
import { useMessages } from '../../i18n/useMessages';
import { space } from '../../theme/tokens';
import { Button, CheckRow, Facts, Text, type Fact } from '../../ui';
import { FieldCheck } from '../form/FieldCheck';
import { FieldChoice, FieldDistance, FieldSelect, FieldText, FieldYesNo } from '../form/fields';
import { useListField } from '../form/useListField';
import { useShowField } from '../form/shownFields';
import { wordOf } from '../form/fieldWords';
import { useFieldState, useWorksheetForm } from '../form/WorksheetFormContext';
import { FindingPanels } from '../parts/FindingPanels';
import { SectionFrame } from '../parts/SectionFrame';

function useSurroundingFacts(): Fact[] {
  const words = useMessages();
  const locale = useLocale();
  const units = useUnits();
  const { surroundings = {} } = useWorksheetForm().content;
  const { ladder, groundedSurfaces, access, ceilingHeightFeet, lightAdequate, barricadeInches } =
    surroundings;
  const surfaces = groundedSurfaces?.map(({ kind }) =>
    kind === undefined ? words.worksheet.surface : wordOf(words, 'surfaceKind', kind),
  );
  const facts: (Fact | undefined)[] = [
    surfaces && {
      label: words.worksheet.short.grounded,
      value: surfaces.length === 0 ? words.worksheet.lookedNone : list(locale, surfaces),
    },
    access && { label: words.worksheet.short.access, value: wordOf(words, 'access', access) },
    ladder?.material && {
      label: words.worksheet.short.ladder,
      value: [
        wordOf(words, 'ladderMaterial', ladder.material),
        ladder.sizeFeet && typedFeet(ladder.sizeFeet, units),
      ]
        .filter(Boolean)
        .join(', '),
      note:
        ladder.standingLevelFeet === undefined
          ? undefined
          : words.worksheet.standingAt(typedFeet(ladder.standingLevelFeet, units)),
    },
    ceilingHeightFeet === undefined
      ? undefined
      : { label: words.worksheet.short.ceiling, value: typedFeet(ceilingHeightFeet, units) },
    lightAdequate === undefined
      ? undefined
      : {
          label: words.worksheet.short.light,
          value: lightAdequate ? words.worksheet.lightEnough : words.worksheet.lightTooLittle,
        },
    barricadeInches === undefined
      ? undefined
      : { label: words.worksheet.short.barricade, value: typedDistance(barricadeInches, units) },
  ];
  return facts.filter((fact) => fact !== undefined);
}

function Summary() {
  return <Facts facts={useSurroundingFacts()} />;
}

/** One surface: in reach, covered, kept clear. */
function Surface({ index, onRemove }: { index: number; onRemove: () => void }) {
  const words = useMessages();
  const { content } = useWorksheetForm();
  const surface = content.surroundings?.groundedSurfaces?.[index];
  const at = (field: string) => `surroundings.groundedSurfaces.${index}.${field}`;
  const name =
    surface?.kind === undefined
      ? words.worksheet.surface
      : wordOf(words, 'surfaceKind', surface.kind);
  return (
    <View style={styles.surface}>
      <FieldSelect name={at('kind')} values={GROUNDED_SURFACE_KINDS} group="surfaceKind" />
      <FieldYesNo name={at('inReach')} />
      {surface?.inReach !== false && (
        <>
          <FieldCheck name={at('covered')} />
          <FieldCheck name={at('keptClear')} />
        </>
      )}
      <ElementFindings path={`/surroundings/groundedSurfaces/${index}`} />
      <Button
        kind="quiet"
        icon="close"
        label={words.worksheet.removeSurface(name)}
        onPress={onRemove}
      />
    </View>
  );
}

/** Findings about a whole row of a list. */
function ElementFindings({ path }: { path: string }) {
  const name = path.slice(1).replaceAll('/', '.');
  const { findings } = useFieldState(name);
  useShowField(name);
  return <FindingPanels findings={findings} />;
}

function GroundedSurfaces() {
  const words = useMessages();
  const { content } = useWorksheetForm();
  const { setValue } = useFormContext();
  const surfaces = content.surroundings?.groundedSurfaces;
  const [, change] = useListField<object>('surroundings.groundedSurfaces');
  const set = (next: unknown) =>
    setValue('surroundings.groundedSurfaces', next, { shouldDirty: true });
  return (
    <View style={styles.group}>
      <Text variant="strong">{words.fields['surroundings.groundedSurfaces']}</Text>
      <Text variant="label" color="ink2" weight="400">
        {words.worksheet.surfacesHint}
      </Text>
      {(surfaces ?? []).map((_, index) => (
        <Surface
          key={index}
          index={index}
          onRemove={() => change((list) => list.filter((__, place) => place !== index))}
        />
      ))}
      {(surfaces === undefined || surfaces.length === 0) && (
        <CheckRow
          label={words.worksheet.lookedNone}
          checked={surfaces !== undefined}
          unanswered={surfaces === undefined}
          onChange={(now) => set(now ? [] : undefined)}
        />
      )}
      <Button
        icon="plus"
        label={words.worksheet.addSurface}
        onPress={() => change((list) => [...list, {}])}
      />
      <ElementFindings path="/surroundings/groundedSurfaces" />
    </View>
  );
}

function LadderAdvice() {
  const words = useMessages().worksheet;
  const units = useUnits();
  const { ceilingHeightFeet } = useWorksheetForm().content.surroundings ?? {};
  if (ceilingHeightFeet === undefined) return null;
  const ladder = minimumStepladder({ ceilingHeightFeet });
  return (
    <Text variant="answer" aria-live="polite">
      {ladder === null
        ? words.noLadderTallEnough
        : words.smallestLadder(
            typedFeet(ladder.sizeFeet, units),
            typedFeet(ladder.standingLevelFeet, units),
          )}
    </Text>
  );
}

function Access() {
  const { surroundings = {} } = useWorksheetForm().content;
  const { access } = surroundings;
  return (
    <>
      <FieldSelect name="surroundings.access" values={ACCESS} group="access" />
      <FieldDistance name="surroundings.ceilingHeightFeet" keptIn="ft" />
      {access === 'stepladder' && <LadderAdvice />}
      {(access === 'stepladder' || access === 'extension ladder') && (
        <>
          <FieldSelect
            name="surroundings.ladder.material"
            values={LADDER_MATERIALS}
            group="ladderMaterial"
          />
          <FieldDistance name="surroundings.ladder.sizeFeet" keptIn="ft" />
          <FieldDistance name="surroundings.ladder.standingLevelFeet" keptIn="ft" />
          <FieldYesNo name="surroundings.ladder.placed" />
        </>
      )}
      {access === 'lift' && (
        <>
          <FieldYesNo name="surroundings.lift.fallProtection" />
          <FieldYesNo name="surroundings.lift.operatorTrained" />
          <FieldYesNo name="surroundings.lift.insulating" />
        </>
      )}
    </>
  );
}

/** 9. What is around the work. */
export function SurroundingsSection() {
  const { surroundings = {} } = useWorksheetForm().content;
  return (
    <SectionFrame section="surroundings" folded={<Summary />}>
      <GroundedSurfaces />
      <Access />
      <FieldChoice name="surroundings.ceiling" values={CEILINGS} group="ceiling" />
      <FieldYesNo name="surroundings.lightAdequate" />
      <FieldYesNo name="surroundings.wet" />
      {surroundings.wet === true && <FieldText name="surroundings.wetMeasures" />}
      <FieldYesNo name="surroundings.conductiveArticlesRemoved" />
      <FieldYesNo name="surroundings.peopleMayApproach" />
      {surroundings.peopleMayApproach !== false && (
        <>
          <FieldDistance name="surroundings.barricadeInches" keptIn="in" />
          <FieldYesNo name="surroundings.attendant" />
        </>
      )}
      <FieldYesNo name="surroundings.outdoors" />
      {surroundings.outdoors === true && (
        <FieldChoice
          name="surroundings.overheadLines"
          values={OVERHEAD_LINES}
          group="overheadLines"
        />
      )}
    </SectionFrame>
  );
}

const styles = StyleSheet.create({
  group: { gap: space.sm },
  surface: { gap: space.md, paddingBottom: space.sm },
});
