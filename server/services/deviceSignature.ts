import { createPublicKey, verify } from 'node:crypto';
import type { JsonWebKey } from 'node:crypto';
import type { Meaning } from '@/shared/record';
import { clock } from '../clock';
import { Device } from '../models/Device';
import { conflict, notAllowed } from '../problem';
import { canonicalJson } from './contentHash';

const MINUTE = 60_000;
const HOUR = 60 * MINUTE;
/** How long a signature may wait for signal. */
const MAX_AGE = 72 * HOUR;
/** How far a phone's clock may run ahead. */
const MAX_AHEAD = 5 * MINUTE;

/** What a device signs, in its RFC 8785 form. */
export interface DeviceSigned {
  worksheetId: string;
  revision: number;
  contentHash: string;
  meaning: Meaning;
  signerId: string;
  /** As the client wrote it: another spelling of the same instant is another text. */
  signedAt: string;
  strokesHash: string;
}

function isValid(publicKey: Device['publicKey'], signed: DeviceSigned, signature: string): boolean {
  try {
    const { kty, crv, x, y } = publicKey;
    const jwk: JsonWebKey = { kty, crv, x, y };
    const key = createPublicKey({ key: jwk, format: 'jwk' });
    return verify(
      'sha256',
      Buffer.from(canonicalJson(signed)),
      { key, dsaEncoding: 'ieee-p1363' },
      Buffer.from(signature, 'base64url'),
    );
  } catch {
    // A key that is no point of the curve verifies nothing.
    return false;
  }
}

/** Checks a signature given without signal: the signer's own device, not revoked, its key. 403 otherwise. */
export async function checkDeviceSignature(
  deviceId: string,
  signed: DeviceSigned,
  signature: string,
): Promise<void> {
  const device = await Device.findByPk(deviceId);
  if (device === null || device.userId !== signed.signerId || device.revokedAt !== null) {
    throw notAllowed('This device may not sign for this person.');
  }
  if (!isValid(device.publicKey, signed, signature)) {
    throw notAllowed('The signature of the device does not fit what was sent.');
  }
}

interface Moment {
  signedAt: Date;
  startsAt: Date | null;
  endsAt: Date | null;
  /** Of the latest signature on the same revision. */
  previous: Date | null;
}

/** Judges when a signature without signal was given; 409 outside of what is accepted. */
export function checkSignedAt({ signedAt, startsAt, endsAt, previous }: Moment): void {
  const now = clock.now().getTime();
  if (now - signedAt.getTime() > MAX_AGE) {
    throw conflict('The signature is older than 72 hours.');
  }
  if (signedAt.getTime() - now > MAX_AHEAD) {
    throw conflict('The signature is dated ahead of the clock.');
  }
  if (startsAt === null || endsAt === null || signedAt < startsAt || signedAt > endsAt) {
    throw conflict('The signature was given outside the planned window.');
  }
  if (previous !== null && signedAt < previous) {
    throw conflict('The signature is older than one that came before it.');
  }
}
