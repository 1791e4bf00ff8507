import type { ReactNode } from 'react';
import { useController } from 'react-hook-form';
import { useMessages } from '../../i18n/useMessages';
import { CheckRow } from '../../ui';
import { FieldFrame } from './FieldFrame';
import { fieldId, hintOf, labelOf } from './fieldWords';
import { useFieldState } from './WorksheetFormContext';

interface Props {
  name: string;
  label?: string;
  note?: string;
  children?: ReactNode;
}

/** Something done or found so. Not ticked is the answer "no", and counts as the worse case. */
export function FieldCheck({ name, label, note, children }: Props) {
  const words = useMessages();
  const { findings } = useFieldState(name);
  const { field } = useController({ name });
  return (
    <FieldFrame name={name}>
      <CheckRow
        id={fieldId(name)}
        label={label ?? labelOf(words, name)}
        note={note ?? hintOf(words, name)}
        checked={field.value === true}
        onChange={field.onChange}
        unanswered={findings.some(({ severity }) => severity !== 'caution')}
      >
        {children}
      </CheckRow>
    </FieldFrame>
  );
}
