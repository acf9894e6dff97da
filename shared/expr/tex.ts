import type { BinaryOp, Expr, FunctionName } from './parse.ts';

/** What stands in a leaf: a symbol (`F_y`), a value (`50`), or a constant of the equation. */
export interface Leaf {
  readonly tex: string;
  readonly kind: 'symbol' | 'value' | 'constant';
  /** Starts with a minus sign. */
  readonly negative: boolean;
  /** Ends in ×10ⁿ. */
  readonly power: boolean;
}

/** What a symbol of the formula prints as. */
export type LeafOf = (symbol: string) => Leaf;

const PRECEDENCE: Record<BinaryOp | 'negative' | 'leaf', number> = {
  '+': 1,
  '-': 1,
  negative: 2,
  '*': 3,
  '/': 3,
  '^': 4,
  leaf: 5,
};

const CALLS: Record<Exclude<FunctionName, 'sqrt' | 'abs'>, string> = {
  sin: '\\sin',
  cos: '\\cos',
  tan: '\\tan',
  sinh: '\\sinh',
  cosh: '\\cosh',
  tanh: '\\tanh',
  acos: '\\arccos',
  atan: '\\arctan',
  atan2: '\\operatorname{atan2}',
  Phi2: '\\Phi_{2}',
  Phi3: '\\Phi_{3}',
  Phi4: '\\Phi_{4}',
  Phi5: '\\Phi_{5}',
};

const brackets = (tex: string): string =>
  /\\d?frac|\\sqrt/.test(tex) ? `\\left(${tex}\\right)` : `(${tex})`;

const leafOf = (e: Expr, leaf: LeafOf): Leaf | null => {
  if (e.kind === 'number') return { tex: e.text, kind: 'constant', negative: false, power: false };
  if (e.kind !== 'symbol') return null;
  if (e.name === 'pi') return { tex: '\\pi', kind: 'symbol', negative: false, power: false };
  return leaf(e.name);
};

const precedence = (e: Expr, leaf: LeafOf): number => {
  if (e.kind === 'binary') return PRECEDENCE[e.op];
  if (e.kind === 'negative') return PRECEDENCE.negative;
  const found = leafOf(e, leaf);
  if (found?.negative) return PRECEDENCE.negative;
  if (found?.power || isQuotient(e, leaf)) return PRECEDENCE['*'];
  return PRECEDENCE.leaf;
};

/** TeX of a formula's tree; symbols, values and groups always stand in braces. */
export function texOf(tree: Expr, leaf: LeafOf): string {
  return print(tree, leaf, false);
}

function print(e: Expr, leaf: LeafOf, inline: boolean): string {
  switch (e.kind) {
    case 'number':
    case 'symbol':
      return `{${leafOf(e, leaf)?.tex}}`;
    case 'negative':
      return `-${within(e.of, PRECEDENCE['*'], leaf, inline)}`;
    case 'call':
      return call(e.fn, e.args, leaf, '', inline);
    case 'binary':
      return binary(e.op, e.left, e.right, leaf, inline);
  }
}

/** Prints an operand, in brackets where it binds less than `least`. */
const within = (e: Expr, least: number, leaf: LeafOf, inline: boolean): string => {
  const tex = print(e, leaf, inline);
  return precedence(e, leaf) < least ? brackets(tex) : tex;
};

function binary(op: BinaryOp, left: Expr, right: Expr, leaf: LeafOf, inline: boolean): string {
  switch (op) {
    case '+':
    case '-': {
      // After an operator a sum, and anything that starts with a minus sign, stands in brackets.
      const least = op === '-' ? PRECEDENCE['*'] : PRECEDENCE['+'];
      const tail = print(right, leaf, inline);
      const bracketed = precedence(right, leaf) < least || startsNegative(right, leaf);
      return `${print(left, leaf, inline)}${op}${bracketed ? brackets(tail) : tail}`;
    }
    case '*':
      return `${factor(left, leaf, inline, true)}${join(left, right, leaf)}${factor(right, leaf, inline, false)}`;
    case '/':
      // A quotient inside a fraction or an exponent stands on one line.
      if (!inline) return `\\frac{${print(left, leaf, true)}}{${print(right, leaf, true)}}`;
      return `${within(left, PRECEDENCE['*'], leaf, true)}/${within(right, PRECEDENCE['^'], leaf, true)}`;
    case '^': {
      const exponent = `{${print(right, leaf, true)}}`;
      if (left.kind === 'call' && left.fn !== 'sqrt' && left.fn !== 'abs')
        return call(left.fn, left.args, leaf, `^${exponent}`, inline);
      return `${within(left, PRECEDENCE.leaf, leaf, inline)}^${exponent}`;
    }
  }
}

