import { StyleSheet, View } from 'react-native';
import { EXPOSURES, type Citation as CitationData, type Distance } from '@/hazard';
import { distance, distancePair } from '@/shared/format';
import { useUnits } from '../../i18n/preferences';
import { useMessages } from '../../i18n/useMessages';
import { space } from '../../theme/tokens';
import { useBreakpoint } from '../../theme/useBreakpoint';
import { useTheme } from '../../theme/useTheme';
import { Citation, Text } from '../../ui';
import { ZoneSwatch, type ZoneName } from '../parts/ZoneSwatch';
import { FieldChoice, FieldYesNo } from '../form/fields';
import { useWorksheetForm } from '../form/WorksheetFormContext';
import { SectionFrame } from '../parts/SectionFrame';
import { SectionDrawing } from '../SectionDrawing';

interface Boundary {
  zone: ZoneName;
  name: string;
  value: Distance | 'avoid contact' | null;
  note: string;
  citation: CitationData | readonly CitationData[] | undefined;
}

function useBoundaries(): Boundary[] {
  const words = useMessages().worksheet;
  const { assessment, content } = useWorksheetForm();
  const units = useUnits();
  const { boundaries, arcFlash, barricade } = assessment;
  if (boundaries === null || !boundaries.inTable) return [];
  const inside = (content.crew ?? [])
    .filter(({ closest }) => closest === 'restricted')
    .map(({ name }) => name ?? words.namelessMember);
  const limited = boundaries.movable ? boundaries.limitedMovable : boundaries.limitedFixed;
  const other = boundaries.movable ? boundaries.limitedFixed : boundaries.limitedMovable;
  return [
    {
      zone: 'restricted',
      name: words.boundary.restricted,
      value: boundaries.restricted,
      note: inside.length === 0 ? words.nobodyNamedInside : words.onlyInside(inside.join(', ')),
      citation: boundaries.citation,
    },
    {
      zone: 'limited',
      name: boundaries.movable ? words.boundary.limitedMovable : words.boundary.limitedFixed,
      value: limited,
      note:
        other === null
          ? ''
          : words.limitedOtherwise[boundaries.movable ? 'fixed' : 'movable'](
              distance(other, units),
            ),
      citation: boundaries.citation,
    },
    {
      zone: 'arcFlash',
      name: words.boundary.arcFlash,
      value: arcFlash.arcFlashBoundary,
      note: words.arcFlashNote[arcFlash.method],
      citation: arcFlash.citations,
    },
    {
      zone: 'barricade',
      name: words.boundary.barricade,
      value: barricade,
      note: words.barricadeNote,
      citation: barricade?.citation,
    },
  ];
}

function BoundaryRow({ zone, name, value, note, citation }: Boundary) {
  const words = useMessages().worksheet;
  const { colors } = useTheme();
  const units = useUnits();
  const figure =
    value === 'avoid contact'
      ? words.avoidContact
      : value === null
        ? words.noDistance
        : distancePair(value, units);
  return (
    <View role="listitem" style={[styles.row, { borderTopColor: colors.hair }]}>
      <ZoneSwatch zone={zone} />
      <View style={styles.words}>
        <Text variant="figureM">{figure}</Text>
        <Text variant="strong">{name}</Text>
        {note !== '' && <Text>{note}</Text>}
        {citation !== undefined && <Citation citation={citation} />}
      </View>
    </View>
  );
}

/** The distances that hold now, each with its source; none while the voltage is not known. */
export function BoundaryList() {
  const words = useMessages().worksheet;
  const { assessment } = useWorksheetForm();
  const boundaries = useBoundaries();
  if (assessment.boundaries === null)
    return <Text variant="answer">{words.distancesNotKnown}</Text>;
  if (!assessment.boundaries.inTable) return <Text variant="answer">{words.notInTable}</Text>;
  return (
    <View role="list">
      {boundaries.map((boundary) => (
        <BoundaryRow key={boundary.zone} {...boundary} />
      ))}
    </View>
  );
}

function ReadOnlyBoundaries() {
  const { content, assessment } = useWorksheetForm();
  const { isWide } = useBreakpoint();
  return (
    <>
      {!isWide && <SectionDrawing content={content} assessment={assessment} />}
      <BoundaryList />
    </>
  );
}

/** 6. How close anyone may come while it is not proved dead. */
export function BoundariesSection() {
  const words = useMessages().worksheet;
  const { content, assessment } = useWorksheetForm();
  const { isWide } = useBreakpoint();
  return (
    <SectionFrame
      section="boundaries"
      readOnly={<ReadOnlyBoundaries />}
      folded={<BoundaryList />}
      state={assessment.boundaries === null ? 'waits' : undefined}
      detail={assessment.boundaries === null ? words.waitsForSupply : words.followsSupply}
    >
      <FieldChoice name="supply.exposure" values={EXPOSURES} group="exposure" />
      <FieldYesNo name="supply.movableConductors" yes={words.yesMovable} no={words.noFixed} />
      {!isWide && <SectionDrawing content={content} assessment={assessment} />}
      <BoundaryList />
    </SectionFrame>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', gap: space.sm, paddingVertical: space.sm, borderTopWidth: 1 },
  words: { flex: 1, minWidth: 0, gap: 2 },
});
