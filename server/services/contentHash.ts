import { createHash } from 'node:crypto';
import canonicalize from 'canonicalize';
import type { WorksheetContent } from '@/shared/worksheet';

/** The RFC 8785 form: one text for one value, whoever writes it. */
export function canonicalJson(value: unknown): string {
  const json = canonicalize(value);
  if (json === undefined) throw new TypeError('only JSON values have a canonical form');
  return json;
}

/** Lower-case hexadecimal SHA-256. */
export function sha256(data: string | Uint8Array): string {
  return createHash('sha256').update(data).digest('hex');
}

/** SHA-256 of the RFC 8785 form. */
export function hashOf(value: unknown): string {
  return sha256(canonicalJson(value));
}

/** The columns of a row as the database gives them back: dates as text, nothing undefined. */
export function hashOfRow(row: { get(options: { plain: true }): object }): string {
  const columns: unknown = JSON.parse(JSON.stringify(row.get({ plain: true })));
  return hashOf(columns);
}

interface SignedAttachment {
  id: string;
  sha256: string;
  section: string;
}

interface SignedContent {
  worksheetId: string;
  revision: number;
  content: WorksheetContent;
  attachments: readonly SignedAttachment[];
}

/**
 * What a signature stands for: the content and the photos of one revision.
 * The photos of the close-out come after the signatures and are not among them.
 */
export function signedForm({ worksheetId, revision, content, attachments }: SignedContent) {
  return {
    worksheetId,
    revision,
    content,
    attachments: attachments
      .filter((attachment) => attachment.section !== 'closeOut')
      .map(({ id, sha256: digest, section }) => ({ id, sha256: digest, section }))
      .sort((one, other) => (one.id < other.id ? -1 : 1)),
  };
}

/** The hash that signatures, the PDF and the public check carry. */
export function contentHash(signed: SignedContent): string {
  return hashOf(signedForm(signed));
}