/** A symbol that is itself written as a quotient, such as h/tw. */
const isQuotient = (e: Expr, leaf: LeafOf): boolean => {
  const found = leafOf(e, leaf);
  // The address in an \\htmlData wrap is no part of the symbol.
  return found?.kind === 'symbol' && found.tex.replace(/\\htmlData\{[^}]*\}/g, '').includes('/');
};

const startsNegative = (e: Expr, leaf: LeafOf): boolean => {
  if (e.kind === 'negative') return true;
  if (e.kind === 'binary' && (e.op === '*' || e.op === '+' || e.op === '-')) {
    if (e.op === '*' && isBareValue(e.left, leaf)) return false;
    return startsNegative(e.left, leaf);
  }
  return leafOf(e, leaf)?.negative ?? false;
};

const isBareValue = (e: Expr, leaf: LeafOf): boolean => {
  const found = leafOf(e, leaf);
  return found !== null && (found.negative || found.power);
};

/** A factor: values after the first stand in brackets, so do sums, negatives and ×10ⁿ. */
function factor(e: Expr, leaf: LeafOf, inline: boolean, first: boolean): string {
  if (e.kind === 'binary' && e.op === '*' && first) return print(e, leaf, inline);
  const tex = print(e, leaf, inline);
  // So does a power of a value, unless its base stands in brackets already.
  const raised = e.kind === 'binary' && e.op === '^' && !isBareValue(e.left, leaf) ? e.left : e;
  const later = !first && leafOf(raised, leaf)?.kind === 'value';
  // `sin kL` before a factor would take it in; `sin(kL/2)` closes itself.
  const openCall = first && e.kind === 'call' && printsBare(e.fn, e.args, leaf);
  const quotient = inline && e.kind === 'binary' && e.op === '/' && !first;
  const chain = !first && e.kind === 'binary' && e.op === '*';
  return later ||
    isQuotient(e, leaf) ||
    openCall ||
    quotient ||
    chain ||
    isBareValue(e, leaf) ||
    precedence(e, leaf) < PRECEDENCE['*']
    ? brackets(tex)
    : tex;
}

/** Between factors: a dot before a constant, else a thin space, or nothing before a bracket. */
const join = (left: Expr, right: Expr, leaf: LeafOf): string => {
  const first = firstFactor(right);
  if (
    first.kind === 'number' ||
    (first.kind === 'binary' && first.op === '^' && first.left.kind === 'number')
  )
    return '\\cdot ';
  if (leafOf(right, leaf)?.kind === 'value')
    return leafOf(left, leaf)?.kind === 'constant' ? '\\,' : '';
  return '\\,';
};

const firstFactor = (e: Expr): Expr =>
  e.kind === 'binary' && e.op === '*' ? firstFactor(e.left) : e;

function call(
  fn: FunctionName,
  args: readonly Expr[],
  leaf: LeafOf,
  power: string,
  inline: boolean,
): string {
  if (fn === 'sqrt') return `\\sqrt{${args.map((a) => print(a, leaf, inline)).join()}}`;
  if (fn === 'abs') return `\\left|${args.map((a) => print(a, leaf, inline)).join()}\\right|`;
  const printed = args.map((a) => print(a, leaf, true));
  const bare = printsBare(fn, args, leaf);
  return `${CALLS[fn]}${power}${bare ? ` ${printed[0]}` : brackets(printed.join(',\\,'))}`;
}

/** A call of one symbol stands without brackets: `sin kL`. */
const printsBare = (fn: FunctionName, args: readonly Expr[], leaf: LeafOf): boolean => {
  const only = args.length === 1 ? args[0] : undefined;
  if (!only || fn === 'sqrt' || fn === 'abs' || fn.startsWith('Phi')) return false;
  return leafOf(only, leaf)?.kind === 'symbol' && !isQuotient(only, leaf);
};
