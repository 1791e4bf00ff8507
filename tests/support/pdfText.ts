import { execFile } from 'node:child_process';
import { once } from 'node:events';

/** The words of a PDF, by poppler's reader; every white space is one space. */
export async function textOfPdf(bytes: Buffer): Promise<string> {
  const child = execFile('pdftotext', ['-layout', '-', '-'], { maxBuffer: 16_000_000 });
  let text = '';
  child.stdout?.on('data', (chunk: string) => (text += chunk));
  child.stdin?.end(bytes);
  await once(child, 'close');
  return text.replace(/\s+/g, ' ');
}
