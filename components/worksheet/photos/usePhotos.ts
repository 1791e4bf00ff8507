import { useQueryClient } from '@tanstack/react-query';
import { useCallback, useEffect, useRef, useState } from 'react';
import { v7 as newId } from 'uuid';
import { z } from 'zod';
import { attachmentSchema, type WorksheetRecord } from '@/shared/record';
import { ApiProblem } from '../../api/ApiProblem';
import { json, request } from '../../api/request';
import { useUser } from '../../api/session';
import { keptForms } from '../../drafts/keptForms';
import { useMessages } from '../../i18n/useMessages';
import { describeFault } from '../../ui';
import { worksheetQuery } from '../worksheetQueries';
import { photoFiles } from './photoFiles';
import type { AskedSection } from './photoSections';
import type { PhotoFault, WaitingPhoto } from './photoTypes';

const TYPES = new Set(['image/jpeg', 'image/png', 'image/webp']);
const MOST_BYTES = 15 * 1024 * 1024;

export interface ShownPhoto extends WaitingPhoto {
  url: string;
  /** What the file is called, to tell several apart. */
  name?: string;
  /** Percent gone while it is being sent. */
  sending?: number;
  /** In words: why it was not taken. */
  fault?: string;
  /** The same file will never be taken: another has to be chosen. */
  hopeless?: boolean;
}

const keptSchema = z.array(
  z.object({ id: z.string(), caption: z.string(), file: z.custom<Blob>((v) => v instanceof Blob) }),
);

function faultOfFile(file: Blob): PhotoFault | undefined {
  if (!TYPES.has(file.type)) return 'type';
  return file.size > MOST_BYTES ? 'large' : undefined;
}

/** Which of our own sentences fits what the server said; undefined where its general one is enough. */
function faultOfAnswer(error: unknown): PhotoFault | undefined {
  if (error instanceof TypeError) return 'offline';
  if (!(error instanceof ApiProblem)) return undefined;
  if (error.status === 413) return 'large';
  const code = error.at('#/file')?.code;
  return code === 'too-many-pixels' ? 'pixels' : code === 'no-photo' ? 'damaged' : undefined;
}

function useFaultWords() {
  const messages = useMessages();
  const { photos } = messages;
  return {
    ofFile: (file: Blob) => {
      const fault = faultOfFile(file);
      return fault && photos.failed[fault];
    },
    ofAnswer: (error: unknown) => {
      const fault = faultOfAnswer(error);
      if (fault !== undefined) return photos.failed[fault];
      if (error instanceof ApiProblem && error.problem === 'conflict') return photos.most;
      if (error instanceof ApiProblem && error.problem === 'wrong-state') return photos.frozen;
      return describeFault(error, messages);
    },
  };
}

/**
 * Photos of one section that wait on this device: chosen, captioned, sent one
 * by one. They are kept with the form until the server has them.
 */
export function usePhotos({ id: worksheetId }: WorksheetRecord, section: AskedSection) {
  const user = useUser();
  const client = useQueryClient();
  const words = useFaultWords();
  const [waiting, setWaiting] = useState<ShownPhoto[]>([]);
  const held = useRef<ShownPhoto[]>([]);
  const key = `photos/${worksheetId}/${section}`;

  const hold = useCallback(
    (next: ShownPhoto[]) => {
      held.current = next;
      setWaiting(next);
      const kept = next
        .filter(({ hopeless }) => hopeless !== true)
        .map(({ id, caption, file }) => ({ id, caption, file }));
      const done =
        kept.length > 0 ? keptForms.keep(user.id, key, kept) : keptForms.forget(user.id, key);
      // A browser that refuses storage still sends.
      done.catch(() => undefined);
    },
    [user.id, key],
  );

  useEffect(() => {
    let current = true;
    keptForms
      .read(user.id, key)
      .then((stored) => {
        const kept = keptSchema.safeParse(stored);
        if (!current || !kept.success) return;
        const known = new Set(held.current.map(({ id }) => id));
        const back = kept.data
          .filter(({ id }) => !known.has(id))
          .map((photo) => ({ ...photo, url: photoFiles.urlOf(photo.file) }));
        held.current = [...back, ...held.current];
        setWaiting(held.current);
      })
      .catch(() => undefined);
    return () => {
      current = false;
      held.current.forEach(({ url }) => photoFiles.release(url));
      held.current = [];
    };
  }, [user.id, key]);

  const edit = (id: string, change: Partial<ShownPhoto>) =>
    hold(held.current.map((photo) => (photo.id === id ? { ...photo, ...change } : photo)));
  const drop = (id: string) => {
    const photo = held.current.find((each) => each.id === id);
    if (photo !== undefined) photoFiles.release(photo.url);
    hold(held.current.filter((each) => each.id !== id));
  };
  const readAgain = () =>
    client.invalidateQueries({ queryKey: worksheetQuery(worksheetId).queryKey });

  return {
    waiting,
    async choose(from: 'camera' | 'files') {
      const chosen = (await photoFiles.pick(from)).map(({ file, name }): ShownPhoto => {
        const fault = words.ofFile(file);
        const url = photoFiles.urlOf(file);
        return { id: newId(), caption: '', file, name, url, fault, hopeless: fault !== undefined };
      });
      hold([...held.current, ...chosen]);
    },
    caption: (id: string, caption: string) => edit(id, { caption }),
    drop,
    async send(id: string) {
      const photo = held.current.find((each) => each.id === id);
      if (photo === undefined) return;
      edit(id, { sending: 0, fault: undefined });
      try {
        await photoFiles.send(worksheetId, { ...photo, section }, (sending) => {
          setWaiting((list) => list.map((each) => (each.id === id ? { ...each, sending } : each)));
        });
        await readAgain();
        drop(id);
      } catch (error) {
        const hopeless = ['large', 'pixels', 'damaged'].includes(faultOfAnswer(error) ?? '');
        edit(id, { sending: undefined, fault: words.ofAnswer(error), hopeless });
      }
    },
    /** Changes the words under one that the server has; answers with the fault in words, if there is one. */
    async recaption(id: string, caption: string): Promise<string | undefined> {
      try {
        await request(attachmentSchema, `/attachments/${id}`, json('PATCH', { caption }));
        await readAgain();
        return undefined;
      } catch (error) {
        return words.ofAnswer(error);
      }
    },
    /** Takes one off the server; answers with the fault in words, if there is one. */
    async remove(id: string): Promise<string | undefined> {
      try {
        await request(z.undefined(), `/attachments/${id}`, { method: 'DELETE' });
        await readAgain();
        return undefined;
      } catch (error) {
        return words.ofAnswer(error);
      }
    },
  };
}
