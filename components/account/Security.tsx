import { useState } from 'react';
import { isProblem } from '../api/ApiProblem';
import { useUser } from '../api/session';
import { useMessages } from '../i18n/useMessages';
import {
  Button,
  describeFault,
  ErrorSummary,
  Form,
  Notice,
  PinField,
  Section,
  Text,
  TextField,
  type FieldFault,
} from '../ui';
import { useChangePassword, useChangePin } from './accountQueries';
import { passwordFault, pinFault, serverFault } from './secrets';

interface FormProps {
  onDone: () => void;
  onCancel: () => void;
}

function collect(pairs: readonly (readonly [string, string | undefined])[]): FieldFault[] {
  return pairs.flatMap(([id, message]) => (message === undefined ? [] : [{ id, message }]));
}

function PasswordForm({ onDone, onCancel }: FormProps) {
  const messages = useMessages();
  const { account } = messages;
  const change = useChangePassword();
  const [current, setCurrent] = useState('');
  const [password, setPassword] = useState('');
  const [tried, setTried] = useState(false);

  const wrong = isProblem(change.error, 'wrong-password') ? account.wrongCurrent : undefined;
  const currentError = tried ? (current === '' ? account.currentMissing : wrong) : undefined;
  const passwordError = tried
    ? (passwordFault(password, messages) ?? serverFault(change.error, '#/password', messages))
    : undefined;
  const faults = collect([
    ['current-password', currentError],
    ['new-password', passwordError],
  ]);
  if (change.isError && faults.length === 0)
    faults.push({ message: describeFault(change.error, messages) });

  function handleSave() {
    setTried(true);
    if (current === '' || passwordFault(password, messages) !== undefined) return;
    change.mutate({ current, password }, { onSuccess: onDone });
  }

  return (
    <Form>
      {tried && !change.isPending && <ErrorSummary faults={faults} />}
      <TextField
        id="current-password"
        label={account.currentPassword}
        value={current}
        onChangeText={setCurrent}
        error={currentError}
        secure
        exact
        autoComplete="current-password"
      />
      <TextField
        id="new-password"
        label={account.newPassword}
        hint={account.passwordHint}
        value={password}
        onChangeText={setPassword}
        error={passwordError}
        secure
        exact
        autoComplete="new-password"
      />
      <Button kind="primary" label={account.save} onPress={handleSave} busy={change.isPending} />
      <Button label={account.cancel} onPress={onCancel} />
    </Form>
  );
}

function PinForm({ onDone, onCancel }: FormProps) {
  const messages = useMessages();
  const { account } = messages;
  const change = useChangePin();
  const [password, setPassword] = useState('');
  const [pin, setPin] = useState('');
  const [tried, setTried] = useState(false);

  const wrong = isProblem(change.error, 'wrong-password') ? account.wrongCurrent : undefined;
  const passwordError = tried ? (password === '' ? account.currentMissing : wrong) : undefined;
  const pinError = tried
    ? (pinFault(pin, messages) ?? serverFault(change.error, '#/pin', messages))
    : undefined;
  const faults = collect([
    ['pin-password', passwordError],
    ['new-pin', pinError],
  ]);
  if (change.isError && faults.length === 0)
    faults.push({ message: describeFault(change.error, messages) });

  function handleSave() {
    setTried(true);
    if (password === '' || pinFault(pin, messages) !== undefined) return;
    change.mutate({ password, pin }, { onSuccess: onDone });
  }

  return (
    <Form>
      {tried && !change.isPending && <ErrorSummary faults={faults} />}
      <TextField
        id="pin-password"
        label={account.currentPassword}
        value={password}
        onChangeText={setPassword}
        error={passwordError}
        secure
        exact
        autoComplete="current-password"
      />
      <PinField
        id="new-pin"
        label={account.newPin}
        hint={account.pinHint}
        value={pin}
        onChange={setPin}
        error={pinError}
      />
      <Text variant="label" weight="400" color="ink2">
        {account.pinNote}
      </Text>
      <Button kind="primary" label={account.save} onPress={handleSave} busy={change.isPending} />
      <Button label={account.cancel} onPress={onCancel} />
    </Form>
  );
}

/** The password that opens the account and the PIN that signs. */
export function Security() {
  const user = useUser();
  const { account } = useMessages();
  const [open, setOpen] = useState<'password' | 'pin' | null>(null);
  const [done, setDone] = useState<string | null>(null);
  const close = (said: string | null) => {
    setOpen(null);
    setDone(said);
  };
  return (
    <Section id="security" title={account.security}>
      {done !== null && (
        <Notice live icon="seal">
          {done}
        </Notice>
      )}
      {!user.hasPin && <Notice icon="pen">{account.noPin}</Notice>}
      {open === 'password' && (
        <PasswordForm onDone={() => close(account.passwordChanged)} onCancel={() => close(null)} />
      )}
      {open === 'pin' && (
        <PinForm onDone={() => close(account.pinChanged)} onCancel={() => close(null)} />
      )}
      {open === null && (
        <>
          <Button label={account.changePassword} onPress={() => setOpen('password')} />
          <Button
            label={user.hasPin ? account.changePin : account.setPin}
            onPress={() => setOpen('pin')}
          />
        </>
      )}
    </Section>
  );
}
