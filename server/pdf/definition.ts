import { Buffer } from 'node:buffer';
import type { Attachment, Content, TDocumentDefinitions } from 'pdfmake/interfaces';
import { enumWord } from '@/shared/messages';
import { bannerLine } from './banners';
import { contextOf, type PdfContext } from './context';
import { details } from './details';
import { findingsSection } from './findings';
import { firstHead, firstPage } from './firstPage';
import type { PdfInput, PdfLanguage } from './input';
import { photoImages, photos } from './photos';
import { bold, cite, COLORS, label, PAGE, rule, sectionHead, SIZE, strong } from './style';
import { printable, text } from './text';
import { trail } from './trail';

/** The file inside the PDF: what the content hash is taken of. */
const ATTACHMENT = 'worksheet.json';

/** The caution text in full. Never below body size. */
function caution(context: PdfContext): Content[] {
  const { m, edition, worksheet } = context;
  const { emergency } = worksheet.content.briefing ?? {};
  const items = m.caution.full({
    editions: `${edition}, 29 CFR 1910 S, I`,
    contact: emergency?.contact || m.caution.unfilled.contact,
    place: emergency?.aedAt || m.caution.unfilled.place,
  });
  return [
    sectionHead({ title: m.pdf.caution.title, width: PAGE.textWidth, gap: 0 }),
    ...items.map(({ lead, text: words }, index): Content => ({
      text: [bold(`${index + 1}. ${lead} `), text(words)],
      margin: [0, 0, 0, 4],
    })),
    text(m.pdf.attached, { margin: [0, 6, 0, 0] }),
    text(`${m.pdf.checkText} ${context.verifyUrl}`),
    text(m.pdf.missingLetters),
  ];
}

function header(context: PdfContext, page: number): Content {
  if (page === 1) return firstHead(context);
  const { m, worksheet, locale } = context;
  const task = worksheet.content.job?.task;
  const banner = bannerLine(context);
  return {
    margin: [PAGE.side, 36, PAGE.side, 0],
    stack: [
      {
        columns: [
          { ...strong(m.common.product), width: 'auto' },
          {
            ...label(task ? enumWord(locale, 'task', task) : '', { margin: [10, 1, 0, 0] }),
            width: 'auto',
          },
          {
            ...bold(banner ?? '', { color: COLORS.ink, noWrap: false }),
            width: '*',
            alignment: 'center',
          },
          {
            ...bold(m.pdf.numbered(worksheet.number, worksheet.revision)),
            width: 'auto',
            alignment: 'right',
          },
        ],
        columnGap: 6,
      },
      rule(PAGE.textWidth, 1.5, [3, 0]),
    ],
  };
}

function footer(context: PdfContext, page: number, pages: number): Content {
  const { m, worksheet, edition } = context;
  return {
    margin: [PAGE.side, 4, PAGE.side, 0],
    stack: [
      rule(PAGE.textWidth, 1.5, [0, 3]),
      {
        columns: [
          {
            width: '*',
            stack: [label(m.pdf.deference, { color: COLORS.ink })],
          },
          {
            width: 286,
            stack: [
              cite(`${m.pdf.hash} ${worksheet.contentHash}`, { fontSize: 7.25 }),
              cite(
                `${m.pdf.numbered(worksheet.number, worksheet.revision)}. ${m.pdf.assessedUnder(edition)} ${m.pdf.page(page, pages)}`,
              ),
              cite(m.pdf.memoryMark),
            ],
            alignment: 'right',
          },
        ],
        columnGap: 10,
      },
    ],
  };
}

/**
 * The document of one revision in one language. All dates are the record's own,
 * so that the same record gives the same bytes.
 */
export function documentDefinition(input: PdfInput, language: PdfLanguage): TDocumentDefinitions {
  const context = contextOf(input, language);
  const { m, worksheet, locale } = context;
  const recordedAt = new Date(worksheet.updatedAt);
  const title = printable(m.pdf.numbered(worksheet.number, worksheet.revision));
  const json = Buffer.from(input.canonicalJson, 'utf8').toString('base64');
  // The types of pdfmake leave out what pdfkit does with a file beyond its name.
  const attachment: Attachment & Record<string, unknown> = {
    src: `data:application/json;base64,${json}`,
    name: ATTACHMENT,
    type: 'application/json',
    description: m.pdf.attachmentDescription,
    creationDate: recordedAt,
    modifiedDate: recordedAt,
    relationship: 'Source',
  };
  return {
    pageSize: 'LETTER',
    pageMargins: [PAGE.side, PAGE.top, PAGE.side, PAGE.bottom],
    version: '1.7',
    subset: 'PDF/A-3a',
    tagged: true,
    displayTitle: true,
    language: locale,
    info: {
      title,
      subject: m.pdf.kind,
      keywords: m.pdf.keywords,
      author: m.common.product,
      creator: m.common.product,
      producer: m.common.product,
      creationDate: recordedAt,
      modDate: recordedAt,
    },
    files: { [ATTACHMENT]: attachment },
    defaultStyle: {
      font: 'Barlow',
      fontSize: SIZE.body,
      lineHeight: 1.06,
      color: COLORS.ink,
    },
    images: photoImages(context),
    header: (page) => header(context, page),
    footer: (page, pages) => footer(context, page, pages),
    content: [
      ...firstPage(context),
      ...findingsSection(context),
      ...details(context),
      ...trail(context),
      ...photos(context),
      { text: '', pageBreak: 'after' },
      ...caution(context),
    ],
  };
}
