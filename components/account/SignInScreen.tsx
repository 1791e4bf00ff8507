import { Redirect, type Href } from 'expo-router';
import { useState } from 'react';
import { useSession, useSignIn } from '../api/session';
import { isProblem } from '../api/ApiProblem';
import type { Messages } from '@/shared/messages';
import { useMessages } from '../i18n/useMessages';
import { Button, describeFault, ErrorSummary, Form, TextField, type FieldFault } from '../ui';
import { SignedOutFrame } from './SignedOutFrame';

/** Only a path of our own is followed after sign-in, never another site. */
function inside(to: string | undefined): Href {
  return to !== undefined && /^\/(?![/\\])/.test(to) ? to : '/';
}

function faultText(error: unknown, messages: Messages): string {
  const { account } = messages;
  if (isProblem(error, 'wrong-credentials')) return account.wrong;
  if (isProblem(error, 'too-many-requests')) {
    return account.tooMany(Math.ceil((error.retryAfterSeconds ?? 60) / 60));
  }
  if (error instanceof TypeError) return account.noAnswer;
  return describeFault(error, messages);
}

/** E-mail and password. */
export function SignInScreen({ to }: { to?: string }) {
  const session = useSession();
  const signIn = useSignIn();
  const messages = useMessages();
  const { account } = messages;
  const [email, setEmail] = useState('');
  const [password, setPassword] = useState('');
  const [tried, setTried] = useState(false);

  if (session.data) return <Redirect href={inside(to)} />;

  const emailError = tried && email.trim() === '' ? account.emailMissing : undefined;
  const passwordError = tried && password === '' ? account.passwordMissing : undefined;
  const faults: FieldFault[] = [];
  if (emailError !== undefined) faults.push({ id: 'email', message: emailError });
  if (passwordError !== undefined) faults.push({ id: 'password', message: passwordError });
  if (faults.length === 0 && signIn.isError) {
    faults.push({ message: faultText(signIn.error, messages) });
  }

  function handleSubmit() {
    setTried(true);
    if (email.trim() === '' || password === '') return;
    signIn.mutate({ email: email.trim(), password });
  }

  return (
    <SignedOutFrame title={account.signIn} purpose foot={account.fromOffice}>
      <Form>
        {tried && !signIn.isPending && <ErrorSummary faults={faults} />}
        <TextField
          id="email"
          label={account.email}
          value={email}
          onChangeText={setEmail}
          error={emailError}
          exact
          inputMode="email"
          autoComplete="username"
          onSubmitEditing={handleSubmit}
        />
        <TextField
          id="password"
          label={account.password}
          value={password}
          onChangeText={setPassword}
          error={passwordError}
          secure
          exact
          autoComplete="current-password"
          onSubmitEditing={handleSubmit}
        />
        <Button
          kind="primary"
          large
          label={account.signIn}
          onPress={handleSubmit}
          busy={signIn.isPending}
        />
      </Form>
      <Button kind="quiet" label={account.forgotten} href="/password-forgotten" />
    </SignedOutFrame>
  );
}
