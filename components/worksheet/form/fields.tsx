import { useController } from 'react-hook-form';
import { parseDistance, typedDistance, zoneText } from '@/shared/format';
import { useUnits } from '../../i18n/preferences';
import { useMessages } from '../../i18n/useMessages';
import {
  Choice,
  DateField,
  DateTimeField,
  MultiChoice,
  NumberField,
  Select,
  TextField,
  YesNo,
  type Option,
} from '../../ui';
import { memo, useState } from 'react';
import { FieldFrame } from './FieldFrame';
import { faultWord, fieldId, hintOf, labelOf, wordOf, type EnumerationGroup } from './fieldWords';
import { useFieldState, useWorksheetForm } from './WorksheetFormContext';

interface Named {
  /** Dotted name of the field in the content. */
  name: string;
  /** Instead of the field's own label and hint. */
  label?: string;
  hint?: string;
}

/** What every bound field shares: its words, its value, whether it is still open, its error. */
function useBound({ name, label, hint }: Named) {
  const words = useMessages();
  const { fault, isOpen, isStopped } = useFieldState(name);
  const { field } = useController({ name });
  const value: unknown = field.value;
  return {
    words,
    value,
    isStopped,
    setValue: (next: unknown) => field.onChange(next),
    common: {
      id: fieldId(name),
      label: label ?? labelOf(words, name),
      hint: hint ?? hintOf(words, name),
      unanswered: isOpen,
      error: fault === undefined ? undefined : faultWord(words, fault.code),
    },
  };
}

interface TextProps extends Named {
  multiline?: boolean;
  /** For tags, numbers and names. */
  exact?: boolean;
  maxLength?: number;
}

function FieldTextBound({
  multiline,
  exact,
  maxLength = multiline === true ? 2000 : 200,
  ...named
}: TextProps) {
  const { value, setValue, common } = useBound(named);
  return (
    <FieldFrame name={named.name}>
      <TextField
        {...common}
        value={typeof value === 'string' ? value : ''}
        onChangeText={setValue}
        multiline={multiline}
        exact={exact}
        maxLength={maxLength}
      />
    </FieldFrame>
  );
}

interface NumberProps extends Named {
  unit?: string;
  min?: number;
  max?: number;
  whole?: boolean;
}

function FieldNumberBound({ unit, min = 0, max, whole, ...named }: NumberProps) {
  const { value, setValue, common } = useBound(named);
  // NumberField names the fault of its own text; the schema's word for the same would be said twice.
  return (
    <FieldFrame name={named.name}>
      <NumberField
        {...common}
        error={typeof value === 'string' ? undefined : common.error}
        unit={unit}
        min={min}
        max={max}
        whole={whole}
        value={typeof value === 'number' ? value : undefined}
        initialText={typeof value === 'string' ? value : undefined}
        onChange={() => undefined}
        onText={(text, number) => setValue(number ?? (text.trim() === '' ? undefined : text))}
      />
    </FieldFrame>
  );
}

/**
 * A length in the units of the person, kept in inches or feet, unrounded.
 * What cannot be read stays in the field and counts as not answered.
 */
