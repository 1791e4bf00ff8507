import { useMutation } from '@tanstack/react-query';
import { useState } from 'react';
import { z } from 'zod';
import { json, request } from '../api/request';
import { useMessages } from '../i18n/useMessages';
import { Button, describeFault, ErrorSummary, Form, Notice, Text, TextField } from '../ui';
import { SignedOutFrame } from './SignedOutFrame';

/** The answer is the same whether the e-mail is known or not. */
const answerSchema = z.unknown();

/** Asks for a link by mail. */
export function PasswordForgottenScreen() {
  const messages = useMessages();
  const { account } = messages;
  const [email, setEmail] = useState('');
  const [tried, setTried] = useState(false);
  const ask = useMutation({
    mutationFn: (address: string) =>
      request(answerSchema, '/password-resets', json('POST', { email: address })),
  });

  const missing = tried && email.trim() === '' ? account.emailMissing : undefined;
  function handleSubmit() {
    setTried(true);
    if (email.trim() !== '') ask.mutate(email.trim());
  }

  return (
    <SignedOutFrame title={account.reset.title}>
      {ask.isSuccess ? (
        <Notice live icon="sent">
          {account.reset.sent}
        </Notice>
      ) : (
        <Form>
          <Text>{account.reset.body}</Text>
          {ask.isError && (
            <ErrorSummary faults={[{ message: describeFault(ask.error, messages) }]} />
          )}
          <TextField
            id="email"
            label={account.email}
            value={email}
            onChangeText={setEmail}
            error={missing}
            exact
            inputMode="email"
            autoComplete="username"
            onSubmitEditing={handleSubmit}
          />
          <Button
            kind="primary"
            large
            label={account.reset.send}
            onPress={handleSubmit}
            busy={ask.isPending}
          />
        </Form>
      )}
      <Button kind="quiet" icon="left" label={account.reset.toSignIn} href="/sign-in" />
    </SignedOutFrame>
  );
}
