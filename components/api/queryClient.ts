import { MutationCache, QueryCache, QueryClient } from '@tanstack/react-query';
import { ApiProblem, isProblem } from './ApiProblem';

/** How long an answer is shown without asking again. */
const FRESH_MS = 15_000;
/** How long an answer that nobody looks at is kept, in memory and on the device. */
const KEPT_MS = 7 * 24 * 3_600_000;
const MOST_TRIES = 2;

/** Only what may go better the next time is asked again: no network, or a fault of the server. */
function mayRetry(failures: number, error: unknown): boolean {
  if (failures >= MOST_TRIES) return false;
  return !(error instanceof ApiProblem) || error.status >= 500;
}

/** A cache of its own; `onSignedOut` is told when the server no longer knows the session. */
export function createQueryClient(onSignedOut: () => void = () => undefined): QueryClient {
  const handleError = (error: unknown) => {
    if (isProblem(error, 'not-signed-in')) onSignedOut();
  };
  return new QueryClient({
    queryCache: new QueryCache({ onError: handleError }),
    mutationCache: new MutationCache({ onError: handleError }),
    defaultOptions: {
      queries: { staleTime: FRESH_MS, gcTime: KEPT_MS, retry: mayRetry },
      // A mutation fails at once without signal: the draft store and the queue hold what was typed.
      mutations: { networkMode: 'always' },
    },
  });
}

/** Holds the session only, which belongs to the device and not to a person. */
export const deviceClient = createQueryClient();
