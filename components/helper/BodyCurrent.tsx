import { useMemo, useState } from 'react';
import { StyleSheet, View, type LayoutChangeEvent } from 'react-native';
import type { Assessment } from '@/hazard';
import { number, volts } from '@/shared/format';
import {
  rectanglePath,
  type Drawing,
  type Primitive,
  type Role,
} from '@/shared/drawing/primitives';
import { textWidth } from '@/shared/drawing/textWidth';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { Citation, Text } from '../ui';
import { DrawingView } from '../worksheet/DrawingView';

interface Bar {
  from: number;
  to: number;
  text: string;
  role: Role;
  strong?: boolean;
}

/** mA; the ruler is logarithmic, since each effect begins at about ten times the one before. */
const AXIS = { from: 1, to: 1000 } as const;
const ROW = 30;
const BAR = 18;
const GAP = 8;
const TEXT = 16;

function chart(bars: readonly Bar[], width: number): Drawing {
  const left = 2;
  const right = width - 2;
  const span = Math.log10(AXIS.to / AXIS.from);
  const at = (milliamperes: number) => {
    const held = Math.min(Math.max(milliamperes, AXIS.from), AXIS.to);
    return left + ((right - left) * Math.log10(held / AXIS.from)) / span;
  };
  const foot = bars.length * ROW + 6;
  const primitives: Primitive[] = bars.flatMap((bar, index): Primitive[] => {
    const top = index * ROW + (ROW - BAR) / 2;
    const x2 = Math.min(Math.max(at(bar.to), at(bar.from) + 6), right);
    const x1 = Math.min(at(bar.from), right - 6);
    const weight = bar.strong === true ? 700 : 500;
    const fits = x2 + GAP + textWidth(bar.text, TEXT, weight) <= width;
    const room = fits ? width : x1 - GAP;
    const size = Math.min(TEXT, (TEXT * room) / textWidth(bar.text, TEXT, weight));
    return [
      {
        kind: 'path',
        d: rectanglePath({ left: x1, top, right: x2, bottom: top + BAR }),
        fill: bar.role,
      },
      {
        kind: 'text',
        x: fits ? x2 + GAP : x1 - GAP,
        y: top + BAR - 4,
        text: bar.text,
        size,
        weight,
        anchor: fits ? 'start' : 'end',
        role: 'ink',
        halo: 0,
      },
    ];
  });
  primitives.push({
    kind: 'path',
    d: `M${left} ${foot}H${right}`,
    stroke: 'ink',
    width: 2,
  });
  for (let decade = 1; decade <= AXIS.to; decade *= 10) {
    for (let step = 1; step < 10 && decade * step <= AXIS.to; step += 1) {
      const x = at(decade * step);
      primitives.push({
        kind: 'path',
        d: `M${x} ${foot}V${foot + (step === 1 ? 12 : 6)}`,
        stroke: 'ink',
        width: 1.2,
      });
    }
    primitives.push({
      kind: 'text',
      x: at(decade),
      y: foot + 27,
      text: decade === 1000 ? '1000 mA' : String(decade),
      size: 15,
      weight: 500,
      anchor: decade === 1 ? 'start' : decade === AXIS.to ? 'end' : 'middle',
      role: 'note',
      halo: 0,
    });
  }
  return { width, height: foot + 32, pixelsPerFoot: 0, primitives };
}

/** What a current does, and which current would flow here: OSHA's effects beside it. */
export function BodyCurrent({ touch }: { touch: NonNullable<Assessment['touch']> }) {
  const words = useMessages().helper;
  const locale = useLocale();
  const [width, setWidth] = useState(0);
  const low = number(locale, touch.p95, 0);
  const high = number(locale, touch.p5, 0);
  const bars = useMemo(
    (): Bar[] => [
      { from: 4.7, to: 5.3, text: words.effect.slight, role: 'ink' },
      // From 6 mA (women): the first value at which anybody can no longer let go.
      { from: 6, to: 30, text: words.effect.letGo, role: 'ink' },
      { from: 50, to: 150, text: words.effect.breathing, role: 'ink' },
      // It goes on past the end of the ruler.
      { from: 1000, to: AXIS.to, text: words.effect.heart, role: 'ink' },
      { from: touch.p95, to: touch.p5, text: words.here(low, high), role: 'exposed', strong: true },
    ],
    [words, touch.p95, touch.p5, low, high],
  );
  const drawing = useMemo(() => (width === 0 ? null : chart(bars, width)), [bars, width]);
  const handleLayout = (event: LayoutChangeEvent) =>
    setWidth(Math.floor(event.nativeEvent.layout.width));
  return (
    <View style={styles.box}>
      <Text variant="strong" level={3}>
        {words.current}
      </Text>
      <View
        role="img"
        aria-label={[words.current, ...bars.map(({ text }) => text)].join('. ')}
        onLayout={handleLayout}
        style={styles.chart}
      >
        {drawing && <DrawingView drawing={drawing} />}
      </View>
      <Text variant="label" weight="400" color="ink2">
        {words.currentBasis(volts(locale, touch.volts), low, high)}
      </Text>
      <Citation citation={touch.citation} lead={words.effects} />
    </View>
  );
}

const styles = StyleSheet.create({
  box: { gap: space.xs, paddingTop: space.xs },
  chart: { minHeight: 5 * ROW + 38 },
});
