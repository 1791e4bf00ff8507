import { useMemo, useState } from 'react';
import { StyleSheet, View, type LayoutChangeEvent } from 'react-native';
import type { WorksheetContent } from '@/hazard/content';
import type { Assessment } from '@/hazard/types';
import { sectionGeometry } from '@/shared/drawing/section';
import { distanceLines, sectionInputOf } from '@/shared/drawing/worksheetDrawing';
import { useBreakpoint } from '../theme/useBreakpoint';
import { DrawingView } from './DrawingView';
import { useDrawingSubject } from './DistanceStrip';

interface Props {
  content: WorksheetContent;
  assessment: Pick<Assessment, 'boundaries' | 'arcFlash' | 'barricade'>;
  id?: string;
}

/** px to the foot where everything fits. */
const SCALE = { phone: 33, wider: 35 } as const;
/** Wider than this the section gains nothing. */
const WIDEST = 560;

/** The section through the ceiling, to scale; a screen reader hears the distances in words. */
export function SectionDrawing({ content, assessment, id }: Props) {
  const subject = useDrawingSubject(content, assessment);
  const { isPhone } = useBreakpoint();
  const [width, setWidth] = useState(0);
  const handleLayout = (event: LayoutChangeEvent) => {
    setWidth(Math.floor(Math.min(WIDEST, event.nativeEvent.layout.width)));
  };
  const drawing = useMemo(() => {
    if (width === 0) return null;
    const pixelsPerFoot = isPhone ? SCALE.phone : SCALE.wider;
    return sectionGeometry(sectionInputOf(subject, { width, pixelsPerFoot, medium: 'screen' }));
  }, [subject, width, isPhone]);

  const label = [`${subject.messages.drawing.drawingLabel}.`, ...distanceLines(subject)].join(' ');
  return (
    <View
      id={id}
      role="img"
      aria-label={label}
      onLayout={handleLayout}
      style={[styles.drawing, { minHeight: drawing?.height ?? 120 }]}
    >
      {drawing && <DrawingView drawing={drawing} />}
    </View>
  );
}

const styles = StyleSheet.create({ drawing: { alignSelf: 'stretch', overflow: 'hidden' } });
