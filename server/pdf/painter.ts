import type { FontSet } from './font-set.ts';
import type { Item, ItemOf, Part } from './items.ts';
import { drawFormula } from './math/draw-formula.ts';
import type { Segment } from './math/svg-path.ts';
import { operator, pdfNumber } from './operators.ts';
import { type InkName, inks } from './paper.ts';
import type { TagTree } from './tag-tree.ts';
import { setText } from './text-runs.ts';

/** A place in the document that a link can go to, by its anchor's name. */
export type Destinations = ReadonlyMap<string, string>;

/** Paints measured items on the current page of a document. */
export class Painter {
  readonly #doc: PDFKit.PDFDocument;
  readonly #fonts: FontSet;
  readonly #tags: TagTree;
  readonly #destinations: Destinations;
  readonly #outline: { level: number; item: PDFKit.PDFOutline }[] = [];

  constructor(doc: PDFKit.PDFDocument, fonts: FontSet, tags: TagTree, destinations: Destinations) {
    this.#doc = doc;
    this.#fonts = fonts;
    this.#tags = tags;
    this.#destinations = destinations;
  }

  /** Paints a part with its left end at x and its row's top at y, points from the page's corner. */
  paint({ tag, items }: Part, x: number, y: number): void {
    const content = items.filter(
      ({ kind }) => kind === 'text' || kind === 'formula' || kind === 'path',
    );
    const draw = (): void => {
      for (const item of content) this.#draw(item, x, y);
    };
    if (!tag) {
      this.#doc.markContent('Artifact', { type: 'Layout' });
      draw();
      this.#doc.endMarkedContent();
      return;
    }
    for (const item of items) {
      if (item.kind === 'anchor') this.#anchor(item.name, x, y);
      if (item.kind === 'bookmark') this.#bookmark(item);
    }
    if (content.length > 0) this.#tags.mark(tag, draw);
    const links = items.filter((item) => item.kind === 'link');
    const known = links.filter((link) => this.#destinations.has(link.to));
    if (known.length === 0) return;
    const structParent = this.#tags.element({ type: 'Link', parent: tag });
    for (const link of known) this.#link(link, x, y, structParent);
  }

  #draw(item: Item, x: number, y: number): void {
    if (item.kind === 'text') this.#text(item, x, y);
    else if (item.kind === 'path') this.#path(item, x, y);
    else if (item.kind === 'formula') {
      this.#fill(item.ink);
      this.#saying(item.text, () => {
        for (const { dy, formula } of item.lines) {
          const place = { x: x + item.x, y: y + item.y + dy, size: item.size };
          drawFormula(this.#doc, this.#fonts, formula, place);
        }
      });
    }
  }

  #text(item: ItemOf<'text'>, x: number, y: number): void {
    const { runs, altered } = setText(this.#fonts, item.face, item.text);
    const lines = runs.map(({ x: dx, rise, scale, shaped }) => {
      const font = `/${this.#fonts.use(item.face)} ${operator('Tf', item.size * scale)}`;
      const place = [x + item.x + dx * item.size, y + item.y - rise * item.size] as const;
      return `${font} ${operator('Tm', 1, 0, 0, -1, ...place)} ${shaped.operator}`;
    });
    const show = (): void => {
      this.#doc.addContent(['BT', ...lines, 'ET'].join('\n'));
    };
    this.#fill(item.ink);
    if (altered) this.#saying(item.text, show);
    else show();
  }

  /** Content that extraction reads as the given text. */
  #saying(text: string, draw: () => void): void {
    this.#doc.markContent('Span', { actual: text });
    draw();
    this.#doc.endMarkedContent();
  }

  #path({ path, fill, stroke }: ItemOf<'path'>, x: number, y: number): void {
    const parts = path.map((segment) => pathOperator(segment, x, y));
    if (fill) this.#fill(fill);
    if (stroke) {
      const dash = `[${(stroke.dash ?? []).map(pdfNumber).join(' ')}] 0 d`;
      this.#doc.addContent(`${colour(stroke.ink)} RG ${operator('w', stroke.width)} ${dash}`);
    }
    const paint = fill && stroke ? 'B' : fill ? 'f' : 'S';
    this.#doc.addContent(`${parts.join(' ')} ${paint}`);
  }

  #fill(ink: InkName): void {
    this.#doc.addContent(`${colour(ink)} rg`);
  }

  #anchor(name: string, x: number, y: number): void {
    const destination = this.#destinations.get(name);
    if (destination) this.#doc.addNamedDestination(destination, 'XYZ', x - 12, y - 12, null);
  }

  #link(
    { x: dx, y: dy, width, height, to, says }: ItemOf<'link'>,
    x: number,
    y: number,
    structParent: PDFKit.PDFStructureElement,
  ): void {
    const destination = this.#destinations.get(to) ?? '';
    // PDFKit writes a plain string as a name, a String object as text.
    const Contents = Object(says) as string;
    this.#doc.goTo(x + dx, y + dy, width, height, destination, { Contents, structParent });
  }

  #bookmark({ level, title }: ItemOf<'bookmark'>): void {
    while ((this.#outline.at(-1)?.level ?? 0) >= level) this.#outline.pop();
    const parent = this.#outline.at(-1)?.item ?? this.#doc.outline;
    this.#outline.push({ level, item: parent.addItem(title) });
  }
}

/** Red, green and blue of an ink, 0 to 1. */
function colour(ink: InkName): string {
  const channels = [1, 3, 5].map((at) => Number.parseInt(inks[ink].slice(at, at + 2), 16) / 255);
  return channels.map(pdfNumber).join(' ');
}

function pathOperator(segment: Segment, x: number, y: number): string {
  if (segment.op === 'close') return 'h';
  const end = [x + segment.x, y + segment.y] as const;
  if (segment.op !== 'curve') return operator(segment.op === 'move' ? 'm' : 'l', ...end);
  const { x1, y1, x2, y2 } = segment;
  return operator('c', x + x1, y + y1, x + x2, y + y2, ...end);
}
