import { useEffect, useId, useRef } from 'react';
import { View } from 'react-native';
import Canvas, { type SignatureViewRef } from 'react-native-signature-canvas';
import { z } from 'zod';
import { useTheme } from '../theme/useTheme';
import { useMessages } from '../i18n/useMessages';
import { Field } from './Field';
import { PadFoot, PAD_HEIGHT, PAD_LINE, padFrame } from './SignaturePadFoot';
import { cleanStrokes, type SignaturePadProps } from './SignaturePadProps';

const dataSchema = z.array(
  z.looseObject({ points: z.array(z.looseObject({ x: z.number(), y: z.number() })) }),
);

/** The page inside the view: no buttons and no frame of its own. */
const PAGE_STYLE =
  '.m-signature-pad{box-shadow:none;border:none;margin:0}.m-signature-pad--footer{display:none}body,html{background:transparent}';

/** A pad for a drawn signature: finger or pen. */
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
  const { colors } = useTheme();
  const { ui } = useMessages();
  const canvas = useRef<SignatureViewRef>(null);
  const empty = value.length === 0;
  useEffect(() => {
    if (empty) canvas.current?.clearSignature();
  }, [empty]);

  function handleData(json: string) {
    const groups = dataSchema.safeParse(JSON.parse(json));
    if (!groups.success) return;
    onChange(
      cleanStrokes(
        groups.data.map(({ points }) => points.map(({ x, y }): [number, number] => [x, y])),
      ),
    );
  }

  return (
    <Field id={rest.id ?? generated} label={label ?? ui.signaturePad} hint={hint} error={error}>
      <View style={[padFrame.box, { borderColor: colors.blue, backgroundColor: colors.field }]}>
        <View style={{ height: PAD_HEIGHT }}>
          <Canvas
            ref={canvas}
            onEnd={() => canvas.current?.getData()}
            onGetData={handleData}
            penColor={colors.ink}
            backgroundColor="rgba(0,0,0,0)"
            minWidth={1.3}
            maxWidth={1.3}
            webStyle={PAGE_STYLE}
          />
        </View>
        <View
          pointerEvents="none"
          style={[padFrame.line, { bottom: PAD_LINE, backgroundColor: colors.ink }]}
        />
        <PadFoot name={name} time={time} empty={empty} onClear={() => onChange([])} />
      </View>
    </Field>
  );
}
