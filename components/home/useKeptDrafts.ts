import { useEffect, useState } from 'react';
import { draftStore } from '../drafts/draftStore';
import { keptForms } from '../drafts/keptForms';

/** The worksheet that a kept form belongs to: `proof/<worksheet>/<revision>`; register forms belong to none. */
const OF_WORKSHEET = /^(?:proof|close|stop)\/([0-9a-f-]+)/;

async function keptWorksheets(userId: string): Promise<number> {
  // A browser that refuses storage keeps nothing.
  const [drafts, forms] = await Promise.all([
    draftStore.list(userId).catch(() => []),
    keptForms.list(userId).catch(() => []),
  ]);
  return new Set([
    ...drafts.map(({ worksheetId }) => worksheetId),
    ...forms.flatMap((key) => OF_WORKSHEET.exec(key)?.[1] ?? []),
  ]).size;
}

/** How many worksheets have something of this person's on this device that was not sent: a draft, a test, a close-out, a stop. */
export function useKeptDrafts(userId: string): number {
  const [count, setCount] = useState(0);
  useEffect(() => {
    let left = false;
    keptWorksheets(userId).then(
      (kept) => {
        if (!left) setCount(kept);
      },
      () => undefined,
    );
    return () => {
      left = true;
    };
  }, [userId]);
  return count;
}
