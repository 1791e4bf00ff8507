import { useEffect, useState } from 'react';
import { draftStore } from '../drafts/draftStore';

/** How many worksheets of this person are kept on this device and not sent. */
export function useKeptDrafts(userId: string): number {
  const [count, setCount] = useState(0);
  useEffect(() => {
    let left = false;
    draftStore.list(userId).then(
      (drafts) => {
        if (!left) setCount(drafts.length);
      },
      // A browser that refuses storage keeps nothing.
      () => undefined,
    );
    return () => {
      left = true;
    };
  }, [userId]);
  return count;
}
