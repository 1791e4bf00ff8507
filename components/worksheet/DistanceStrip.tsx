import { useMemo, useState } from 'react';
import { Pressable, StyleSheet, View, type LayoutChangeEvent } from 'react-native';
import type { WorksheetContent } from '@/hazard/content';
import type { Assessment } from '@/hazard/types';
import { stripGeometry, stripScale, STRIP_HEIGHT } from '@/shared/drawing/strip';
import { distanceLines, voltageLine, zonesOfWorksheet } from '@/shared/drawing/worksheetDrawing';
import { useLocale, useUnits } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { rule } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Icon } from '../ui/Icon';
import { Text } from '../ui/Text';
import { webProps } from '../ui/webProps';
import { DrawingView } from './DrawingView';
import { useSlide } from './useSlide';

interface Props {
  content: WorksheetContent;
  assessment: Pick<Assessment, 'boundaries' | 'arcFlash' | 'barricade'>;
  /** Whether the drawing that the strip opens is shown. */
  open: boolean;
  onPress: () => void;
  /** The id of the drawing. */
  controls?: string;
}

/** What is worked out and drawn depends on nothing else than these. */
export function useDrawingSubject(
  content: WorksheetContent,
  assessment: Pick<Assessment, 'boundaries' | 'arcFlash' | 'barricade'>,
) {
  const messages = useMessages();
  const locale = useLocale();
  const units = useUnits();
  return useMemo(
    () => ({ content, assessment, messages, locale, units }),
    [content, assessment, messages, locale, units],
  );
}

/**
 * The distances from the exposed part, to scale and always in view. The whole
 * strip is one button; a screen reader hears every boundary in words.
 */
export function DistanceStrip({ content, assessment, open, onPress, controls }: Props) {
  const subject = useDrawingSubject(content, assessment);
  const { messages, units } = subject;
  const { colors } = useTheme();
  const [width, setWidth] = useState(0);
  const handleLayout = (event: LayoutChangeEvent) => {
    setWidth(Math.floor(event.nativeEvent.layout.width));
  };
  const target = useMemo(() => zonesOfWorksheet(subject), [subject]);
  const { zones } = useSlide(target);
  const drawing = useMemo(() => {
    if (width === 0) return null;
    // The ruler jumps to the new scale at once; only the boundaries slide along it.
    return stripGeometry({ zones, units, width, pixelsPerFoot: stripScale(target, width) });
  }, [zones, target, units, width]);

  const words = messages.drawing;
  const voltage = voltageLine(subject);
  const label = [
    open ? words.stripLabelOpen : words.stripLabel,
    voltage.volts === null ? `${voltage.rest}.` : `${voltage.volts} ${voltage.rest}.`,
    ...distanceLines(subject),
  ].join(' ');

  return (
    <Pressable
      role="button"
      onPress={onPress}
      aria-label={label}
      aria-expanded={open}
      {...(controls !== undefined && webProps({ 'aria-controls': controls }))}
      style={[styles.strip, { backgroundColor: colors.paper, borderColor: colors.ink }]}
    >
      <View aria-hidden style={styles.head}>
        <Text variant="label" numberOfLines={1} style={styles.voltage} color="ink2" weight="400">
          {voltage.volts !== null && (
            <Text variant="label" weight="700">
              {voltage.volts}{' '}
            </Text>
          )}
          {voltage.rest}
        </Text>
        <View style={styles.action}>
          <Text variant="label" weight="600" color="blue">
            {words.open}
          </Text>
          <Icon name={open ? 'up' : 'down'} color="blue" size={20} />
        </View>
      </View>
      <View aria-hidden onLayout={handleLayout} style={styles.picture}>
        {drawing && <DrawingView drawing={drawing} />}
      </View>
    </Pressable>
  );
}

const styles = StyleSheet.create({
  strip: {
    height: 164,
    paddingHorizontal: 16,
    paddingTop: 10,
    borderTopWidth: rule.strong,
    borderBottomWidth: rule.strong,
  },
  head: { height: 28, flexDirection: 'row', alignItems: 'center', gap: 12 },
  voltage: { flex: 1 },
  action: { flexDirection: 'row', alignItems: 'center', gap: 6 },
  picture: { height: STRIP_HEIGHT, overflow: 'hidden', alignSelf: 'stretch' },
});
