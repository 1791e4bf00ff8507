import { v7 } from 'uuid';
import { createUserSchema } from '@/shared/user';
import { command, StartFault, withDatabase } from './environment';

/**
 * Adds the first account of the safety office and mails the invitation; every
 * later account is added by safety in the app. The mail leaves with the server.
 */
async function invite(): Promise<void> {
  const [email, ...words] = process.argv.slice(2);
  const input = { email, name: words.join(' '), role: 'safety', siteIds: [] };
  const parsed = createUserSchema.safeParse(input);
  if (!parsed.success) throw new StartFault('Name both: npm run invite -- E-MAIL NAME');
  const { clock } = await import('../clock');
  const { closeDatabase, transact } = await import('../db');
  const { User } = await import('../models/User');
  const { queueLinkMail } = await import('../services/queueMail');
  const { recordEvent } = await import('../services/recordEvent');
  try {
    await transact(async (transaction) => {
      const safety = await User.count({ where: { role: 'safety', demo: false }, transaction });
      if (safety > 0) throw new StartFault('There is a safety office already: it invites people.');
      const id = v7();
      const now = clock.now();
      const { name, role } = parsed.data;
      const stamps = { invitedAt: now, createdAt: now, updatedAt: now };
      await User.create({ id, name, email: parsed.data.email, role, ...stamps }, { transaction });
      await recordEvent(transaction, {
        subjectType: 'user',
        subjectId: id,
        type: 'created',
        actorId: null,
        payload: { name, email: parsed.data.email, role },
      });
      await queueLinkMail(transaction, 'invitation', id);
    });
  } finally {
    await closeDatabase();
  }
  console.log(`The invitation for ${parsed.data.email} is queued; the server sends it.`);
}

command(() => withDatabase(invite));
