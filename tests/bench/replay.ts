import { all, create, type FactoryFunctionMap, type Unit } from 'mathjs';
import { addressOf, placedLines } from '#shared/calc/address.ts';
import { isValued, type Line } from '#shared/calc/line.ts';
import type { MemberRecord } from '#shared/calc/record.ts';
import { type Expr, parseExpression } from '#shared/expr/parse.ts';
import { seriesFunction } from '#shared/expr/series-functions.ts';
import { DIMENSIONS, type DimensionName } from '#shared/units/dimension.ts';

/** The formula lines of a record as steps: each reads values of lines before it and writes one. */
export interface Steps {
  readonly formulas: readonly {
    readonly text: string;
    readonly names: readonly string[];
    readonly slots: readonly number[];
    readonly result: number;
  }[];
  /** Values of all lines; those of formulas are written again by a run. */
  readonly values: readonly number[];
  readonly dimensions: readonly DimensionName[];
}

/** Reads the steps of a member's record; a line without a formula keeps its value. */
export function stepsOf(member: MemberRecord): Steps {
  const placed = placedLines(member).filter(({ line }) => isValued(line));
  const slotOf = new Map(placed.map(({ address }, i) => [address, i]));
  const slot = (ref: string, combination: string | null): number => {
    const found = slotOf.get(addressOf(ref, combination));
    if (found === undefined) throw new Error(`no line ${ref}`);
    return found;
  };
  return {
    formulas: placed.flatMap(({ line, combination }, result) =>
      line.kind === 'formula'
        ? [
            {
              text: line.expression,
              names: Object.keys(line.operands),
              slots: Object.values(line.operands).map(({ ref }) => slot(ref, combination)),
              result,
            },
          ]
        : [],
    ),
    values: placed.map(({ line }) => ('value' in line ? line.value : Number.NaN)),
    dimensions: placed.map(({ line }) => dimensionOf(line)),
  };
}

const dimensionOf = (line: Line): DimensionName => ('dimension' in line ? line.dimension : 'none');

/** Computes every formula again and answers the values of all lines in N and mm. */
export type Run = () => readonly (number | Unit)[];

/** The formulas as the books evaluate them. */
export function replayByBooks({ formulas, values }: Steps): Run {
  const steps = formulas.map((f) => ({ ...f, expression: parseExpression(f.text) }));
  const slots = [...values];
  return () => {
    for (const { names, slots: from, result, expression } of steps) {
      const operands: Record<string, number> = {};
      names.forEach((name, i) => {
        operands[name] = slots[from[i] as number] as number;
      });
      slots[result] = expression.evaluate(operands);
    }
    return slots;
  };
}

/** JavaScript of an expression; an operand is read from the values by the slot of its name. */
function scriptOf(tree: Expr, names: readonly string[]): string {
  switch (tree.kind) {
    case 'number':
      return `(${tree.text})`;
    case 'symbol':
      return tree.name === 'pi' ? 'Math.PI' : `v[from[${names.indexOf(tree.name)}]]`;
    case 'negative':
      return `(-${scriptOf(tree.of, names)})`;
    case 'binary': {
      const [left, right] = [scriptOf(tree.left, names), scriptOf(tree.right, names)];
      return tree.op === '^' ? `((${left})**(${right}))` : `(${left}${tree.op}${right})`;
    }
    case 'call': {
      const args = tree.args.map((arg) => scriptOf(arg, names)).join(',');
      return tree.fn.startsWith('Phi')
        ? `Phi(${tree.fn.slice(3)},${args})`
        : `Math.${tree.fn}(${args})`;
    }
  }
}

type Call = (v: readonly number[], from: readonly number[]) => number;

/** The formulas as plain JavaScript functions, as somebody would write them. */
export function replayPlainly({ formulas, values }: Steps): Run {
  const known = new Map<string, Call>();
  const functionOf = (text: string, names: readonly string[]): Call => {
    const key = `${names} ${text}`;
    const script = `return (v, from) => ${scriptOf(parseExpression(text).tree, names)}`;
    const made = known.get(key) ?? (new Function('Phi', script)(seriesFunction) as Call);
    known.set(key, made);
    return made;
  };
  const steps = formulas.map((f) => ({ ...f, call: functionOf(f.text, f.names) }));
  const slots = [...values];
  return () => {
    for (const { slots: from, result, call } of steps) slots[result] = call(slots, from);
    return slots;
  };
}

/** The formulas in full mathjs with a unit on every operand that has one. */
export function replayWithUnits({ formulas, values, dimensions }: Steps): Run {
  const math = create(all as FactoryFunctionMap);
  math.import(
    Object.fromEntries(
      ([2, 3, 4, 5] as const).map((n) => [`Phi${n}`, (x: number) => seriesFunction(n, x)]),
    ),
  );
  const withUnit = (value: number, name: DimensionName): number | Unit => {
    const { force, length } = DIMENSIONS[name];
    return force === 0 && length === 0
      ? value
      : (math.unit(value, `N^${force} mm^${length}`) as Unit);
  };
  const compiled = new Map(formulas.map(({ text }) => [text, math.compile(text)]));
  const slots: (number | Unit)[] = values.map((v, i) =>
    withUnit(v, dimensions[i] as DimensionName),
  );
  return () => {
    for (const { text, names, slots: from, result } of formulas) {
      const operands: Record<string, unknown> = {};
      names.forEach((name, i) => {
        operands[name] = slots[from[i] as number];
      });
      slots[result] = compiled.get(text)?.evaluate(operands) as number | Unit;
    }
    return slots;
  };
}
