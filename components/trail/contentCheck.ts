import canonicalize from 'canonicalize';
import type { Attachment } from '@/shared/record';
import type { WorksheetContent } from '@/shared/worksheet';

export interface Signed {
  worksheetId: string;
  revision: number;
  content: WorksheetContent;
  attachments: readonly Attachment[];
}

/**
 * The SHA-256 of what is signed, worked out on this device from what it was
 * shown; undefined where the device has no hash function (a page without TLS).
 */
export async function workedOutHash(signed: Signed): Promise<string | undefined> {
  const { subtle } = (globalThis.crypto as Crypto | undefined) ?? {};
  if (subtle === undefined) return undefined;
  const attachments = signed.attachments
    .filter(({ section }) => section !== 'closeOut')
    .map(({ id, sha256, section }) => ({ id, sha256, section }))
    .sort((one, other) => (one.id < other.id ? -1 : 1));
  const { worksheetId, revision, content } = signed;
  const form = canonicalize({ worksheetId, revision, content, attachments });
  if (form === undefined) return undefined;
  const digest = await subtle.digest('SHA-256', new TextEncoder().encode(form));
  return [...new Uint8Array(digest)].map((byte) => byte.toString(16).padStart(2, '0')).join('');
}
