import type { Expr, FunctionName } from './parse.ts';

/** Functions that a reader knows by another name. */
const NAMES: Readonly<Partial<Record<FunctionName, string>>> = {
  acos: 'arccos',
  atan: 'arctan',
  Phi2: 'Φ₂',
  Phi3: 'Φ₃',
  Phi4: 'Φ₄',
  Phi5: 'Φ₅',
};

const RANK = { '+': 1, '-': 1, '*': 3, '/': 3, '^': 4 } as const;

/** A formula in one line of plain text: `0.658^(Fy/Fe) · Fy`; leaves print as `leaf` says. */
export function textOf(tree: Expr, leaf: (symbol: string) => string): string {
  return print(tree, leaf, 0);
}

function print(e: Expr, leaf: (symbol: string) => string, least: number): string {
  switch (e.kind) {
    case 'number':
      return e.text;
    case 'symbol': {
      const text = e.name === 'pi' ? 'π' : leaf(e.name);
      const compound = /^[−-]/.test(text) || text.includes('×');
      return compound && least > 0 ? `(${text})` : text;
    }
    case 'negative':
      return bracketed(`−${print(e.of, leaf, 3)}`, least > 1);
    case 'call': {
      const args = e.args.map((a) => print(a, leaf, 0)).join(', ');
      if (e.fn === 'sqrt') return `√(${args})`;
      if (e.fn === 'abs') return `|${args}|`;
      return `${NAMES[e.fn] ?? e.fn}(${args})`;
    }
    case 'binary': {
      const rank = RANK[e.op];
      const op = { '+': ' + ', '-': ' − ', '*': ' · ', '/': '/', '^': '^' }[e.op];
      const left = print(e.left, leaf, e.op === '^' ? rank + 1 : rank);
      const right = print(e.right, leaf, e.op === '^' ? rank + 1 : rank + 1);
      return bracketed(`${left}${op}${right}`, rank < least);
    }
  }
}

const bracketed = (text: string, on: boolean): string => (on ? `(${text})` : text);
