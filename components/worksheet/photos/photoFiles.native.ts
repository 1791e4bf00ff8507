import type { PhotoFiles } from './photoTypes';

/** Photos are added in the browser. */
export const photoFiles: PhotoFiles = {
  canPick: false,
  hasCamera: () => false,
  pick: () => Promise.resolve([]),
  send: () => Promise.reject(new TypeError('Photos are sent from the browser.')),
  urlOf: () => '',
  release: () => undefined,
};
