import { webcrypto } from 'node:crypto';
import { Op } from 'sequelize';
import type { z } from 'zod';
import type { deviceInputSchema } from '@/shared/record';
import { clock } from '../clock';
import type { CurrentUser } from '../currentUser';
import { transact } from '../db';
import { Device } from '../models/Device';
import { idTaken, invalidField, notFound, toProblem } from '../problem';
import { checkPin } from './checkPin';
import { recordEvent } from './recordEvent';

type NewDevice = z.infer<typeof deviceInputSchema>;

/** Registers a device that may sign without signal. The PIN is asked, for what the device signs counts like one. */
export async function addDevice(
  actor: CurrentUser,
  { id, publicKey, label, pin }: NewDevice,
): Promise<{ record: Device; created: boolean }> {
  await checkKey(publicKey);
  await checkPin(actor.id, pin);
  const { kty, crv, x, y } = publicKey;
  try {
    const record = await transact(async (transaction) => {
      const device = await Device.create(
        { id, userId: actor.id, publicKey: { kty, crv, x, y }, label, createdAt: clock.now() },
        { transaction },
      );
      await recordEvent(transaction, {
        subjectType: 'device',
        subjectId: id,
        type: 'created',
        actorId: actor.id,
        payload: { publicKey: { kty, crv, x, y } },
      });
      return device;
    });
    return { record, created: true };
  } catch (fault) {
    if (toProblem(fault)?.problem !== 'id-taken') throw fault;
    const device = await Device.findByPk(id);
    if (device?.userId !== actor.id) throw idTaken();
    return { record: device, created: false };
  }
}

async function checkKey({ kty, crv, x, y }: NewDevice['publicKey']): Promise<void> {
  try {
    const algorithm = { name: 'ECDSA', namedCurve: 'P-256' };
    await webcrypto.subtle.importKey('jwk', { kty, crv, x, y }, algorithm, false, ['verify']);
  } catch {
    throw invalidField('#/publicKey', 'key', 'This is no point of the curve P-256.');
  }
}

export function listDevices(userId: string): Promise<Device[]> {
  const order: [string, string][] = [
    ['createdAt', 'DESC'],
    ['id', 'DESC'],
  ];
  return Device.findAll({ where: { userId, revokedAt: { [Op.is]: null } }, order });
}

/** Takes a device off: what it signs from now on is refused. */
export async function revokeDevice(actor: CurrentUser, deviceId: string): Promise<void> {
  await transact(async (transaction) => {
    const device = await Device.findByPk(deviceId, { transaction, lock: transaction.LOCK.UPDATE });
    if (device?.userId !== actor.id) throw notFound();
    if (device.revokedAt !== null) return;
    await device.update({ revokedAt: clock.now() }, { transaction });
    await recordEvent(transaction, {
      subjectType: 'device',
      subjectId: deviceId,
      type: 'revoked',
      actorId: actor.id,
    });
  });
}
