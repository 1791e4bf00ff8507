import { problemSchema } from '@/shared/problem';
import { attachmentSchema, type Attachment } from '@/shared/record';
import { ApiProblem } from '../../api/ApiProblem';
import { apiUrl } from '../../api/request';
import type { NewPhoto, PhotoFiles } from './photoTypes';

const TYPES = 'image/jpeg,image/png,image/webp';

function parsed(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}

function answerOf(request: XMLHttpRequest): Attachment {
  const body = parsed(request.responseText);
  if (request.status >= 200 && request.status < 300) return attachmentSchema.parse(body);
  const problem = problemSchema.safeParse(body);
  throw new ApiProblem(
    problem.success
      ? problem.data
      : { type: '/problems/unavailable', title: 'Unavailable', status: request.status },
  );
}

/** `fetch` tells nothing of how far a file has gone; this does. */
function send(
  worksheetId: string,
  { id, section, caption, file }: NewPhoto,
  onProgress: (percent: number) => void,
): Promise<Attachment> {
  const form = new FormData();
  form.append('id', id);
  form.append('section', section);
  form.append('caption', caption);
  form.append('file', file, 'photo');
  return new Promise((resolve, reject) => {
    const request = new XMLHttpRequest();
    request.open('POST', apiUrl(`/worksheets/${worksheetId}/attachments`));
    request.withCredentials = true;
    request.setRequestHeader('Accept', 'application/json');
    request.upload.addEventListener('progress', ({ loaded, total }) =>
      onProgress(total > 0 ? Math.floor((loaded / total) * 100) : 0),
    );
    request.addEventListener('load', () => {
      try {
        resolve(answerOf(request));
      } catch (fault) {
        reject(fault instanceof Error ? fault : new Error(String(fault)));
      }
    });
    const handleNoAnswer = () => reject(new TypeError('No answer came.'));
    request.addEventListener('error', handleNoAnswer);
    request.addEventListener('abort', handleNoAnswer);
    request.addEventListener('timeout', handleNoAnswer);
    request.send(form);
  });
}

export const photoFiles: PhotoFiles = {
  canPick: true,
  hasCamera: () => window.matchMedia('(pointer: coarse)').matches,
  pick: (from) =>
    new Promise((resolve) => {
      const input = document.createElement('input');
      input.type = 'file';
      input.accept = TYPES;
      if (from === 'camera') input.setAttribute('capture', 'environment');
      else input.multiple = true;
      input.addEventListener('change', () =>
        resolve(Array.from(input.files ?? []).map((file) => ({ file, name: file.name }))),
      );
      input.addEventListener('cancel', () => resolve([]));
      input.click();
    }),
  send,
  urlOf: (file) => URL.createObjectURL(file),
  release: (url) => URL.revokeObjectURL(url),
};
