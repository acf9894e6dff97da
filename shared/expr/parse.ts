import {
  absDependencies,
  acosDependencies,
  addDependencies,
  atan2Dependencies,
  atanDependencies,
  cosDependencies,
  coshDependencies,
  create,
  divideDependencies,
  type FactoryFunctionMap,
  type MathNode,
  multiplyDependencies,
  parseDependencies,
  powDependencies,
  sinDependencies,
  sinhDependencies,
  sqrtDependencies,
  subtractDependencies,
  tanDependencies,
  tanhDependencies,
  unaryMinusDependencies,
  unaryPlusDependencies,
} from 'mathjs/number';
import { isRounding } from '../units/equal.ts';
import { seriesFunction } from './series-functions.ts';

// Number-only, and only the functions that the books use: no constants and no units, so that E, A,
// J, L, b, h, phi, tau stay symbols. The names are mathjs's own.
const used = {
  parseDependencies,
  addDependencies,
  subtractDependencies,
  multiplyDependencies,
  divideDependencies,
  powDependencies,
  unaryMinusDependencies,
  unaryPlusDependencies,
  sqrtDependencies,
  sinDependencies,
  cosDependencies,
  tanDependencies,
  sinhDependencies,
  coshDependencies,
  tanhDependencies,
  acosDependencies,
  atanDependencies,
  atan2Dependencies,
  absDependencies,
};
const math = create(used as FactoryFunctionMap);
math.import({
  Phi2: (x: number) => seriesFunction(2, x),
  Phi3: (x: number) => seriesFunction(3, x),
  Phi4: (x: number) => seriesFunction(4, x),
  Phi5: (x: number) => seriesFunction(5, x),
});

/** Functions a formula may call; Φₙ as in series-functions.ts. */
export const FUNCTIONS = [
  'sqrt',
  'sin',
  'cos',
  'tan',
  'sinh',
  'cosh',
  'tanh',
  'acos',
  'atan',
  'atan2',
  'abs',
  'Phi2',
  'Phi3',
  'Phi4',
  'Phi5',
] as const;
export type FunctionName = (typeof FUNCTIONS)[number];

/** The parsed form of a formula's text: plain data, from which value, TeX and text are all made. */
export type Expr =
  | { readonly kind: 'number'; readonly text: string; readonly value: number }
  | { readonly kind: 'symbol'; readonly name: string }
  | { readonly kind: 'negative'; readonly of: Expr }
  | { readonly kind: 'binary'; readonly op: BinaryOp; readonly left: Expr; readonly right: Expr }
  | { readonly kind: 'call'; readonly fn: FunctionName; readonly args: readonly Expr[] };
export type BinaryOp = '+' | '-' | '*' | '/' | '^';

interface ConstantLike {
  value: unknown;
}
interface SymbolLike {
  name: string;
}
interface OperatorLike {
  op: string;
  fn: string;
  args: MathNode[];
  implicit: boolean;
}
interface FunctionLike {
  fn: { name: string };
  args: MathNode[];
}
interface ParenthesisLike {
  content: MathNode;
}

export interface ParsedExpression {
  readonly text: string;
  readonly tree: Expr;
  /** Symbols used, in order of first appearance; `pi` is not among them. */
  readonly symbols: readonly string[];
  /** Value at these operands; not a finite number where the formula has none. */
  evaluate(operands: Readonly<Record<string, number>>): number;
  /** As `evaluate`, but a sum whose terms cancel, all but their last bits, is zero, as are its multiples and its size. */
  settle(operands: Readonly<Record<string, number>>): number;
}

const cache = new Map<string, ParsedExpression>();

/** Parses a formula's text once; throws on a syntax or a function the books don't use. */
export function parseExpression(text: string): ParsedExpression {
  const known = cache.get(text);
  if (known) return known;
  const node = math.parse(text);
  const tree = Object.freeze(fromNode(node, text, literals(text)));
  const code = node.compile();
  const sum = sumIn(node);
  const whole = sum?.compile();
  const terms = sum ? termsOf(sum).map((term) => term.compile()) : [];
  const evaluate: ParsedExpression['evaluate'] = (operands) =>
    Number(code.evaluate({ ...operands, pi: Math.PI }));
  const parsed: ParsedExpression = Object.freeze({
    text,
    tree,
    symbols: Object.freeze([...symbolsOf(tree)]),
    evaluate,
    settle: (operands: Readonly<Record<string, number>>) => {
      const value = evaluate(operands);
      if (!whole || !Number.isFinite(value)) return value;
      const scope = { ...operands, pi: Math.PI };
      const sizes = terms.map((term) => Math.abs(Number(term.evaluate({ ...scope }))));
      const left = Math.abs(Number(whole.evaluate({ ...scope })));
      return isRounding(left, Math.max(...sizes)) ? 0 : value;
    },
  });
  cache.set(text, parsed);
  return parsed;
}

