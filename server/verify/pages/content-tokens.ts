/** A token of a page's content stream, as far as marked content needs it. */
export type Token =
  | { readonly kind: 'operator'; readonly name: string }
  | { readonly kind: 'name'; readonly name: string }
  | { readonly kind: 'string'; readonly bytes: Uint8Array }
  | { readonly kind: 'number'; readonly value: number }
  | { readonly kind: 'open' | 'close' };

const WHITE = /[\0\t\n\f\r ]/;
const DELIMITER = /[()<>[\]{}/%]/;
const ESCAPES: Readonly<Record<string, number>> = { n: 10, r: 13, t: 9, b: 8, f: 12 };

/** Cuts a content stream into tokens; arrays are passed over, dictionaries open and close. */
export function* tokens(content: Uint8Array): Generator<Token> {
  const text = Buffer.from(content).toString('latin1');
  let at = 0;
  while (at < text.length) {
    const c = text[at] ?? '';
    if (WHITE.test(c) || c === '[' || c === ']' || c === '{' || c === '}') at += 1;
    else if (c === '%') {
      while (at < text.length && !/[\r\n]/.test(text[at] ?? '')) at += 1;
    } else if (text.startsWith('<<', at) || text.startsWith('>>', at)) {
      yield { kind: c === '<' ? 'open' : 'close' };
      at += 2;
    } else if (c === '(') {
      const { bytes, end } = literal(text, at);
      yield { kind: 'string', bytes };
      at = end;
    } else if (c === '<') {
      const end = Math.max(text.indexOf('>', at), at);
      const hex = text.slice(at + 1, end).replace(/[^0-9a-f]/gi, '');
      yield { kind: 'string', bytes: Buffer.from(hex.length % 2 ? `${hex}0` : hex, 'hex') };
      at = end + 1;
    } else if (c === ')' || c === '>') at += 1;
    else {
      let end = at + 1;
      while (end < text.length && !WHITE.test(text[end] ?? '') && !DELIMITER.test(text[end] ?? ''))
        end += 1;
      const word = text.slice(at, end);
      at = end;
      if (word === 'ID') at = afterImage(text, at);
      yield tokenOf(word);
    }
  }
}

const tokenOf = (word: string): Token => {
  if (word.startsWith('/'))
    return {
      kind: 'name',
      name: word
        .slice(1)
        .replace(/#([0-9a-f]{2})/gi, (_, hex: string) =>
          String.fromCharCode(Number.parseInt(hex, 16)),
        ),
    };
  return /^[+-]?(\d+\.?\d*|\.\d+)$/.test(word)
    ? { kind: 'number', value: Number(word) }
    : { kind: 'operator', name: word };
};

/** Data of an inline image end with `EI` between white space. */
function afterImage(text: string, at: number): number {
  const end = /[\0\t\n\f\r ]EI(?=[\0\t\n\f\r ]|$)/g;
  end.lastIndex = at;
  return end.exec(text) ? end.lastIndex : text.length;
}

/** A string in round brackets, its escapes undone. */
function literal(text: string, start: number): { bytes: Uint8Array; end: number } {
  const bytes: number[] = [];
  let depth = 0;
  let at = start;
  for (; at < text.length; at += 1) {
    const c = text[at] ?? '';
    if (c === '\\') {
      at += 1;
      const octal = /^[0-7]{1,3}/.exec(text.slice(at, at + 3))?.[0];
      const escaped = text[at] ?? '';
      if (octal) {
        bytes.push(Number.parseInt(octal, 8) & 255);
        at += octal.length - 1;
      } else if (escaped === '\r' && text[at + 1] === '\n') at += 1;
      else if (escaped !== '\n' && escaped !== '\r')
        bytes.push(ESCAPES[escaped] ?? escaped.charCodeAt(0));
      continue;
    }
    if (c === '(') depth += 1;
    if (c === ')') depth -= 1;
    if (depth === 0) return { bytes: Uint8Array.from(bytes), end: at + 1 };
    if (at > start) bytes.push(c.charCodeAt(0));
  }
  return { bytes: Uint8Array.from(bytes), end: at };
}
