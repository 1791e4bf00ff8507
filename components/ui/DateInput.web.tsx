import type { CSSProperties } from 'react';
import { radius, rule, touch } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';

export interface DateInputProps {
  kind: 'date' | 'time';
  id: string;
  value: string;
  onChange: (value: string) => void;
  min?: string;
  max?: string;
  label: string;
  labelledBy?: string;
  describedBy?: string;
  invalid?: boolean;
  disabled?: boolean;
}

/** The browser's own date or time control: it knows the person's calendar and keyboard. */
export function DateInput(props: DateInputProps) {
  const { colors } = useTheme();
  const style: CSSProperties = {
    boxSizing: 'border-box',
    width: '100%',
    minWidth: 0,
    minHeight: touch.control,
    padding: '0 12px',
    border: `${rule.middle}px solid ${props.disabled ? colors.ink2 : colors.blue}`,
    borderRadius: radius.control,
    background: colors.field,
    color: colors.ink,
    font: '600 19px/26px Barlow, sans-serif',
    fontVariantNumeric: 'tabular-nums',
    appearance: 'none',
    margin: 0,
  };
  return (
    <input
      type={props.kind}
      id={props.id}
      value={props.value}
      min={props.min}
      max={props.max}
      disabled={props.disabled}
      aria-label={props.labelledBy === undefined ? props.label : undefined}
      aria-labelledby={props.labelledBy}
      aria-describedby={props.describedBy}
      aria-invalid={props.invalid === true ? true : undefined}
      onChange={(event) => props.onChange(event.target.value)}
      style={style}
    />
  );
}
