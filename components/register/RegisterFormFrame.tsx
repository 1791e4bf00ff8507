import type { ReactNode } from 'react';
import { useMessages } from '../i18n/useMessages';
import { Button, ErrorSummary, Form, Notice, type FieldFault } from '../ui';

interface Props {
  form: {
    faults: readonly FieldFault[];
    isPending: boolean;
    wasKept: boolean;
    discard: () => void;
  };
  save: string;
  onSave: () => void;
  onCancel: () => void;
  children: ReactNode;
}

/** What stands around the fields of every form of the register. */
export function RegisterFormFrame({ form, save, onSave, onCancel, children }: Props) {
  const { register } = useMessages();
  return (
    <Form>
      {!form.isPending && <ErrorSummary faults={form.faults} />}
      {form.wasKept && (
        <Notice
          icon="kept"
          action={<Button kind="quiet" label={register.discard} onPress={form.discard} />}
        >
          {register.kept}
        </Notice>
      )}
      {children}
      <Button kind="primary" label={save} busy={form.isPending} onPress={onSave} />
      <Button
        label={register.cancel}
        onPress={() => {
          form.discard();
          onCancel();
        }}
      />
    </Form>
  );
}
