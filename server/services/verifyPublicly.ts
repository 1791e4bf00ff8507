import type { z } from 'zod';
import type { verifySchema } from '@/shared/record';
import { SignatureRow } from '../models/SignatureRow';
import { Worksheet } from '../models/Worksheet';
import { expireIfOver } from './expireWorksheets';

const NUMBER = /^\d{4}-\d{6,12}$/;
const HASH = /^[0-9a-f]{64}$/i;

type Answer = z.infer<typeof verifySchema>;

/**
 * What anyone may learn who holds a printed number and hash: whether a
 * signature carries them, and how that worksheet stands. Nothing else, and
 * nothing at all otherwise.
 */
export async function verifyPublicly(number: string, hash: string): Promise<Answer> {
  if (!NUMBER.test(number) || !HASH.test(hash)) return { matches: false };
  const worksheet = await Worksheet.findOne({ where: { number } });
  if (worksheet === null) return { matches: false };
  const signature = await SignatureRow.findOne({
    where: { worksheetId: worksheet.id, contentHash: hash.toLowerCase() },
    order: [
      ['revision', 'DESC'],
      ['signedAt', 'DESC'],
    ],
  });
  if (signature === null) return { matches: false };
  const { state, revision } = await expireIfOver(worksheet);
  return {
    matches: true,
    state,
    revision: signature.revision,
    superseded: signature.revision < revision,
    signedAt: signature.signedAt.toISOString(),
  };
}
