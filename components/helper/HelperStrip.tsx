import { useMemo, useState } from 'react';
import { StyleSheet, View, type LayoutChangeEvent } from 'react-native';
import type { Units } from '@/shared/user';
import type { WorksheetRecord } from '@/shared/record';
import { rectanglePath, type Drawing, type Primitive } from '@/shared/drawing/primitives';
import { stripGeometry, stripScale } from '@/shared/drawing/strip';
import { textWidth } from '@/shared/drawing/textWidth';
import { distanceLines, zonesOfWorksheet } from '@/shared/drawing/worksheetDrawing';
import type { ZoneSet } from '@/shared/drawing/zones';
import { DrawingView } from '../worksheet/DrawingView';
import { useDrawingSubject } from '../worksheet/DistanceStrip';
import type { Closeness } from './brief';

const METRES_PER_FOOT = 0.3048;
/** Where the ruler begins, and the foot of its lanes: as the strip draws them. */
const ORIGIN = 3;
const LANES_FOOT = 82;
const LABEL = 15;

/** A person of lines, 32 high, standing on the ruler. */
function person(x: number): Primitive[] {
  const foot = LANES_FOOT - 1;
  return [
    {
      kind: 'path',
      d: rectanglePath({ left: x - 10, top: foot - 35, right: x + 10, bottom: foot }),
      fill: 'ground',
    },
    { kind: 'circle', cx: x, cy: foot - 28, r: 4.5, fill: 'ink' },
    {
      kind: 'path',
      d: `M${x} ${foot - 23}V${foot - 10}M${x - 7} ${foot - 17}H${x + 7}M${x - 6} ${foot}L${x} ${foot - 10}L${x + 6} ${foot}`,
      stroke: 'ink',
      width: 2.4,
    },
  ];
}

function feetOf({ figure }: Closeness, units: Units): number {
  if (figure === null) return 0;
  return units === 'metric' ? figure.metres / METRES_PER_FOOT : figure.inches / 12;
}

interface Placed {
  zones: ZoneSet;
  units: Units;
  width: number;
  closeness: Closeness;
  you: string;
}

/** The distance strip with the reader in it, outside what they keep out of. */
function helperStrip({ zones, units, width, closeness, you }: Placed): Drawing {
  const label = textWidth(you, LABEL, 700);
  // Room at the right for the reader: beyond the barricade's name and clear of the last figure.
  const pixelsPerFoot = stripScale(zones, width - label - 34);
  const strip = stripGeometry({ zones, units, width, pixelsPerFoot });
  const at = ORIGIN + feetOf(closeness, units) * pixelsPerFoot;
  const barricade = zones.barricade;
  const beyond =
    barricade !== null && closeness.kind === 'barricade'
      ? at + 18 + textWidth(barricade.name, LABEL, 600) + 22
      : at + 16;
  const x = Math.min(Math.max(beyond, 14), width - label - 16);
  const named: Primitive = {
    kind: 'text',
    x: x + 14,
    y: LANES_FOOT - 12,
    text: you,
    size: LABEL,
    weight: 700,
    anchor: 'start',
    role: 'ink',
    halo: 4,
  };
  const shown = closeness.kind === 'barricade' ? [...person(x), named] : person(x);
  return { ...strip, primitives: [...strip.primitives, ...shown] };
}

/** The distances to scale, with the reader where they stay; a screen reader hears them in words. */
export function HelperStrip({
  record,
  closeness,
  label,
}: {
  record: WorksheetRecord;
  closeness: Closeness;
  label: string;
}) {
  const subject = useDrawingSubject(record.content, record.assessment);
  const [width, setWidth] = useState(0);
  const { units, messages } = subject;
  const you = messages.helper.you;
  const drawing = useMemo(() => {
    if (width === 0) return null;
    const zones = zonesOfWorksheet(subject);
    if (zones.message !== null) return stripGeometry({ zones, units, width });
    return helperStrip({ zones, units, width, closeness, you });
  }, [subject, units, width, closeness, you]);
  return (
    <View
      role="img"
      aria-label={[label, ...distanceLines(subject)].join(' ')}
      onLayout={(event: LayoutChangeEvent) => setWidth(Math.floor(event.nativeEvent.layout.width))}
      style={styles.strip}
    >
      {drawing && <DrawingView drawing={drawing} />}
    </View>
  );
}

const styles = StyleSheet.create({ strip: { minHeight: 114, overflow: 'hidden' } });
