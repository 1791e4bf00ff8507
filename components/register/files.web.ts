import type { Files, PickedText } from './filesTypes';

const MOST_BYTES = 1_000_000;

async function readText(file: File): Promise<PickedText> {
  if (file.size > MOST_BYTES) return { fault: 'large' };
  try {
    return { text: new TextDecoder('utf-8', { fatal: true }).decode(await file.arrayBuffer()) };
  } catch {
    return { fault: 'not-text' };
  }
}

export const files: Files = {
  canPick: true,
  pickText: (accept) =>
    new Promise((resolve) => {
      const input = document.createElement('input');
      input.type = 'file';
      input.accept = accept;
      input.addEventListener('change', () => {
        const file = input.files?.[0];
        if (file === undefined) resolve(null);
        else void readText(file).then(resolve);
      });
      input.addEventListener('cancel', () => resolve(null));
      input.click();
    }),
  saveText(name, text, type) {
    const url = URL.createObjectURL(new Blob([text], { type }));
    const link = document.createElement('a');
    link.href = url;
    link.download = name;
    link.click();
    URL.revokeObjectURL(url);
  },
};
