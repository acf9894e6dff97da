import type { Tag } from './items.ts';

interface OpenElement {
  readonly tag: Tag;
  readonly element: PDFKit.PDFStructureElement;
}

/**
 * Writes the document's structure while its pages are drawn. Content comes in reading order, so
 * an element that the next content isn't part of is finished and can leave memory.
 */
export class TagTree {
  readonly #open: OpenElement[] = [];
  readonly #doc: PDFKit.PDFDocument;

  constructor(doc: PDFKit.PDFDocument) {
    this.#doc = doc;
  }

  /** The element of a tag, opening it and what it stands in. */
  element(tag: Tag): PDFKit.PDFStructureElement {
    const path: Tag[] = [];
    for (let node: Tag | null = tag; node; node = node.parent) path.unshift(node);
    const shared = path.findIndex((node, index) => this.#open[index]?.tag !== node);
    this.#closeTo(shared < 0 ? path.length : shared);
    for (const node of path.slice(this.#open.length)) this.#enter(node);
    const last = this.#open.at(-1);
    if (!last) throw new Error('a tag without a path');
    return last.element;
  }

  /** Draws content as part of a tag. */
  mark(tag: Tag, draw: () => void): void {
    const element = this.element(tag);
    const content = this.#doc.markStructureContent(tag.type);
    draw();
    this.#doc.endMarkedContent();
    element.add(content);
  }

  end(): void {
    this.#closeTo(0);
  }

  #enter(tag: Tag): void {
    const options = {
      ...(tag.alt === undefined ? {} : { alt: tag.alt }),
      ...(tag.scope === undefined ? {} : { scope: tag.scope }),
    };
    const element = this.#doc.struct(tag.type, options);
    const parent = this.#open.at(-1);
    if (parent) parent.element.add(element);
    else this.#doc.addStructure(element);
    this.#open.push({ tag, element });
  }

  #closeTo(depth: number): void {
    while (this.#open.length > depth) this.#open.pop()?.element.end();
  }
}
