import { useMessages } from '../i18n/useMessages';
import { Choice, type ChoiceProps } from './Choice';

export interface YesNoProps extends Omit<ChoiceProps<boolean>, 'options'> {
  /** Instead of Yes: "Yes, movable". */
  yes?: string;
  no?: string;
  /** The answer that a rule refuses. */
  refused?: boolean;
}

/** A question with two answers and a third state: not answered yet. */
export function YesNo({ yes, no, refused, ...props }: YesNoProps) {
  const { ui } = useMessages();
  return (
    <Choice<boolean>
      {...props}
      options={[
        { value: true, label: yes ?? ui.yes, refused: refused === true },
        { value: false, label: no ?? ui.no, refused: refused === false },
      ]}
    />
  );
}
