import { createRequire } from 'node:module';
import { PAGE, SIZE } from './style';

/** What is used here of pdfkit: structure elements and marked content. */
interface TaggedDocument {
  struct(type: string, options?: object, content?: () => void): Structure;
  addStructure(element: Structure): TaggedDocument;
  markContent(tag: string, options?: object): TaggedDocument;
  endMarkedContent(): TaggedDocument;
}

interface Structure {
  add(element: Structure): Structure;
  end(): void;
}

interface Line {
  y: number;
  inlines: { fontSize: number; text: string }[];
}

interface Renderer {
  pdfDocument: TaggedDocument;
  /** The one element that all others are in. */
  structure?: Structure;
  renderPages: (this: Renderer, pages: object[]) => void;
  renderLine: (this: Renderer, line: Line, x: number, y: number) => void;
  renderVector: (this: Renderer, vector: object) => void;
  renderImage: (this: Renderer, image: Described) => void;
  renderSVG: (this: Renderer, svg: Described) => void;
}

interface Described {
  y: number;
  /** What the picture shows; without it the picture is decoration. */
  alt?: string;
}

/** Head and foot of a page repeat what the document says elsewhere. */
function isPagination(y: number): boolean {
  return y < PAGE.top - 2 || y > PAGE.height - PAGE.bottom;
}

function tagOf({ inlines }: Line): string {
  const size = inlines[0]?.fontSize ?? 0;
  if (size === SIZE.title) return 'H1';
  return size === SIZE.section ? 'H2' : 'P';
}

/**
 * Gives the document its structure while it is drawn: headings, lines of text
 * and pictures with their words in reading order; rules, page heads and feet
 * as artifacts. pdfmake asks pdfkit for a tagged file but marks nothing in it.
 */
export function tagWhatIsDrawn(): void {
  const require = createRequire(import.meta.url);
  const { default: renderer } = require('pdfmake/js/Renderer.js') as {
    default: { prototype: Renderer };
  };
  const plain = { ...pick(renderer.prototype) };

  function artifact(document: TaggedDocument, draw: () => void): void {
    document.markContent('Artifact');
    draw();
    document.endMarkedContent();
  }
  function element(of: Renderer, tag: string, options: object, draw: () => void): void {
    const struct = of.pdfDocument.struct(tag, options, draw);
    if (of.structure) of.structure.add(struct);
    else of.pdfDocument.addStructure(struct);
    struct.end();
  }
  function picture(of: Renderer, shown: Described, draw: () => void): void {
    if (shown.alt === undefined || isPagination(shown.y)) artifact(of.pdfDocument, draw);
    else element(of, 'Figure', { alt: shown.alt }, draw);
  }

  renderer.prototype.renderPages = function (pages) {
    this.structure = this.pdfDocument.struct('Document');
    this.pdfDocument.addStructure(this.structure);
    plain.renderPages.call(this, pages);
    this.structure.end();
  };
  renderer.prototype.renderLine = function (line, x, y) {
    const draw = () => plain.renderLine.call(this, line, x, y);
    if (line.inlines.length === 0) draw();
    else if (isPagination(y)) artifact(this.pdfDocument, draw);
    else element(this, tagOf(line), {}, draw);
  };
  renderer.prototype.renderVector = function (vector) {
    artifact(this.pdfDocument, () => plain.renderVector.call(this, vector));
  };
  renderer.prototype.renderImage = function (image) {
    picture(this, image, () => plain.renderImage.call(this, image));
  };
  renderer.prototype.renderSVG = function (svg) {
    picture(this, svg, () => plain.renderSVG.call(this, svg));
  };
}

function pick(prototype: Renderer) {
  const { renderPages, renderLine, renderVector, renderImage, renderSVG } = prototype;
  return { renderPages, renderLine, renderVector, renderImage, renderSVG };
}
