import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs';
import { type ActualTexts, readActualTexts } from './actual-texts.ts';
import { bare, type PageText, type Segment } from './page-text.ts';

/** The PDF as anyone finds it: its embedded record and the text of its pages. */
export interface ReadPdf {
  /** Text of the attachment `record.json`, or null where there is none. */
  readonly record: string | null;
  readonly pages: readonly PageText[];
}

type Document = Awaited<ReturnType<typeof getDocument>['promise']>;
type Page = Awaited<ReturnType<Document['getPage']>>;

/** Thrown for a file that can't be read as a PDF. */
export class NotAPdf extends Error {}

/** Reads a PDF; throws NotAPdf with the reason. */
export async function readPdf(bytes: Uint8Array): Promise<ReadPdf> {
  const task = getDocument({
    // A copy: the reader takes the buffer away.
    data: Uint8Array.from(bytes),
    useSystemFonts: false,
    disableFontFace: true,
    isEvalSupported: false,
    verbosity: 0,
  });
  try {
    const document = await task.promise.catch((error: unknown) => {
      throw new NotAPdf(error instanceof Error ? error.message : String(error));
    });
    const record = await recordOf(document);
    if (record === null) return { record, pages: [] };
    const actual = await readActualTexts(bytes);
    const pages: PageText[] = [];
    for (let number = 1; number <= document.numPages; number += 1)
      pages.push(await readPage(await document.getPage(number), number, actual));
    return { record, pages };
  } finally {
    await task.destroy();
  }
}

async function recordOf(document: Document): Promise<string | null> {
  const attachments: Record<string, { filename: string; content: Uint8Array }> | null =
    await document.getAttachments();
  const found = Object.values(attachments ?? {}).find((a) => a.filename === 'record.json');
  return found ? Buffer.from(found.content).toString('utf8') : null;
}

async function readPage(page: Page, number: number, actual: ActualTexts): Promise<PageText> {
  const { items } = await page.getTextContent({
    includeMarkedContent: true,
    disableNormalization: true,
  });
  const alts = altsOf(await page.getStructTree());
  const annotations = await page.getAnnotations();
  const marked = new Map<string, MarkedText>();
  const open: (string | null)[] = [];
  let [frame, loose] = ['', ''];
  for (const item of items) {
    if (!('str' in item)) {
      if (item.type === 'endMarkedContent') open.pop();
      else open.push(item.id ?? null);
      const id = open.at(-1);
      if (id && !marked.has(id)) marked.set(id, new MarkedText());
      continue;
    }
    const text = bare(item.str);
    const part = marked.get(open.findLast((held) => held !== null) ?? '');
    if (part) part.add(text, item.transform.map(Number), item.width);
    else if (marked.size === 0) frame += text;
    else loose += text;
  }
  page.cleanup();
  return {
    number,
    segments: [...marked].map(
      ([id, { pieces, baselines }]): Segment => ({
        page: number,
        visible: pieces.join(''),
        pieces,
        baselines: baselines.length === 0 ? null : [Math.min(...baselines), Math.max(...baselines)],
        actual: actual.get(number)?.get(Number(/_mc(\d+)$/.exec(id)?.[1])) ?? [],
        alt: alts.get(id) ?? null,
      }),
    ),
    frame,
    loose,
    annotations: annotations.map((a) => String(a.subtype)).filter((kind) => kind !== 'Link'),
  };
}

/** The glyphs of one piece of marked content, as they come. */
class MarkedText {
  readonly pieces: string[] = [];
  readonly baselines: number[] = [];
  /** Where the last glyphs ended. */
  private x = Number.NaN;

  add(text: string, matrix: readonly number[], width: number): void {
    if (text === '') return;
    const [, , , size = 0, x = 0, y = 0] = matrix;
    const gap = x - this.x;
    const joined = y === this.baselines.at(-1) && gap > -0.1 * size && gap < 0.35 * size;
    if (joined) this.pieces.push(`${this.pieces.pop() ?? ''}${text}`);
    else this.pieces.push(text);
    this.baselines.push(y);
    this.x = x + width;
  }
}

interface Node {
  readonly role?: string;
  readonly alt?: string;
  readonly id?: string;
  readonly children?: readonly Node[];
}

/** Alternative text of each marked part that is the content of an element with one. */
function altsOf(tree: Node | null): Map<string, string> {
  const alts = new Map<string, string>();
  const walk = (node: Node): void => {
    for (const child of node.children ?? []) {
      if (child.id !== undefined && node.alt !== undefined) alts.set(child.id, bare(node.alt));
      walk(child);
    }
  };
  if (tree) walk(tree);
  return alts;
}
