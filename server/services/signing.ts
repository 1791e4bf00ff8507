import type { z } from 'zod';
import type { signSchema } from '@/shared/record';
import type { CurrentUser } from '../currentUser';
import type { SignatureRow } from '../models/SignatureRow';
import type { User } from '../models/User';
import type { Worksheet } from '../models/Worksheet';
import type { WorksheetRevision } from '../models/WorksheetRevision';

export type SignRequest = z.infer<typeof signSchema>;

/** One signature on its way: who enters it, whose it is, what was sent. */
export interface Signing {
  actor: CurrentUser;
  signer: User;
  request: SignRequest;
  id: string;
}

/** The worksheet that is signed, with its row held. */
export interface Held {
  worksheet: Worksheet;
  revision: WorksheetRevision;
  signatures: SignatureRow[];
}

/** The part of a request that was signed without signal, or `null`. */
export function offlinePart(request: SignRequest) {
  return 'deviceId' in request ? request : null;
}
