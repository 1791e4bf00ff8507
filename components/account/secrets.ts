import type { Messages } from '@/shared/messages';
import { newPassword, newPin } from '@/shared/user';
import { ApiProblem } from '../api/ApiProblem';

/** What is wrong with a new password, as far as the screen can know; the server also has a list of common ones. */
export function passwordFault(value: string, { account }: Messages): string | undefined {
  return newPassword.safeParse(value).success ? undefined : account.passwordShort;
}

export function pinFault(value: string, { account }: Messages): string | undefined {
  if (newPin.safeParse(value).success) return undefined;
  return /^\d{6}$/.test(value) ? account.pinSequence : account.pinShort;
}

/** What the server found wrong with a field, in the person's language. */
export function serverFault(
  error: unknown,
  pointer: string,
  messages: Messages,
): string | undefined {
  if (!(error instanceof ApiProblem)) return undefined;
  const fault = error.at(pointer);
  if (fault === undefined) return undefined;
  const { account } = messages;
  if (pointer === '#/password')
    return fault.code === 'common' ? account.passwordCommon : account.passwordShort;
  if (pointer === '#/pin') return account.pinSequence;
  return fault.message;
}
