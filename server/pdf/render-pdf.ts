import type { DocumentTree } from '#shared/report/tree.ts';
import type { BlockContext } from './block-context.ts';
import { FontSet } from './font-set.ts';
import type { Row, Tag } from './items.ts';
import { measureDocument } from './measure-document.ts';
import { openDocument } from './open-document.ts';
import { frameItems } from './page-frame.ts';
import { paginate } from './paginate.ts';
import { type Destinations, Painter } from './painter.ts';
import { papers } from './paper.ts';
import { TagTree } from './tag-tree.ts';

export interface PdfOptions {
  /** Stands in the file as its date; the same tree, record and date give the same bytes. */
  readonly date: Date;
  /** Canonical text of the record, embedded as `record.json`; null for a document without one. */
  readonly record: string | null;
}

/**
 * Renders a document tree as a tagged PDF/A-3a file with the record embedded. Throws
 * UnknownLayoutError on TeX the setter doesn't know and KaTeX's ParseError on wrong TeX.
 */
export async function renderPdf(tree: DocumentTree, options: PdfOptions): Promise<Buffer> {
  const { frame } = tree;
  const paper = papers[frame.paper];
  const doc = openDocument(paper, {
    title: tree.title,
    author: frame.firm,
    subject: [frame.project, frame.calculation, frame.revision].filter(Boolean).join(', '),
    language: tree.language,
    date: options.date,
  });
  const bytes = collect(doc);
  const fonts = new FontSet(doc);
  const rows = measureDocument(tree, paper, fonts);
  const pages = paginate(rows, paper);
  const tags = new TagTree(doc);
  const painter = new Painter(doc, fonts, tags, destinationsOf(rows));
  const sect: Tag = { type: 'Sect', parent: null };
  const context: BlockContext = { fonts, width: 0, sect, linkOf: () => null };
  for (const [index, page] of pages.entries()) {
    doc.addPage();
    const number = { sheet: index + 1, of: pages.length };
    painter.paint(
      { tag: null, items: frameItems(frame, page.running, number, paper, context) },
      0,
      0,
    );
    for (const row of page.rows) {
      for (const part of row.parts) painter.paint(part, paper.left, row.y);
    }
  }
  tags.end();
  if (options.record !== null) attachRecord(doc, options.record, options.date);
  doc.end();
  return bytes;
}

/** Short names in rising order: PDFKit sorts names by language, readers search them by bytes. */
function destinationsOf(rows: readonly Row[]): Destinations {
  const names = rows.flatMap((row) =>
    row.parts.flatMap((part) =>
      part.items.flatMap((item) => (item.kind === 'anchor' ? [item.name] : [])),
    ),
  );
  return new Map(names.map((name, index) => [name, `line-${String(index).padStart(6, '0')}`]));
}

function attachRecord(doc: PDFKit.PDFDocument, record: string, date: Date): void {
  doc.file(Buffer.from(record, 'utf8'), {
    name: 'record.json',
    type: 'application/json',
    description: 'The calculation record this document shows',
    relationship: 'Data',
    creationDate: date,
    modifiedDate: date,
  });
}

function collect(doc: PDFKit.PDFDocument): Promise<Buffer> {
  return new Promise((resolve, reject) => {
    const parts: Buffer[] = [];
    doc.on('data', (part: Buffer) => parts.push(part));
    doc.on('end', () => resolve(Buffer.concat(parts)));
    doc.on('error', reject);
  });
}
