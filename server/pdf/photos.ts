import type { Content, ContentImage } from 'pdfmake/interfaces';
import { enumWord } from '@/shared/messages';
import type { PdfContext } from './context';
import { cite, medium, PAGE, sectionHead } from './style';
import { printable, text } from './text';

const PHOTO = { width: 262, height: 230 };
/** A photo with what stands below it: number, caption of two lines, hash. */
const ROW = PHOTO.height + 60;

/** The pictures that the document may draw, by keys of our own: never by a name that a person gave. */
export function photoImages({ attachments }: PdfContext): Record<string, string> {
  const images: Record<string, string> = {};
  attachments.forEach(({ jpeg }, index) => {
    if (jpeg && isJpeg(jpeg)) {
      images[keyOf(index)] = `data:image/jpeg;base64,${Buffer.from(jpeg).toString('base64')}`;
    }
  });
  return images;
}

function keyOf(index: number): string {
  return `photo${index + 1}`;
}

/** Starts and ends as a JPEG does, with a frame header between: what else the reader would throw on. */
function isJpeg(bytes: Uint8Array): boolean {
  if (bytes.length < 20 || bytes[0] !== 0xff || bytes[1] !== 0xd8) return false;
  let at = 2;
  while (at + 9 < bytes.length) {
    if (bytes[at] !== 0xff) return false;
    const marker = bytes[at + 1] ?? 0;
    const isFrame = marker >= 0xc0 && marker <= 0xcf && ![0xc4, 0xc8, 0xcc].includes(marker);
    if (isFrame) return true;
    at += 2 + ((bytes[at + 2] ?? 0) << 8) + (bytes[at + 3] ?? 0);
  }
  return false;
}

/** Two photos a row, each with its number, section, caption and hash. */
export function photos(context: PdfContext): Content[] {
  const { m, locale, attachments } = context;
  if (attachments.length === 0) return [];
  const words = m.pdf.photos;
  const cells = attachments.map((photo, index): Content[] => {
    const place = enumWord(locale, 'attachmentSection', photo.section);
    const picture: Content =
      photo.jpeg === null
        ? text(words.missing)
        : isJpeg(photo.jpeg)
          ? withAlt(
              { image: keyOf(index), fit: [PHOTO.width, PHOTO.height] },
              photo.caption || place,
            )
          : text(words.unreadable);
    return [
      picture,
      medium(words.caption(index + 1, place), { margin: [0, 3, 0, 0] }),
      text(photo.caption || words.noCaption),
      cite(`${m.pdf.hash} ${photo.sha256}`, { fontSize: 6.5, wordBreak: 'break-all' }),
    ];
  });
  const pairs: Content[] = [];
  for (let index = 0; index < cells.length; index += 2) {
    pairs.push({
      columns: [cells[index] ?? [], cells[index + 1] ?? []].map((stack) => ({
        stack,
        width: PHOTO.width,
      })),
      columnGap: PAGE.textWidth - PHOTO.width * 2,
      unbreakable: true,
      margin: [0, 0, 0, 12],
    });
  }
  return [sectionHead({ title: words.title, width: PAGE.textWidth, room: ROW }), ...pairs];
}

function withAlt(image: ContentImage, words: string): Content {
  const node: ContentImage & { alt: string } = { ...image, alt: printable(words) };
  return node;
}
