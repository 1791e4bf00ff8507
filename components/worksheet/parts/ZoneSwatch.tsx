import { useMemo } from 'react';
import { View } from 'react-native';
import { barricadeStripes, fillZone, type ZoneRole } from '@/shared/drawing/hatch';
import { rectanglePath, type Drawing, type Primitive } from '@/shared/drawing/primitives';
import { DrawingView } from '../DrawingView';

export type ZoneName = ZoneRole | 'barricade';

const SIZE = 34;

function swatch(zone: ZoneName): Drawing {
  const box = { left: 1, top: 1, right: SIZE - 1, bottom: SIZE - 1 };
  const frame: Primitive = { kind: 'path', d: rectanglePath(box), stroke: 'ink', width: 1.6 };
  const inside: Primitive[] =
    zone === 'barricade'
      ? barricadeStripes({ left: 11, top: 1.5, right: 23, bottom: SIZE - 1.5 })
      : [fillZone(zone, { box })];
  return { width: SIZE, height: SIZE, pixelsPerFoot: 0, primitives: [...inside, frame] };
}

/** The hatch of a zone, as the strip and the drawing have it; its name always stands beside it. */
export function ZoneSwatch({ zone }: { zone: ZoneName }) {
  const drawing = useMemo(() => swatch(zone), [zone]);
  return (
    <View aria-hidden style={{ width: SIZE, height: SIZE }}>
      <DrawingView drawing={drawing} />
    </View>
  );
}
