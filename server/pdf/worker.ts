import { parentPort } from 'node:worker_threads';
import pdfmake from 'pdfmake';
import { documentDefinition } from './definition';
import { fonts, isFontFile } from './fonts';
import type { PdfInput, PdfLanguage } from './input';
import { tagWhatIsDrawn } from './tagging';

export interface PdfTask {
  input: PdfInput;
  language: PdfLanguage;
}
export type PdfAnswer = { bytes: Uint8Array } | { ready: true } | { error: string };

tagWhatIsDrawn();
pdfmake.setFonts(fonts());
// Nothing is fetched, and no file is read but the typeface: all else comes with the task.
pdfmake.setUrlAccessPolicy(() => false);
pdfmake.setLocalAccessPolicy(isFontFile);

async function render({ input, language }: PdfTask): Promise<Uint8Array> {
  return pdfmake.createPdf(documentDefinition(input, language)).getBuffer();
}

const port = parentPort;
if (port === null) throw new Error('This file runs as a worker only.');

port.on('message', (task: PdfTask) => {
  render(task).then(
    (bytes) => port.postMessage({ bytes } satisfies PdfAnswer),
    (error: unknown) => {
      const message = error instanceof Error ? (error.stack ?? error.message) : String(error);
      port.postMessage({ error: message } satisfies PdfAnswer);
    },
  );
});
port.postMessage({ ready: true } satisfies PdfAnswer);
