/*
 * Reads the TeX of a formula as a person reads the printed line: braces that print nothing bind
 * nothing, factors stand side by side, a minus sign belongs to what it stands before. What could be
 * read in two ways is refused. Written apart from the printer that it tests.
 */
import { seriesFunction } from '#shared/expr/series-functions.ts';

type Node =
  | { readonly kind: 'number'; readonly value: number }
  | { readonly kind: 'symbol'; readonly name: string }
  | {
      readonly kind: 'sign';
      readonly sign: '+' | '-' | '/' | '\\cdot' | '\\times' | ',' | '(' | ')';
    }
  | { readonly kind: 'space' }
  | { readonly kind: 'bar'; readonly open: boolean }
  | { readonly kind: 'fraction'; readonly above: Node[]; readonly below: Node[] }
  | { readonly kind: 'root'; readonly of: Node[] }
  | { readonly kind: 'raised'; readonly by: Node[] }
  | { readonly kind: 'function'; readonly name: string };

class Characters {
  at = 0;
  constructor(readonly text: string) {}
  get rest(): string {
    return this.text.slice(this.at);
  }
  take(pattern: RegExp): RegExpExecArray | null {
    // Patterns are sticky: they match here or not at all.
    pattern.lastIndex = this.at;
    const found = pattern.exec(this.text);
    if (found) this.at += found[0].length;
    return found;
  }
  need(pattern: RegExp): RegExpExecArray {
    const found = this.take(pattern);
    if (!found) throw new Error(`${pattern} expected at "${this.rest.slice(0, 30)}"`);
    return found;
  }
}

