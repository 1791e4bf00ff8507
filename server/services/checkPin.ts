import { v7 } from 'uuid';
import { verifySecret } from '../argon';
import { transact } from '../db';
import { User } from '../models/User';
import { wrongPin } from '../problem';
import { consume, PIN_BLOCK_SECONDS, pinLimiter } from '../throttle';
import { queueMail } from './queueMail';

/**
 * Checks a signer's PIN, in whoever's session it is typed. Tries are counted
 * for the signer before any hash is computed: five wrong ones block the PIN
 * for a quarter of an hour, and the signer gets a mail.
 */
export async function checkPin(signerId: string, pin: string): Promise<void> {
  const { remainingPoints } = await consume(pinLimiter, signerId);
  const user = await User.findByPk(signerId);
  if (await verifySecret(user?.pinHash, pin)) {
    await pinLimiter.delete(signerId);
    return;
  }
  if (remainingPoints === 0) {
    await pinLimiter.block(signerId, PIN_BLOCK_SECONDS);
    if (user !== null) await tellOfBlock(user);
  }
  throw wrongPin();
}

async function tellOfBlock(user: User): Promise<void> {
  await transact((transaction) =>
    queueMail(transaction, {
      recipient: user,
      about: `pin-blocked ${v7()}`,
      words: ({ pinBlocked }) => pinBlocked,
    }),
  );
}
