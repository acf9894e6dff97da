import {
  absDependencies,
  acosDependencies,
  addDependencies,
  atan2Dependencies,
  atanDependencies,
  type BigNumber,
  bignumberDependencies,
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
} from 'mathjs';

/*
 * The second evaluator: the same text as the books', evaluated in decimal numbers of 34 digits by
 * the full mathjs, apart from the number-only instance that made the record. It has no constants;
 * pi is bound by name.
 */
const math = create(
  {
    parseDependencies,
    bignumberDependencies,
    addDependencies,
    subtractDependencies,
    multiplyDependencies,
    divideDependencies,
    powDependencies,
    unaryMinusDependencies,
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
  } as unknown as FactoryFunctionMap,
  { number: 'BigNumber', precision: 34, predictable: true },
);

/** Where Φₙ takes its closed form; below, 34 digits leave room for the series' cancellation. */
const SERIES_TO = 100;

/** Φₙ(x) of formula texts: its series, or Φₙ₊₂ = (1/n! − Φₙ)/x from the circular or hyperbolic Φ₀, Φ₁. */
const series =
  (n: number) =>
  (x: BigNumber): BigNumber => {
    let term = math.bignumber(1);
    for (let i = 2; i <= n; i += 1) term = term.dividedBy(i);
    if (!x.abs().lessThanOrEqualTo(SERIES_TO)) {
      const arc = x.abs().sqrt();
      const start = n % 2 === 0 ? math.bignumber(1) : arc;
      const [odd, even] = x.isNegative() ? [arc.sinh(), arc.cosh()] : [arc.sin(), arc.cos()];
      let value = (n % 2 === 0 ? even : odd).dividedBy(start);
      let inverse = math.bignumber(1);
      for (let m = n % 2; m < n; m += 2) {
        value = inverse.minus(value).dividedBy(x);
        inverse = inverse.dividedBy((m + 1) * (m + 2));
      }
      return value;
    }
    let sum = math.bignumber(0);
    for (let j = n; !sum.plus(term).equals(sum); j += 2) {
      sum = sum.plus(term);
      term = term
        .times(x)
        .negated()
        .dividedBy((j + 1) * (j + 2));
    }
    return sum;
  };
math.import({ Phi2: series(2), Phi3: series(3), Phi4: series(4), Phi5: series(5) });

const PI = math.bignumber('3.141592653589793238462643383279502884');

/** Agreement asked of a formula line: relative, and of the largest term where terms cancel. */
const RELATIVE = 1e-9;
const OF_LARGEST_TERM = 1e-12;
/** A sum this much smaller than its largest term has cancelled. */
const CANCELLED = 1e-3;

type Scope = Map<string, BigNumber>;
type Sum = MathNode & { readonly fn: string; readonly args: readonly [MathNode, MathNode] };

/** The very number a double holds, not the shortest decimal that reads as it. */
const exactly = (value: number): BigNumber => math.bignumber(value.toPrecision(60));

const parsed = new Map<string, MathNode>();

function parse(expression: string): MathNode {
  const known = parsed.get(expression);
  if (known) return known;
  const node = math.parse(expression);
  parsed.set(expression, node);
  return node;
}

/** Operands by name; throws where a symbol has none, which mathjs might read as a unit. */
function scopeOf(expression: string, operands: Readonly<Record<string, number>>): Scope {
  for (const name of symbolsIn(expression))
    if (!Object.hasOwn(operands, name)) throw new Error(`${expression}: no operand ${name}`);
  return new Map([
    ...Object.entries(operands).map(([name, value]) => [name, exactly(value)] as const),
    ['pi', PI] as const,
  ]);
}

const evaluate = (node: MathNode, scope: Scope): BigNumber =>
  math.bignumber(node.evaluate(new Map(scope)));

/**
 * Value of an expression in 34 digits, as the nearest number; not finite where it has none. Throws
 * on a syntax error and on a symbol without an operand.
 */
export const evaluatePrecisely = (
  expression: string,
  operands: Readonly<Record<string, number>>,
): number => evaluate(parse(expression), scopeOf(expression, operands)).toNumber();

/** Whether a recorded value is what the expression gives with these operands. */
export function reproduces(
  expression: string,
  operands: Readonly<Record<string, number>>,
  value: number,
): boolean {
  const [node, scope] = [parse(expression), scopeOf(expression, operands)];
  const exact = evaluate(node, scope);
  if (!exact.isFinite()) return false;
  const off = exact.minus(exactly(value)).abs();
  return (
    off.lessThanOrEqualTo(exact.abs().times(RELATIVE)) ||
    off.lessThanOrEqualTo(cancellation(node, scope, exact))
  );
}

/** How far the value may be off because terms in it cancel: each such sum moved by its share. */
function cancellation(node: MathNode, scope: Scope, exact: BigNumber): BigNumber {
  return sumsIn(node).reduce((total, sum) => {
    const terms = sum.args.map((term) => evaluate(term, scope).abs());
    const largest = terms.reduce((a, b) => (a.greaterThan(b) ? a : b));
    const whole = evaluate(sum, scope).abs();
    if (whole.greaterThan(largest.times(CANCELLED))) return total;
    const share = largest.times(OF_LARGEST_TERM);
    const moved = node.transform((part) =>
      part === sum ? math.parse(`(${sum.toString()})+cancelledShare`) : part,
    );
    const there = evaluate(moved, new Map([...scope, ['cancelledShare', share]]));
    return there.isFinite() ? total.plus(there.minus(exact).abs()) : total;
  }, math.bignumber(0));
}

const sumsIn = (node: MathNode): Sum[] =>
  node.filter((part): boolean => {
    const { fn } = part as Partial<Sum>;
    return part.type === 'OperatorNode' && (fn === 'add' || fn === 'subtract');
  }) as Sum[];

/** Names of the symbols in an expression, without functions and pi. */
export function symbolsIn(expression: string): Set<string> {
  const names = new Set<string>();
  parse(expression).traverse((node, path) => {
    if (node.type !== 'SymbolNode' || path === 'fn') return;
    const { name } = node as unknown as { name: string };
    if (name !== 'pi') names.add(name);
  });
  return names;
}
