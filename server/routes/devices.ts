import { Router } from 'express';
import { deviceInputSchema } from '@/shared/record';
import { currentUser, requireUser } from '../middleware/requireUser';
import type { Device } from '../models/Device';
import { parse, parseId } from '../parse';
import { addDevice, listDevices, revokeDevice } from '../services/ownDevices';

export const devicesRouter = Router();
devicesRouter.use(requireUser);

devicesRouter.get('/', async (req, res) => {
  const devices = await listDevices(currentUser(req).id);
  res.json({ items: devices.map(presentDevice), nextCursor: null });
});

devicesRouter.post('/', async (req, res) => {
  const { record, created } = await addDevice(currentUser(req), parse(deviceInputSchema, req.body));
  res.status(created ? 201 : 200).json(presentDevice(record));
});

devicesRouter.delete('/:deviceId', async (req, res) => {
  await revokeDevice(currentUser(req), parseId(req.params.deviceId));
  res.status(204).end();
});

function presentDevice({ id, label, createdAt, lastUsedAt, revokedAt }: Device) {
  return {
    id,
    label,
    createdAt: createdAt.toISOString(),
    lastUsedAt: lastUsedAt?.toISOString() ?? null,
    revoked: revokedAt !== null,
  };
}
