import type { Files } from './filesTypes';

/** On a phone app the lines are pasted. */
export const files: Files = {
  canPick: false,
  pickText: () => Promise.resolve(null),
  saveText: () => undefined,
};
