import { useMemo, useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { assess } from '@/hazard';
import type { Citation as CitationData, Distance } from '@/hazard/types';
import { sectionGeometry } from '@/shared/drawing/section';
import { frameOf } from '@/shared/drawing/sectionFrame';
import { distanceLines, sectionInputOf } from '@/shared/drawing/worksheetDrawing';
import { distance } from '@/shared/format';
import { useUnits } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { Citation, Text } from '../ui';
import { useDrawingSubject } from '../worksheet/DistanceStrip';
import { DrawingView } from '../worksheet/DrawingView';
import { ZoneSwatch, type ZoneName } from '../worksheet/parts/ZoneSwatch';
import { EXAMPLE_DAY, exampleWorksheet } from './exampleWorksheet';

/** Large where the window has room below it. */
const PIXELS_PER_FOOT = { high: 36, low: 32 } as const;
const HIGH_WINDOW = 900;
const WIDEST = 520;

interface Line {
  zone: ZoneName;
  name: string;
  pair: Distance;
}

/** Assessed like any worksheet: the figures beside the sign-in are never typed in. */
function useExample() {
  const { account } = useMessages();
  return useMemo(() => {
    const assessment = assess(exampleWorksheet, { on: EXAMPLE_DAY });
    const { boundaries, arcFlash, barricade } = assessment;
    const lines: Line[] = [];
    const citations: CitationData[] = [];
    if (boundaries?.inTable) {
      const { restricted, limitedFixed } = boundaries;
      if (restricted !== null && restricted !== 'avoid contact') {
        lines.push({ zone: 'restricted', name: account.figure.restricted, pair: restricted });
      }
      if (limitedFixed)
        lines.push({ zone: 'limited', name: account.figure.limited, pair: limitedFixed });
      citations.push(boundaries.citation);
    }
    if (arcFlash.arcFlashBoundary) {
      lines.push({
        zone: 'arcFlash',
        name: account.figure.arcFlash,
        pair: arcFlash.arcFlashBoundary,
      });
      // Of all that likelihood and clothing rest on, only the table that the distance is from.
      citations.push(...arcFlash.citations.filter(({ table }) => table.includes('(C)(15)(a)')));
    }
    if (barricade)
      lines.push({ zone: 'barricade', name: account.figure.barricade, pair: barricade });
    return { assessment, lines, citations };
  }, [account]);
}

/** The section of the example, without the rows below its floor: the legend beside it has the figures. */
function Section({ assessment }: Pick<ReturnType<typeof useExample>, 'assessment'>) {
  const subject = useDrawingSubject(exampleWorksheet, assessment);
  const { height } = useBreakpoint();
  const [width, setWidth] = useState(0);
  const made = useMemo(() => {
    if (width === 0) return null;
    const input = sectionInputOf(subject, {
      width,
      pixelsPerFoot: height >= HIGH_WINDOW ? PIXELS_PER_FOOT.high : PIXELS_PER_FOOT.low,
      medium: 'screen',
    });
    return { drawing: sectionGeometry(input), floor: frameOf(input).floor };
  }, [subject, width, height]);
  const label = [`${subject.messages.drawing.drawingLabel}.`, ...distanceLines(subject)].join(' ');
  return (
    <View
      role="img"
      aria-label={label}
      onLayout={(event) => setWidth(Math.floor(Math.min(WIDEST, event.nativeEvent.layout.width)))}
      style={[styles.section, { height: made === null ? 360 : made.floor + 3 }]}
    >
      {made && (
        // Its own height, or the browser would shrink the whole drawing into the part that is shown.
        <View style={{ height: made.drawing.height, flexShrink: 0 }}>
          <DrawingView drawing={made.drawing} />
        </View>
      )}
    </View>
  );
}

/** What the tool is about, in one picture: the distances around a part that counts as live. */
export function ExampleFigure() {
  const { account } = useMessages();
  const units = useUnits();
  const { colors } = useTheme();
  const { assessment, lines, citations } = useExample();
  return (
    <View style={styles.all}>
      <View style={styles.figure}>
        <Section assessment={assessment} />
        <View style={styles.legend}>
          <Text variant="value">{account.figure.title}</Text>
          {lines.map(({ zone, name, pair }) => (
            <View key={zone} style={[styles.line, { borderTopColor: colors.hair }]}>
              <ZoneSwatch zone={zone} />
              <View>
                <Text variant="signal" style={styles.distance}>
                  {distance(pair, units)}
                </Text>
                <Text variant="note">{name}</Text>
              </View>
            </View>
          ))}
        </View>
      </View>
      <Citation lead={account.figure.example} citation={citations} />
    </View>
  );
}

const styles = StyleSheet.create({
  all: { gap: space.sm },
  figure: { flexDirection: 'row', alignItems: 'flex-start', gap: space.xl },
  section: { flex: 1, minWidth: 0, overflow: 'hidden' },
  legend: { width: 200 },
  line: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.sm,
    borderTopWidth: 1,
    marginTop: space.xs,
    paddingTop: space.xs,
  },
  distance: { fontSize: 22, lineHeight: 26 },
});
