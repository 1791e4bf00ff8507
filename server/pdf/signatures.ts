import type { Content, TableCell } from 'pdfmake/interfaces';
import { enumWord } from '@/shared/messages';
import type { Signature } from '@/shared/record';
import type { PdfContext } from './context';
import { cite, label, medium, rows, strong } from './style';
import { figure, strokesSvg } from './svg';
import { text } from './text';

const BOX = { width: 150, height: 46 };

/** Who signed what, when, on whose session, with the drawn strokes; the hash ungrouped. */
export function signatures(context: PdfContext): Content[] {
  const { m, worksheet } = context;
  const words = m.pdf.signatures;
  const given = worksheet.signatures.filter(({ revision }) => revision === worksheet.revision);
  const hash = [
    label(words.given, { margin: [0, 4, 0, 0] }),
    medium(`${m.pdf.hash} ${worksheet.contentHash}`),
  ];
  if (given.length === 0) return [text(words.none), ...hash];
  return [
    {
      table: {
        widths: ['*', BOX.width + 8],
        body: given.map((signature) => row(signature, context)),
        dontBreakRows: true,
      },
      layout: rows,
    },
    ...hash,
  ];
}

function row(signature: Signature, context: PdfContext): TableCell[] {
  const { m, locale, at, worksheet } = context;
  const words = m.pdf.signatures;
  const { signer, signedAt, receivedAt, enteredById, enteredByName, contentHash } = signature;
  // A signature given without signal arrives later than it was drawn.
  const late = Math.abs(Date.parse(receivedAt) - Date.parse(signedAt)) > 60_000;
  const session =
    enteredById === signer.id ? words.ownSession : words.enteredBy(enteredByName || enteredById);
  const method = signature.method === 'device' ? words.withDevice : words.withPin;
  const isOther = contentHash !== undefined && contentHash !== worksheet.contentHash;
  return [
    {
      stack: [
        strong(`${signer.name}, ${enumWord(locale, 'role', signer.role)}`, { fontSize: 10.5 }),
        medium(enumWord(locale, 'meaning', signature.meaning)),
        text(`${words.signed(at(signedAt))}. ${session}. ${method}.`),
        ...(late ? [text(words.received(at(receivedAt)))] : []),
        ...(isOther ? [strong(words.other(contentHash))] : []),
      ],
    },
    signature.strokes
      ? figure(
          strokesSvg(signature.strokes, BOX.width, BOX.height),
          words.strokesAlt(signer.name),
          BOX.width,
          BOX.height,
        )
      : cite(words.notDrawn),
  ];
}