/** The sum that an expression is, or whose multiple or size it is; null where it is none of these. */
function sumIn(node: MathNode): MathNode | null {
  if (node.type === 'ParenthesisNode') return sumIn((node as unknown as ParenthesisLike).content);
  if (node.type === 'FunctionNode') {
    const { fn, args } = node as unknown as FunctionLike;
    return fn.name === 'abs' && args[0] ? sumIn(args[0]) : null;
  }
  if (node.type !== 'OperatorNode') return null;
  const { fn, args } = node as unknown as OperatorLike;
  const [left, right] = args;
  if (fn === 'add' || fn === 'subtract') return node;
  if (!left) return null;
  if (fn === 'divide' || fn === 'unaryMinus') return sumIn(left);
  return fn === 'multiply' && right ? (sumIn(left) ?? sumIn(right)) : null;
}

/** The terms of a sum, without their signs; an expression that is no sum is its one term. */
function termsOf(node: MathNode): MathNode[] {
  if (node.type === 'ParenthesisNode') return termsOf((node as unknown as ParenthesisLike).content);
  const { fn, args } = node as unknown as OperatorLike;
  return node.type === 'OperatorNode' && (fn === 'add' || fn === 'subtract')
    ? args.flatMap(termsOf)
    : [node];
}

/** Number literals as written, in order; mathjs keeps their values only, and `5.70` prints as such. */
const literals = (text: string): string[] =>
  text.match(/(?<![A-Za-z0-9_.])(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d+)?/g) ?? [];

/** Reads the tree in the order of the text, so that `rest` yields each constant as written. */
function fromNode(node: MathNode, text: string, rest: string[]): Expr {
  switch (node.type) {
    case 'ConstantNode': {
      const { value } = node as unknown as ConstantLike;
      const written = rest.shift();
      if (written === undefined || Number(written) !== Number(value))
        throw new Error(`constant ${String(value)} not found in "${text}"`);
      return { kind: 'number', text: written, value: Number(value) };
    }
    case 'SymbolNode':
      return { kind: 'symbol', name: (node as unknown as SymbolLike).name };
    case 'ParenthesisNode':
      return fromNode((node as unknown as ParenthesisLike).content, text, rest);
    case 'OperatorNode': {
      const { op, fn, args, implicit } = node as unknown as OperatorLike;
      if (implicit) throw new Error(`implicit multiplication in "${text}"`);
      const [left, right] = args;
      if (fn === 'unaryMinus' && left) return { kind: 'negative', of: fromNode(left, text, rest) };
      if (left && right && (op === '+' || op === '-' || op === '*' || op === '/' || op === '^'))
        return {
          kind: 'binary',
          op,
          left: fromNode(left, text, rest),
          right: fromNode(right, text, rest),
        };
      throw new Error(`operator ${op} in "${text}"`);
    }
    case 'FunctionNode': {
      const { fn, args } = node as unknown as FunctionLike;
      const name = FUNCTIONS.find((f) => f === fn.name);
      if (!name) throw new Error(`function ${fn.name} in "${text}"`);
      return { kind: 'call', fn: name, args: args.map((a) => fromNode(a, text, rest)) };
    }
    default:
      throw new Error(`${node.type} in "${text}"`);
  }
}

function* walk(tree: Expr): Generator<Expr> {
  yield tree;
  if (tree.kind === 'negative') yield* walk(tree.of);
  if (tree.kind === 'binary') {
    yield* walk(tree.left);
    yield* walk(tree.right);
  }
  if (tree.kind === 'call') for (const arg of tree.args) yield* walk(arg);
}

const symbolsOf = (tree: Expr): Set<string> => {
  const names = new Set<string>();
  for (const part of walk(tree))
    if (part.kind === 'symbol' && part.name !== 'pi') names.add(part.name);
  return names;
};
