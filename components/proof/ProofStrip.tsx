import { useState } from 'react';
import { StyleSheet, View, type ViewStyle } from 'react-native';
import type { WorksheetRecord } from '@/shared/record';
import { rule, space } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { DistanceStrip } from '../worksheet/DistanceStrip';
import { SectionDrawing } from '../worksheet/SectionDrawing';

/** React Native's types do not know `sticky`; elsewhere than on the web the strip scrolls along. */
const web = (style: object): ViewStyle => style;

/** The distances stay in view until it is proved dead; pressed, the strip unfolds into the drawing. */
export function ProofStrip({ record }: { record: WorksheetRecord }) {
  const { content, assessment } = record;
  const [open, setOpen] = useState(false);
  const { margin } = useBreakpoint();
  const { colors } = useTheme();
  const ground = { backgroundColor: colors.paper };
  return (
    <View style={[styles.strip, ground, { marginHorizontal: -margin }]}>
      <DistanceStrip
        content={content}
        assessment={assessment}
        open={open}
        onPress={() => setOpen(!open)}
        controls="proof-drawing"
      />
      {open && (
        <View
          style={[
            styles.unfolded,
            ground,
            { borderBottomColor: colors.ink, paddingHorizontal: margin },
          ]}
        >
          <SectionDrawing id="proof-drawing" content={content} assessment={assessment} />
        </View>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  strip: web({ position: 'sticky', top: 0, zIndex: 2 }),
  unfolded: web({
    borderBottomWidth: rule.strong,
    paddingBottom: space.sm,
    maxHeight: 'calc(100vh - 244px)',
    overflowY: 'auto',
  }),
});
