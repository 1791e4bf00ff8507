import { User } from '../models/User';
import { wrongPin } from '../problem';
import { verifySecret } from '../argon';
import { consume, pinLimiter } from '../throttle';

/**
 * Checks a signer's PIN, in whoever's session it is typed. Tries are counted
 * for the signer before any hash is computed: five wrong ones block the PIN
 * for a quarter of an hour.
 */
export async function checkPin(signerId: string, pin: string): Promise<void> {
  await consume(pinLimiter, signerId);
  const user = await User.findByPk(signerId, { attributes: ['pinHash'] });
  if (!(await verifySecret(user?.pinHash, pin))) throw wrongPin();
  await pinLimiter.delete(signerId);
}
