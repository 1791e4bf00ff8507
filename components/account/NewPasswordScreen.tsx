import { useMutation } from '@tanstack/react-query';
import { useState } from 'react';
import { z } from 'zod';
import { isProblem } from '../api/ApiProblem';
import { json, request } from '../api/request';
import { useMessages } from '../i18n/useMessages';
import {
  Button,
  describeFault,
  ErrorSummary,
  Form,
  Notice,
  PinField,
  Text,
  TextField,
  type FieldFault,
} from '../ui';
import { passwordFault, pinFault, serverFault } from './secrets';
import { SignedOutFrame } from './SignedOutFrame';

interface Props {
  token: string;
  /** Only an invitation sets a signing PIN: a mailbox alone never yields one. */
  kind: 'reset' | 'invitation';
}

function useNewSecrets({ token, kind }: Props) {
  const messages = useMessages();
  const [password, setPassword] = useState('');
  const [pin, setPin] = useState('');
  const [tried, setTried] = useState(false);
  const save = useMutation({
    mutationFn: (body: { password: string; pin?: string }) =>
      request(z.undefined(), `/password-resets/${encodeURIComponent(token)}`, json('POST', body)),
  });
  const withPin = kind === 'invitation';

  const passwordError = tried
    ? (passwordFault(password, messages) ?? serverFault(save.error, '#/password', messages))
    : undefined;
  const pinError =
    tried && withPin
      ? (pinFault(pin, messages) ?? serverFault(save.error, '#/pin', messages))
      : undefined;
  const faults: FieldFault[] = [];
  if (passwordError !== undefined) faults.push({ id: 'password', message: passwordError });
  if (pinError !== undefined) faults.push({ id: 'pin', message: pinError });
  if (save.isError && faults.length === 0)
    faults.push({ message: describeFault(save.error, messages) });

  function submit() {
    setTried(true);
    if (passwordFault(password, messages) !== undefined) return;
    if (withPin && pinFault(pin, messages) !== undefined) return;
    save.mutate(withPin ? { password, pin } : { password });
  }
  return {
    password,
    setPassword,
    pin,
    setPin,
    passwordError,
    pinError,
    faults,
    save,
    submit,
    tried,
    withPin,
  };
}

/** A new password by a link from a mail; an invitation also sets the signing PIN. */
export function NewPasswordScreen(props: Props) {
  const form = useNewSecrets(props);
  const { account } = useMessages();
  const words =
    props.kind === 'invitation'
      ? account.invitation
      : { ...account.reset, title: account.reset.newTitle, body: account.reset.newBody };

  if (form.save.isSuccess) {
    return (
      <SignedOutFrame title={words.title}>
        <Notice live icon="seal">
          {words.done}
        </Notice>
        <Button kind="primary" large label={account.signIn} href="/sign-in" />
      </SignedOutFrame>
    );
  }
  if (isProblem(form.save.error, 'not-found')) {
    return (
      <SignedOutFrame title={words.title}>
        <Notice live icon="clock">
          {words.dead}
        </Notice>
        {props.kind === 'reset' && (
          <Button kind="primary" large label={account.reset.again} href="/password-forgotten" />
        )}
        <Button kind="quiet" icon="left" label={account.reset.toSignIn} href="/sign-in" />
      </SignedOutFrame>
    );
  }
  return (
    <SignedOutFrame title={words.title}>
      <Form>
        <Text>{words.body}</Text>
        {form.tried && !form.save.isPending && <ErrorSummary faults={form.faults} />}
        <TextField
          id="password"
          label={account.newPassword}
          hint={account.passwordHint}
          value={form.password}
          onChangeText={form.setPassword}
          error={form.passwordError}
          secure
          exact
          autoComplete="new-password"
        />
        {form.withPin && (
          <PinField
            id="pin"
            label={account.newPin}
            hint={account.pinHint}
            value={form.pin}
            onChange={form.setPin}
            error={form.pinError}
          />
        )}
        <Button
          kind="primary"
          large
          label={words.save}
          onPress={form.submit}
          busy={form.save.isPending}
        />
      </Form>
    </SignedOutFrame>
  );
}
