import { useId, useState } from 'react';
import { useMessages } from '../i18n/useMessages';
import { parseNumber } from './parseNumber';
import { TextField, type TextFieldProps } from './TextField';

export interface NumberFieldProps extends Omit<
  TextFieldProps,
  'value' | 'onChangeText' | 'secure' | 'multiline'
> {
  value: number | undefined;
  /** `undefined` while the field is empty or what stands in it is not a number. */
  onChange: (value: number | undefined) => void;
  /** Told whether what was typed can be used; a form may not go on while it cannot. */
  onValidity?: (valid: boolean) => void;
  /** What stood in the field, though no number, when it was last shown. */
  initialText?: string;
  /** Told every text, so that a form can keep what is no number as well. */
  onText?: (text: string, value: number | undefined) => void;
  min?: number;
  max?: number;
  whole?: boolean;
}

/**
 * A figure. What was typed stays as typed; text that is no number gives an
 * error beside the field and counts as not answered, never as the old figure.
 */
export function NumberField({
  value,
  onChange,
  onValidity,
  initialText,
  onText,
  min,
  max,
  whole,
  ...rest
}: NumberFieldProps) {
  const { ui } = useMessages();
  const generated = useId();
  const [typed, setTyped] = useState(value === undefined ? (initialText ?? '') : String(value));

  const [given, setGiven] = useState(value);
  const [told, setTold] = useState(value);
  // A figure set from outside (another device, a copy) replaces what was typed; the echo of
  // one's own typing does not.
  if (value !== given) {
    setGiven(value);
    if (value !== told) {
      setTold(value);
      setTyped(value === undefined ? '' : String(value));
    }
  }

  function fault(text: string): string | undefined {
    const result = parseNumber(text);
    if (result.kind === 'empty') return undefined;
    if (result.kind === 'text') return ui.notANumber(text.trim());
    if (whole === true && !Number.isInteger(result.value)) return ui.notWhole;
    if (min !== undefined && result.value < min) return ui.tooSmall(min);
    if (max !== undefined && result.value > max) return ui.tooLarge(max);
    return undefined;
  }

  function handleChange(text: string) {
    setTyped(text);
    const result = parseNumber(text);
    const valid = fault(text) === undefined;
    const next = valid && result.kind === 'number' ? result.value : undefined;
    setTold(next);
    onValidity?.(valid);
    onChange(next);
    onText?.(text, next);
  }

  return (
    <TextField
      {...rest}
      id={rest.id ?? generated}
      exact
      inputMode={whole === true ? 'numeric' : 'decimal'}
      value={typed}
      onChangeText={handleChange}
      error={fault(typed) ?? rest.error}
    />
  );
}