function FieldDistanceBound({ keptIn, ...named }: Named & { keptIn: 'in' | 'ft' }) {
  const { value, setValue, common, words } = useBound(named);
  const units = useUnits();
  const inchesPer = keptIn === 'ft' ? 12 : 1;
  const bare = units === 'metric' ? 'm' : keptIn;
  const [typed, setTyped] = useState(() => {
    if (typeof value === 'number') return typedDistance(value * inchesPer, units);
    return typeof value === 'string' ? value : '';
  });
  const unreadable = typed.trim() !== '' && parseDistance(typed, bare) === null;
  return (
    <FieldFrame name={named.name}>
      <TextField
        {...common}
        error={unreadable ? words.worksheet.notADistance(typed.trim()) : common.error}
        exact
        unit={/[a-z'"′″]/i.test(typed) ? undefined : bare}
        value={typed}
        onChangeText={(text) => {
          setTyped(text);
          const inches = parseDistance(text, bare);
          if (inches !== null) setValue(inches / inchesPer);
          else setValue(text.trim() === '' ? undefined : text);
        }}
      />
    </FieldFrame>
  );
}

function FieldYesNoBound({ yes, no, ...named }: Named & { yes?: string; no?: string }) {
  const { value, setValue, common, isStopped } = useBound(named);
  const chosen = typeof value === 'boolean' ? value : undefined;
  return (
    <FieldFrame name={named.name}>
      <YesNo
        {...common}
        yes={yes}
        no={no}
        value={chosen}
        refused={isStopped ? chosen : undefined}
        onChange={setValue}
        onClear={() => setValue(undefined)}
      />
    </FieldFrame>
  );
}

export interface OneOfProps<T extends string | number> extends Named {
  values: readonly T[];
  /** Whose words the values have. */
  group?: EnumerationGroup;
  /** Words made by the section, where no group has them. */
  wordFor?: (value: T) => string;
  noteFor?: (value: T) => string | undefined;
  /** Told a choice, beside it being set: to clear what no longer fits. */
  onChosen?: (value: T | undefined) => void;
}

function useOptions<T extends string | number>(
  { values, group, wordFor, noteFor, name }: OneOfProps<T>,
  chosen: (value: T) => boolean,
): Option<T>[] {
  const words = useMessages();
  const { isStopped } = useFieldState(name);
  return values.map((value) => ({
    value,
    label:
      wordFor?.(value) ??
      (group === undefined ? String(value) : wordOf(words, group, String(value))),
    note: noteFor?.(value),
    refused: isStopped && chosen(value),
  }));
}

/** One of a few, all in view. */
function FieldChoiceBound<T extends string | number>(props: OneOfProps<T>) {
  const { value, setValue, common } = useBound(props);
  const options = useOptions(props, (option) => option === value);
  const choose = (next: T | undefined) => {
    setValue(next);
    props.onChosen?.(next);
  };
  return (
    <FieldFrame name={props.name}>
      <Choice<T>
        {...common}
        options={options}
        value={options.find((option) => option.value === value)?.value}
        onChange={choose}
        onClear={() => choose(undefined)}
      />
    </FieldFrame>
  );
}

/** One of many: folded until pressed. */
function FieldSelectBound<T extends string | number>(props: OneOfProps<T>) {
  const { value, setValue, common } = useBound(props);
  const options = useOptions(props, (option) => option === value);
  const choose = (next: T | undefined) => {
    setValue(next);
    props.onChosen?.(next);
  };
  return (
    <FieldFrame name={props.name}>
      <Select<T>
        {...common}
        options={options}
        value={options.find((option) => option.value === value)?.value}
        onChange={choose}
        onClear={() => choose(undefined)}
      />
    </FieldFrame>
  );
}

/** All that hold; `alone` are answers that exclude every other, such as "none of these". */
function FieldMultiBound<T extends string>({
  alone = [],
  ...props
}: OneOfProps<T> & { alone?: readonly T[] }) {
  const { value, setValue, common } = useBound(props);
  const chosen = Array.isArray(value) ? props.values.filter((each) => value.includes(each)) : [];
  const options = useOptions(props, (option) => chosen.includes(option));
  const handleChange = (next: T[]) => {
    const added = next.find((each) => !chosen.includes(each));
    if (added === undefined) return setValue(next.length === 0 ? undefined : next);
    setValue(alone.includes(added) ? [added] : next.filter((each) => !alone.includes(each)));
  };
  return (
    <FieldFrame name={props.name}>
      <MultiChoice<T> {...common} options={options} value={chosen} onChange={handleChange} />
    </FieldFrame>
  );
}

function FieldDateBound(named: Named) {
  const { value, setValue, common } = useBound(named);
  return (
    <FieldFrame name={named.name}>
      <DateField
        {...common}
        value={typeof value === 'string' ? value : undefined}
        onChange={setValue}
      />
    </FieldFrame>
  );
}

/** A date and time on the site's wall clock. */
function FieldDateTimeBound(named: Named) {
  const { value, setValue, common } = useBound(named);
  const { record, site } = useWorksheetForm();
  const timeZone = site?.timeZone ?? record.timeZone;
  const shown = typeof value === 'string' ? value : undefined;
  return (
    <FieldFrame name={named.name}>
      <DateTimeField
        {...common}
        value={shown}
        onChange={setValue}
        timeZone={timeZone}
        zoneName={shown === undefined ? undefined : zoneText(shown, timeZone)}
      />
    </FieldFrame>
  );
}

/* A keystroke elsewhere leaves these as they are. */
export const FieldText = memo(FieldTextBound);
export const FieldNumber = memo(FieldNumberBound);
export const FieldDistance = memo(FieldDistanceBound);
export const FieldYesNo = memo(FieldYesNoBound);
export const FieldDate = memo(FieldDateBound);
export const FieldDateTime = memo(FieldDateTimeBound);
export const FieldChoice = memo(FieldChoiceBound) as typeof FieldChoiceBound;
export const FieldSelect = memo(FieldSelectBound) as typeof FieldSelectBound;
export const FieldMulti = memo(FieldMultiBound) as typeof FieldMultiBound;
