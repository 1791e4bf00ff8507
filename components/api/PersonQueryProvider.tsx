import {
  dehydrate,
  hydrate,
  QueryClientProvider,
  type DehydratedState,
  type QueryClient,
} from '@tanstack/react-query';
import { useEffect, useState, type ReactNode } from 'react';
import { keptCache } from './keptCache';
import { createQueryClient, deviceClient } from './queryClient';
import { sessionKey } from './session';

/** Long enough not to write at every answer, short enough for a phone that goes dark. */
const WRITE_AFTER_MS = 1_500;

interface Kept {
  /** A build that shapes its answers another way starts afresh. */
  format: typeof FORMAT;
  state: DehydratedState;
}
const FORMAT = 1;

function isKept(value: unknown): value is Kept {
  return (
    typeof value === 'object' && value !== null && 'format' in value && value.format === FORMAT
  );
}

/** Reads what this person was last shown into the cache, then keeps every new answer. */
async function restore(client: QueryClient, userId: string): Promise<void> {
  const kept = await keptCache.read(userId);
  if (isKept(kept)) hydrate(client, kept.state);
}

function keepWriting(client: QueryClient, userId: string): () => void {
  let timer: ReturnType<typeof setTimeout> | undefined;
  const write = () => {
    timer = undefined;
    const state = dehydrate(client, { shouldDehydrateMutation: () => false });
    // A browser that refuses storage still shows what the server answers.
    keptCache.write(userId, { format: FORMAT, state }).catch(() => undefined);
  };
  const unsubscribe = client.getQueryCache().subscribe(({ type }) => {
    if (type === 'updated' || type === 'removed') timer ??= setTimeout(write, WRITE_AFTER_MS);
  });
  return () => {
    unsubscribe();
    clearTimeout(timer);
  };
}

/**
 * The cache of one person. Another who signs in on the same device gets a
 * cache of their own and never sees what the first was shown.
 */
export function PersonQueryProvider({ userId, children }: { userId: string; children: ReactNode }) {
  const [client] = useState(() =>
    createQueryClient(() => void deviceClient.invalidateQueries({ queryKey: sessionKey })),
  );
  const [ready, setReady] = useState(false);

  useEffect(() => {
    let stop: (() => void) | undefined;
    let left = false;
    restore(client, userId)
      .catch(() => undefined)
      .finally(() => {
        if (left) return;
        stop = keepWriting(client, userId);
        setReady(true);
      });
    return () => {
      left = true;
      stop?.();
    };
  }, [client, userId]);

  return <QueryClientProvider client={client}>{ready ? children : null}</QueryClientProvider>;
}
