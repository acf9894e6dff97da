import {
  decodePDFRawStream,
  PDFArray,
  PDFDict,
  PDFDocument,
  PDFHexString,
  PDFName,
  type PDFPage,
  PDFRawStream,
  PDFString,
} from 'pdf-lib';
import { type Token, tokens } from './content-tokens.ts';
import { bare } from './page-text.ts';

/** By page number and marked-content id: the texts that stand for glyphs when copied. */
export type ActualTexts = ReadonlyMap<number, ReadonlyMap<number, readonly string[]>>;

/** Reads every ActualText of a PDF's pages, bare of spaces. */
export async function readActualTexts(bytes: Uint8Array): Promise<ActualTexts> {
  const document = await PDFDocument.load(bytes, {
    updateMetadata: false,
    throwOnInvalidObject: false,
  });
  return new Map(document.getPages().map((page, index) => [index + 1, ofPage(page)]));
}

function ofPage(page: PDFPage): Map<number, string[]> {
  const found = new Map<number, string[]>();
  const open: (number | null)[] = [];
  for (const { operator, id, text } of marks(contentOf(page), propertiesOf(page))) {
    if (operator === 'EMC') {
      open.pop();
      continue;
    }
    open.push(id);
    const within = open.findLast((held) => held !== null) ?? -1;
    if (text !== null) found.set(within, [...(found.get(within) ?? []), bare(text)]);
  }
  return found;
}

interface Mark {
  readonly operator: 'BMC' | 'BDC' | 'EMC';
  readonly id: number | null;
  readonly text: string | null;
}

/** The operators that open and close marked content, with what their properties say. */
function* marks(content: Uint8Array, named: (name: string) => Partial<Mark>): Generator<Mark> {
  let operands: Token[] = [];
  for (const token of tokens(content)) {
    if (token.kind !== 'operator') {
      operands.push(token);
      continue;
    }
    const { name } = token;
    if (name === 'BMC' || name === 'EMC') yield { operator: name, id: null, text: null };
    if (name === 'BDC') {
      const last = operands.at(-1);
      const said = last?.kind === 'name' ? named(last.name) : inline(operands);
      yield { operator: name, id: said.id ?? null, text: said.text ?? null };
    }
    operands = [];
  }
}

function inline(operands: readonly Token[]): Partial<Mark> {
  const after = (key: string): Token | undefined => {
    const at = operands.findIndex((t) => t.kind === 'name' && t.name === key);
    return at < 0 ? undefined : operands[at + 1];
  };
  const [id, text] = [after('MCID'), after('ActualText')];
  return {
    ...(id?.kind === 'number' ? { id: id.value } : {}),
    ...(text?.kind === 'string' ? { text: decoded(text.bytes) } : {}),
  };
}

/** Text of a PDF string: UTF-16 with its mark, else bytes of PDFDocEncoding. */
const decoded = (bytes: Uint8Array): string =>
  PDFHexString.of(Buffer.from(bytes).toString('hex')).decodeText();

/** Property lists that stand in the page's resources under a name. */
function propertiesOf(page: PDFPage): (name: string) => Partial<Mark> {
  const lists = page.node.Resources()?.lookupMaybe(PDFName.of('Properties'), PDFDict);
  return (name) => {
    const list = lists?.lookupMaybe(PDFName.of(name), PDFDict);
    const text = list?.lookup(PDFName.of('ActualText'));
    const id = list?.lookup(PDFName.of('MCID'))?.toString();
    return {
      ...(text instanceof PDFString || text instanceof PDFHexString
        ? { text: text.decodeText() }
        : {}),
      ...(id === undefined ? {} : { id: Number(id) }),
    };
  };
}

function contentOf(page: PDFPage): Uint8Array {
  const contents = page.node.Contents();
  const streams =
    contents instanceof PDFArray
      ? contents.asArray().map((ref) => page.node.context.lookup(ref))
      : [contents];
  return Buffer.concat(
    streams.flatMap((stream) =>
      stream instanceof PDFRawStream
        ? [decodePDFRawStream(stream).decode(), Buffer.from('\n')]
        : [],
    ),
  );
}
