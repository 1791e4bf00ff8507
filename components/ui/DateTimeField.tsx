import { useId, useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { fromWallClock, toWallClock } from '@/shared/siteTime';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { DateInput } from './DateInput';
import { Field, fieldAria, type FieldProps } from './Field';
import { Text } from './Text';

const DATE = /^(\d{4})-(\d{2})-(\d{2})$/;
const TIME = /^(\d{2}):(\d{2})/;
const two = (figure: number) => String(figure).padStart(2, '0');

/** The parts of a typed date that exists in the calendar. */
function dateParts(typed: string): { year: number; month: number; day: number } | undefined {
  const match = DATE.exec(typed);
  if (match === null) return undefined;
  const [year, month, day] = match.slice(1).map(Number) as [number, number, number];
  const real = new Date(Date.UTC(year, month - 1, day));
  return real.getUTCMonth() === month - 1 && real.getUTCDate() === day
    ? { year, month, day }
    : undefined;
}

function timeParts(typed: string): { hour: number; minute: number } | undefined {
  const match = TIME.exec(typed);
  if (match === null) return undefined;
  const [hour, minute] = match.slice(1).map(Number) as [number, number];
  return hour < 24 && minute < 60 ? { hour, minute } : undefined;
}

export interface DateFieldProps extends FieldProps {
  id?: string;
  /** `YYYY-MM-DD`. */
  value: string | undefined;
  onChange: (value: string | undefined) => void;
  min?: string;
  max?: string;
}

/** A calendar date without a time. */
export function DateField({ value, onChange, min, max, ...props }: DateFieldProps) {
  const generated = useId();
  const id = props.id ?? generated;
  const { ui } = useMessages();
  const [typed, setTyped] = useState(value ?? '');
  const shown = value ?? typed;
  const error = shown !== '' && dateParts(shown) === undefined ? ui.notADate : props.error;
  const aria = fieldAria(id, { hint: props.hint, error });
  return (
    <Field {...props} id={id} error={error}>
      <DateInput
        kind="date"
        id={id}
        value={shown}
        min={min}
        max={max}
        label={props.label}
        labelledBy={aria['aria-labelledby']}
        describedBy={aria['aria-describedby']}
        invalid={error !== undefined}
        onChange={(next) => {
          setTyped(next);
          onChange(dateParts(next) === undefined ? undefined : next);
        }}
      />
    </Field>
  );
}

export interface DateTimeFieldProps extends FieldProps {
  id?: string;
  /** ISO 8601 with offset. */
  value: string | undefined;
  onChange: (value: string | undefined) => void;
  /** IANA zone of the site: the wall clock that is typed and shown. */
  timeZone: string;
  /** The zone as printed: EDT. */
  zoneName?: string;
}

/** A date and a time on the site's wall clock. */
export function DateTimeField({
  value,
  onChange,
  timeZone,
  zoneName,
  ...props
}: DateTimeFieldProps) {
  const generated = useId();
  const id = props.id ?? generated;
  const { ui } = useMessages();
  const [typed, setTyped] = useState({ date: '', time: '' });

  let shown = typed;
  if (value !== undefined) {
    const wall = toWallClock(value, timeZone);
    shown = {
      date: `${wall.year}-${two(wall.month)}-${two(wall.day)}`,
      time: `${two(wall.hour)}:${two(wall.minute)}`,
    };
  }

  function handleChange(next: { date: string; time: string }) {
    setTyped(next);
    const day = dateParts(next.date);
    const clock = timeParts(next.time);
    onChange(day && clock ? fromWallClock({ ...day, ...clock }, timeZone) : undefined);
  }

  const half = (shown.date === '') !== (shown.time === '');
  const fault =
    shown.date !== '' && dateParts(shown.date) === undefined
      ? ui.notADate
      : shown.time !== '' && timeParts(shown.time) === undefined
        ? ui.notATime
        : half
          ? ui.halfDateTime
          : undefined;
  const error = fault ?? props.error;
  const describedBy = fieldAria(id, { hint: props.hint, error })['aria-describedby'];
  const common = { describedBy, invalid: error !== undefined };
  return (
    <Field {...props} id={id} error={error}>
      <View role="group" aria-labelledby={`${id}-label`} style={styles.two}>
        <View style={styles.date}>
          <DateInput
            {...common}
            kind="date"
            id={id}
            label={`${props.label}, ${ui.date}`}
            value={shown.date}
            onChange={(date) => handleChange({ ...shown, date })}
          />
        </View>
        <View style={styles.time}>
          <DateInput
            {...common}
            kind="time"
            id={`${id}-time`}
            label={`${props.label}, ${ui.time}`}
            value={shown.time}
            onChange={(time) => handleChange({ ...shown, time })}
          />
        </View>
        {zoneName !== undefined && (
          <Text variant="label" color="ink2">
            {zoneName}
          </Text>
        )}
      </View>
    </Field>
  );
}

const styles = StyleSheet.create({
  two: { flexDirection: 'row', alignItems: 'center', gap: space.xs },
  date: { flex: 4, minWidth: 0 },
  time: { flex: 3, minWidth: 0 },
});
