import { col, fn, where } from 'sequelize';
import type { CurrentUser } from '../currentUser';
import { verifySecret } from '../argon';
import { User } from '../models/User';
import { consume, signInLimiters } from '../throttle';
import { loadCurrentUser } from './loadCurrentUser';

interface Credentials {
  email: string;
  password: string;
  address: string;
}

/** The person behind an e-mail and a password, or `null`. Failures are counted by account and by address. */
export async function checkCredentials({
  email,
  password,
  address,
}: Credentials): Promise<CurrentUser | null> {
  const account = email.trim().toLowerCase();
  const pair = `${address} ${account}`;
  await consume(signInLimiters.address, address);
  await consume(signInLimiters.account, account);
  await consume(signInLimiters.pair, pair);
  const user = await User.findOne({ where: where(fn('lower', col('email')), account) });
  const matches = await verifySecret(user?.passwordHash, password);
  if (!matches || user === null || user.retiredAt !== null) return null;
  // Only failures count: the try that succeeded is given back.
  await Promise.all([
    signInLimiters.pair.delete(pair.slice(0, 200)),
    signInLimiters.address.reward(address.slice(0, 200)),
    signInLimiters.account.reward(account.slice(0, 200)),
  ]);
  return (await loadCurrentUser(user.id))?.user ?? null;
}
