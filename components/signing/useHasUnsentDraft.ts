import { useEffect, useState } from 'react';
import { draftStore } from '../drafts/draftStore';

const LOOK_AGAIN_MS = 2_000;

/**
 * Whether this device still holds typed answers of the worksheet that the
 * server does not have. A signature would not hold them, so it waits; a draft
 * that is on its way is seen to arrive.
 */
export function useHasUnsentDraft(userId: string, worksheetId: string): boolean {
  const [unsent, setUnsent] = useState(false);
  useEffect(() => {
    let current = true;
    const look = () => {
      draftStore
        .read(userId, worksheetId)
        .then((draft) => current && setUnsent(draft !== undefined))
        // A browser without storage keeps no draft.
        .catch(() => undefined);
    };
    look();
    const timer = setInterval(look, LOOK_AGAIN_MS);
    return () => {
      current = false;
      clearInterval(timer);
    };
  }, [userId, worksheetId]);
  return unsent;
}
