import { useState } from 'react';
import { useController } from 'react-hook-form';
import { useMessages } from '../../i18n/useMessages';
import { TextField } from '../../ui';
import { FieldFrame } from './FieldFrame';
import { fieldId, hintOf, labelOf } from './fieldWords';
import { useFieldState } from './WorksheetFormContext';

function wordsOf(typed: string): string[] | undefined {
  const parts = typed.split(',').map((part) => part.trim());
  const named = parts.filter((part) => part !== '');
  return named.length === 0 ? undefined : named;
}

/** Several short names with commas between: points of work as marked in the ceiling. */
export function FieldWordList({ name }: { name: string }) {
  const words = useMessages();
  const { findings } = useFieldState(name);
  const { field } = useController({ name });
  const value: unknown = field.value;
  const [typed, setTyped] = useState(Array.isArray(value) ? value.join(', ') : '');
  return (
    <FieldFrame name={name}>
      <TextField
        id={fieldId(name)}
        label={labelOf(words, name)}
        hint={hintOf(words, name)}
        unanswered={findings.some(({ severity }) => severity === 'open')}
        exact
        maxLength={400}
        value={typed}
        onChangeText={(text) => {
          setTyped(text);
          field.onChange(wordsOf(text));
        }}
      />
    </FieldFrame>
  );
}
