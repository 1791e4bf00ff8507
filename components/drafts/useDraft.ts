import { useCallback, useEffect, useRef, useState } from 'react';
import { draftStore } from './draftStore';
import type { KeptDraft } from './draftTypes';

/** How a save ended, told by whoever sends it. */
export type SendOutcome =
  | { kind: 'accepted'; version: number; at: string }
  /** Somebody saved another version first: a person chooses. */
  | { kind: 'conflict' }
  /** The server will never take this as it is: shown, editable, not sent again by itself. */
  | { kind: 'refused'; error: unknown }
  /** No network, no answer, or the server asks to wait: tried again. */
  | { kind: 'unreachable' };

export interface DraftStatus {
  state: 'clean' | 'kept' | 'sending' | 'sent' | 'conflict' | 'refused' | 'unreachable';
  keptAt: string | null;
  sentAt: string | null;
  error?: unknown;
}

interface Options {
  userId: string;
  worksheetId: string;
  version: number;
  /** Sends the values over `baseVersion`. */
  send: (raw: unknown, baseVersion: number) => Promise<SendOutcome>;
}

/** Long enough to type a word, short enough that a dropped phone loses nothing that matters. */
const SEND_AFTER_MS = 700;
const RETRY_FIRST_MS = 2_000;
const RETRY_MOST_MS = 300_000;

/** The first wait doubled at each try, up to five minutes, with jitter against herds. */
function retryDelay(tries: number): number {
  const delay = Math.min(RETRY_FIRST_MS * 2 ** tries, RETRY_MOST_MS);
  return delay * (0.75 + Math.random() / 2);
}

/**
 * The one way in which a form keeps and saves what is typed: each change is
 * kept on the device at once and sent a moment later, one save at a time, each
 * over the version that the one before it made.
 */
export function useDraft({ userId, worksheetId, version, send }: Options) {
  const [status, setStatus] = useState<DraftStatus>({ state: 'clean', keptAt: null, sentAt: null });
  const latest = useRef<KeptDraft | null>(null);
  const base = useRef(version);
  const running = useRef(false);
  const tries = useRef(0);
  const timer = useRef<ReturnType<typeof setTimeout> | undefined>(undefined);
  const sendRef = useRef(send);
  useEffect(() => {
    sendRef.current = send;
  }, [send]);

  const flush = useCallback(async (): Promise<boolean> => {
    clearTimeout(timer.current);
    if (running.current) return false;
    running.current = true;
    try {
      while (latest.current !== null) {
        const sending: KeptDraft = latest.current;
        setStatus((before) => ({ ...before, state: 'sending' }));
        const outcome = await sendRef.current(sending.raw, base.current);
        if (outcome.kind === 'accepted') {
          tries.current = 0;
          base.current = outcome.version;
          if (latest.current !== sending) continue;
          latest.current = null;
          await draftStore.forget(userId, worksheetId);
          setStatus({ state: 'sent', keptAt: sending.keptAt, sentAt: outcome.at });
          return true;
        }
        setStatus((before) => ({
          ...before,
          state: outcome.kind,
          error: outcome.kind === 'refused' ? outcome.error : undefined,
        }));
        if (outcome.kind === 'unreachable') {
          timer.current = setTimeout(() => void flush(), retryDelay(tries.current));
          tries.current += 1;
        }
        return false;
      }
      return true;
    } finally {
      running.current = false;
    }
  }, [userId, worksheetId]);

  const change = useCallback(
    (raw: unknown) => {
      const draft: KeptDraft = {
        worksheetId,
        raw,
        baseVersion: base.current,
        keptAt: new Date().toISOString(),
      };
      latest.current = draft;
      setStatus((before) => ({ ...before, state: 'kept', keptAt: draft.keptAt }));
      // A browser that refuses storage (private window, disk full) still sends.
      draftStore.keep(userId, draft).catch(() => undefined);
      clearTimeout(timer.current);
      timer.current = setTimeout(() => void flush(), SEND_AFTER_MS);
    },
    [userId, worksheetId, flush],
  );

  /** After a conflict: go on from the version that the server now has. */
  const rebase = useCallback((toVersion: number) => {
    base.current = toVersion;
  }, []);

  /** Gives up what was typed here, after the person chose the other copy. */
  const discard = useCallback(async () => {
    latest.current = null;
    clearTimeout(timer.current);
    await draftStore.forget(userId, worksheetId);
    setStatus({ state: 'clean', keptAt: null, sentAt: null });
  }, [userId, worksheetId]);

  useEffect(() => {
    // Only the browser tells when the network is back; elsewhere the next try finds out.
    const again = () => void flush();
    globalThis.addEventListener?.('online', again);
    return () => {
      globalThis.removeEventListener?.('online', again);
      clearTimeout(timer.current);
      void flush();
    };
  }, [flush]);

  return { status, change, flush, rebase, discard, baseVersion: base };
}