/** The raw content of a group in braces. */
function group(c: Characters): string {
  c.need(/\{/y);
  const from = c.at;
  for (let depth = 1; ; c.at += 1) {
    const sign = c.text[c.at];
    if (sign === undefined) throw new Error('a brace is not closed');
    if (sign === '{') depth += 1;
    if (sign === '}') depth -= 1;
    if (depth === 0) break;
  }
  c.at += 1;
  return c.text.slice(from, c.at - 1);
}

type Sign = Extract<Node, { kind: 'sign' }>['sign'];

/** Every mark that a formula may print, with what it is; the first pattern that fits counts. */
const MARKS: readonly (readonly [RegExp, (found: string, c: Characters) => Node[]])[] = [
  [/\s+/y, () => []],
  [/\\,/y, () => [{ kind: 'space' }]],
  [
    /\d+(?:\\,\d{3})*(?:\.\d+)?/y,
    (found) => [{ kind: 'number', value: Number(found.replaceAll('\\,', '')) }],
  ],
  [
    /\\htmlData/y,
    (_, c) => {
      group(c);
      return nodesOf(group(c));
    },
  ],
  [
    /\\frac/y,
    (_, c) => {
      const above = nodesOf(group(c));
      return [{ kind: 'fraction', above, below: nodesOf(group(c)) }];
    },
  ],
  [/\\sqrt/y, (_, c) => [{ kind: 'root', of: nodesOf(group(c)) }]],
  [/\^/y, (_, c) => [{ kind: 'raised', by: nodesOf(group(c)) }]],
  [/\\operatorname\{atan2\}/y, () => [{ kind: 'function', name: 'atan2' }]],
  [
    /\\(?:sinh?|cosh?|tanh?|arccos|arctan|Phi_\{\d\})(?![a-z])/y,
    (found) => [{ kind: 'function', name: found.slice(1) }],
  ],
  [/\\left\|/y, () => [{ kind: 'bar', open: true }]],
  [/\\right\|/y, () => [{ kind: 'bar', open: false }]],
  [/\\pi(?![a-z])/y, () => [{ kind: 'symbol', name: 'pi' }]],
  [/v_\{\d+\}/y, (found) => [{ kind: 'symbol', name: found }]],
  [/(?:\\left)?\(/y, () => [{ kind: 'sign', sign: '(' }]],
  [/(?:\\right)?\)/y, () => [{ kind: 'sign', sign: ')' }]],
  [/\+|-|\/|,|\\cdot|\\times/y, (found) => [{ kind: 'sign', sign: found as Sign }]],
  // A group that is no argument binds nothing that a reader can see.
  [/(?=\{)/y, (_, c) => nodesOf(group(c))],
];

function firstMark(c: Characters): Node[] | null {
  for (const [pattern, read] of MARKS) {
    const found = c.take(pattern);
    if (found) return read(found[0], c);
  }
  return null;
}

function nodesOf(text: string): Node[] {
  const c = new Characters(text);
  const nodes: Node[] = [];
  while (c.at < text.length) {
    const mark = firstMark(c);
    if (!mark) throw new Error(`not known: "${c.rest.slice(0, 30)}"`);
    nodes.push(...mark);
  }
  return nodes;
}

const CALLS: Readonly<Record<string, (a: number, b: number) => number>> = {
  sin: Math.sin,
  cos: Math.cos,
  tan: Math.tan,
  sinh: Math.sinh,
  cosh: Math.cosh,
  tanh: Math.tanh,
  arccos: Math.acos,
  arctan: Math.atan,
  atan2: Math.atan2,
  'Phi_{2}': (x) => seriesFunction(2, x),
  'Phi_{3}': (x) => seriesFunction(3, x),
  'Phi_{4}': (x) => seriesFunction(4, x),
  'Phi_{5}': (x) => seriesFunction(5, x),
};

/** Value of a formula's TeX; symbols are `\pi` and `v_{1}`, `v_{2}` … */
export function valueOfTex(tex: string, symbols: Readonly<Record<string, number>> = {}): number {
  return sum(nodesOf(tex), symbols);
}

function sum(nodes: readonly Node[], symbols: Readonly<Record<string, number>>): number {
  let at = 0;
  const isSign = (sign: string, offset = 0): boolean => {
    const node = nodes[at + offset];
    return node?.kind === 'sign' && node.sign === sign;
  };
  const refuse = (why: string): never => {
    throw new Error(`${why} at ${JSON.stringify(nodes.slice(Math.max(0, at - 1), at + 3))}`);
  };

  function atom(): number {
    const node = nodes[at];
    if (!node) return refuse('a factor is missing');
    at += 1;
    switch (node.kind) {
      case 'number':
        return node.value;
      case 'symbol': {
        const value = node.name === 'pi' ? Math.PI : symbols[node.name];
        return value ?? refuse(`no value for ${node.name}`);
      }
      case 'fraction':
        return sum(node.above, symbols) / sum(node.below, symbols);
      case 'root':
        return Math.sqrt(sum(node.of, symbols));
      case 'bar': {
        if (!node.open) return refuse('a bar that closes nothing');
        const value = terms();
        const close = nodes[at];
        if (close?.kind !== 'bar' || close.open) return refuse('a bar is not closed');
        at += 1;
        return Math.abs(value);
      }
      case 'function':
        return applied(node.name);
      case 'sign':
        if (node.sign !== '(') return refuse('a factor is missing');
        return bracket()[0] ?? Number.NaN;
      default:
        return refuse('a factor is missing');
    }
  }
  function bracket(): number[] {
    const values = [terms()];
    while (isSign(',')) {
      at += 1;
      if (nodes[at]?.kind === 'space') at += 1;
      values.push(terms());
    }
    if (!isSign(')')) return refuse('a bracket is not closed');
    at += 1;
    return values;
  }
  function applied(name: string): number {
    let power = 1;
    const raised = nodes[at];
    if (raised?.kind === 'raised') {
      power = sum(raised.by, symbols);
      at += 1;
    }
    let args: number[];
    if (isSign('(')) {
      at += 1;
      args = bracket();
    } else args = [atom()];
    const call = CALLS[name];
    if (!call) return refuse(`function ${name}`);
    return call(args[0] ?? Number.NaN, args[1] ?? Number.NaN) ** power;
  }
  function factor(): number {
    const fraction = nodes[at]?.kind === 'fraction';
    const value = atom();
    const raised = nodes[at];
    if (raised?.kind !== 'raised') return value;
    if (fraction) return refuse('a fraction raised without brackets');
    at += 1;
    return value ** sum(raised.by, symbols);
  }
  function product(): number {
    let value = factor();
    let divided = false;
    for (;;) {
      const before = nodes[at - 1];
      let spaced = false;
      while (nodes[at]?.kind === 'space') {
        at += 1;
        spaced = true;
      }
      const next = nodes[at];
      if (!next || (next.kind === 'sign' && '+-,)'.includes(next.sign))) return value;
      if (next.kind === 'bar' && !next.open) return value;
      if (isSign('/')) {
        at += 1;
        if (isSign('-')) return refuse('a minus sign after /');
        value /= factor();
        divided = true;
        continue;
      }
      if (divided) return refuse('a factor after a quotient on one line');
      if (isSign('\\cdot') || isSign('\\times')) {
        at += 1;
        if (isSign('-')) return refuse('a minus sign after a dot');
        value *= factor();
        continue;
      }
      const figures =
        next.kind === 'number' && (before?.kind === 'number' || before?.kind === 'raised');
      if (figures) return refuse('two numbers side by side');
      if (before?.kind === 'number' && !spaced && next.kind !== 'sign') return refuse('glued');
      value *= factor();
    }
  }
  function terms(): number {
    let value: number;
    if (isSign('-')) {
      at += 1;
      value = -product();
    } else value = product();
    while (isSign('+') || isSign('-')) {
      const minus = isSign('-');
      at += 1;
      if (isSign('+') || isSign('-')) return refuse('two signs in a row');
      const next = product();
      value += minus ? -next : next;
    }
    return value;
  }

  const value = terms();
  if (at < nodes.length) return refuse('left over');
  return value;
}
