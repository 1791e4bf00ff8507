import type { WorksheetRecord } from '@/shared/record';

/** The languages in which the record is printed. */
export type PdfLanguage = 'en' | 'es';

/**
 * Everything that the printed record is made of: plain data, so that it can be
 * handed to a worker. Nothing in it depends on who asks.
 */
export interface PdfInput {
  /** The record of the revision asked for (its content, assessment, signatures, proofs). */
  worksheet: Omit<WorksheetRecord, 'actions'>;
  /** Larger than `worksheet.revision` where a newer one has replaced it. */
  latestRevision: number;
  site: { name: string; address: string } | null;
  revisions: readonly {
    revision: number;
    contentHash: string;
    createdAt: string;
    createdByName: string;
    /** Empty for the newest. */
    state: string;
  }[];
  events: readonly {
    type: string;
    at: string;
    /** Null for an act of the clock. */
    actorName: string | null;
    /** Where someone else entered it. */
    enteredByName: string | null;
  }[];
  /** The bytes are JPEG; null where the store did not answer. */
  attachments: readonly {
    id: string;
    section: string;
    caption: string;
    sha256: string;
    jpeg: Uint8Array | null;
  }[];
  verifyUrl: string;
  /** The RFC 8785 form whose SHA-256 is the content hash: attached as `worksheet.json`. */
  canonicalJson: string;
  /** As people read it: `NFPA 70E-2024`. */
  edition: string;
}
