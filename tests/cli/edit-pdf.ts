import {
  decodePDFRawStream,
  PDFArray,
  PDFDict,
  PDFDocument,
  PDFHexString,
  PDFName,
  PDFRawStream,
} from 'pdf-lib';

/** A change of one page's content; pages count from 1. */
export interface PageEdit {
  readonly page: number;
  readonly edit: (content: string) => string;
}

/** Changes the content of pages and writes the PDF again; each edit has to change something. */
export async function editPages(
  bytes: Uint8Array,
  edits: readonly PageEdit[],
): Promise<Uint8Array> {
  const document = await PDFDocument.load(bytes, { updateMetadata: false });
  for (const { page: number, edit } of edits) {
    const page = document.getPages()[number - 1];
    const contents = page?.node.Contents();
    const stream = contents instanceof PDFArray ? contents.lookup(0) : contents;
    if (!page || !(stream instanceof PDFRawStream)) throw new Error(`no content on page ${number}`);
    const before = Buffer.from(decodePDFRawStream(stream).decode()).toString('latin1');
    const after = edit(before);
    if (after === before) throw new Error(`an edit of page ${number} changed nothing`);
    const made = document.context.flateStream(Buffer.from(after, 'latin1'));
    page.node.set(PDFName.of('Contents'), document.context.register(made));
  }
  return document.save();
}

/** Changes the marked content of that id in a page's content. */
export function editMarked(content: string, id: number, edit: (marked: string) => string): string {
  const start = new RegExp(`/\\w+ <<\\s*/MCID ${id}\\s*>> BDC`).exec(content);
  if (!start) throw new Error(`no marked content ${id}`);
  const body = start.index + start[0].length;
  const next = /\/\w+ <<\s*(\/MCID|\/Type)/.exec(content.slice(body));
  const end = next ? body + next.index : content.length;
  return content.slice(0, start.index) + edit(content.slice(start.index, end)) + content.slice(end);
}

/** Exchanges the last two neighbouring glyphs that differ, in the last run of glyphs or the first. */
export function swapGlyphs(content: string, choose: 'first' | 'last' = 'last'): string {
  const runs = [...content.matchAll(/<((?:[0-9a-f]{4}){2,})>/g)];
  const run = runs.at(choose === 'first' ? 0 : -1);
  if (!run?.[1]) throw new Error('no run of two glyphs');
  const glyphs = run[1].match(/.{4}/g) ?? [];
  const at = glyphs.findLastIndex((glyph, i) => i > 0 && glyph !== glyphs[i - 1]);
  if (at < 1) throw new Error(`nothing to exchange in ${run[1]}`);
  glyphs.splice(at - 1, 2, glyphs[at] ?? '', glyphs[at - 1] ?? '');
  const end = run.index + run[0].length;
  return `${content.slice(0, run.index)}<${glyphs.join('')}>${content.slice(end)}`;
}

/** Changes the first alternative text that holds some words. */
export async function editAlt(
  bytes: Uint8Array,
  words: string,
  edit: (alt: string) => string,
): Promise<Uint8Array> {
  const document = await PDFDocument.load(bytes, { updateMetadata: false });
  for (const [, object] of document.context.enumerateIndirectObjects()) {
    if (!(object instanceof PDFDict)) continue;
    const alt = object.lookup(PDFName.of('Alt'));
    if (alt === undefined || !('decodeText' in alt)) continue;
    const text = (alt as PDFHexString).decodeText();
    if (!text.includes(words)) continue;
    object.set(PDFName.of('Alt'), PDFHexString.fromText(edit(text)));
    return document.save();
  }
  throw new Error(`no alternative text with ${words}`);
}
