import { useEffect, useId, useRef, type CSSProperties } from 'react';
import Pad from 'signature_pad';
import { useTheme } from '../theme/useTheme';
import { Field, fieldAria } from './Field';
import { PadFoot, PAD_HEIGHT, PAD_LINE, padFrame } from './SignaturePadFoot';
import type { SignaturePadProps, StrokeList } from './SignaturePadProps';
import { cleanStrokes } from './SignaturePadProps';
import { View } from 'react-native';
import { useMessages } from '../i18n/useMessages';

/** The pad takes half the width of a stroke: 2.6 px in all. */
const STROKE = 1.3;
const canvasStyle: CSSProperties = {
  position: 'absolute',
  inset: 0,
  touchAction: 'none',
  cursor: 'crosshair',
};

const same = (a: StrokeList, b: StrokeList) => JSON.stringify(a) === JSON.stringify(b);

function redraw(pad: Pad, strokes: StrokeList, ink: string) {
  pad.fromData(
    strokes.map((stroke) => ({
      penColor: ink,
      dotSize: STROKE,
      minWidth: STROKE,
      maxWidth: STROKE,
      velocityFilterWeight: 0.7,
      compositeOperation: 'source-over' as const,
      points: stroke.map(([x, y], index) => ({ x, y, time: index * 16, pressure: 0.5 })),
    })),
    { clear: true },
  );
}

/** A pad for a drawn signature: finger, pen or mouse. */
export function SignaturePad({
  value,
  onChange,
  name,
  time,
  label,
  hint,
  error,
  ...rest
}: SignaturePadProps) {
  const generated = useId();
  const id = rest.id ?? generated;
  const { colors } = useTheme();
  const { ui } = useMessages();
  const canvas = useRef<HTMLCanvasElement>(null);
  const pad = useRef<Pad | null>(null);
  const latest = useRef({ value, onChange });
  useEffect(() => {
    latest.current = { value, onChange };
  });

  useEffect(() => {
    const element = canvas.current;
    if (element === null || element.getContext('2d') === null) return undefined;
    const made = new Pad(element, {
      minWidth: STROKE,
      maxWidth: STROKE,
      dotSize: STROKE,
      penColor: colors.ink,
    });
    pad.current = made;
    // A canvas is as sharp as its pixels: it follows the size of its box and of the screen's pixels.
    const fit = () => {
      const ratio = Math.max(window.devicePixelRatio || 1, 1);
      element.width = element.offsetWidth * ratio;
      element.height = element.offsetHeight * ratio;
      element.getContext('2d')?.scale(ratio, ratio);
      redraw(made, latest.current.value, colors.ink);
    };
    fit();
    const read = () => {
      const strokes = made
        .toData()
        .map((group) => group.points.map(({ x, y }): [number, number] => [x, y]));
      latest.current.onChange(cleanStrokes(strokes));
    };
    made.addEventListener('endStroke', read);
    const watcher = typeof ResizeObserver === 'undefined' ? undefined : new ResizeObserver(fit);
    watcher?.observe(element);
    return () => {
      watcher?.disconnect();
      made.removeEventListener('endStroke', read);
      made.off();
      pad.current = null;
    };
  }, [colors.ink]);

  useEffect(() => {
    const drawn = pad.current;
    if (drawn === null) return;
    const shown = cleanStrokes(
      drawn.toData().map((g) => g.points.map(({ x, y }): [number, number] => [x, y])),
    );
    if (!same(shown, value)) redraw(drawn, value, colors.ink);
  }, [value, colors.ink]);

  return (
    <Field id={id} label={label ?? ui.signaturePad} hint={hint} error={error}>
      <View style={[padFrame.box, { borderColor: colors.blue, backgroundColor: colors.field }]}>
        <View style={[padFrame.line, { bottom: PAD_LINE, backgroundColor: colors.ink }]} />
        <canvas
          ref={canvas}
          id={id}
          tabIndex={-1}
          role="img"
          aria-labelledby={fieldAria(id, {})['aria-labelledby']}
          aria-description={value.length > 0 ? ui.signatureDrawn : ui.signatureHint}
          style={{ ...canvasStyle, width: '100%', height: PAD_HEIGHT }}
        />
        <PadFoot name={name} time={time} empty={value.length === 0} onClear={() => onChange([])} />
      </View>
    </Field>
  );
}
