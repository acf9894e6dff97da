import { all, create } from 'mathjs';
import { placedLines } from '#shared/calc/address.ts';
import type { Line, ValuedLine } from '#shared/calc/line.ts';
import { printedForms } from '#shared/calc/printed.ts';
import type { MemberRecord } from '#shared/calc/record.ts';
import { seriesFunction } from '#shared/expr/series-functions.ts';
import { type Digits, printNumber } from '#shared/units/format.ts';
import type { UnitSet } from '#shared/units/unit-set.ts';

/*
 * Reads a member's sheet as its reader does: only the printed texts, with mathjs's full parser and
 * none of the rules that fixed the digits. What doesn't follow from what is printed is a fault.
 */
const math = create(all ?? {});
math.import(
  Object.fromEntries([2, 3, 4, 5].map((n) => [`Phi${n}`, (x: number) => seriesFunction(n, x)])),
);
const compiled = new Map<string, { evaluate(scope: Record<string, number>): unknown }>();

interface Read {
  readonly value: number;
  /** One unit in the last printed digit. */
  readonly step: number;
}

/** A printed text as a number: thin spaces, U+2212 and `×10⁻³` undone. */
export function readPrinted(text: string): Read {
  const plain = text
    .replace(/\u2009/g, '')
    .replace(/−/g, '-')
    .replace(/×10([⁻⁰¹²³⁴⁵⁶⁷⁸⁹]+)/, (_, power: string) => {
      const digits = [...power].map((d) => (d === '⁻' ? '-' : '⁰¹²³⁴⁵⁶⁷⁸⁹'.indexOf(d))).join('');
      return `e${digits}`;
    });
  if (!/^-?\d+(\.\d+)?(e-?\d+)?$/.test(plain)) throw new Error(`"${text}" is not a printed number`);
  const [mantissa = '', power = '0'] = plain.split('e');
  const decimals = mantissa.includes('.') ? mantissa.length - mantissa.indexOf('.') - 1 : 0;
  return { value: Number(plain), step: 10 ** (Number(power) - decimals) };
}

/** One unit of the last digit, the printed number's rounding, and the reader's own last bits. */
const follows = (value: number, printed: Read): boolean =>
  Math.abs(value - printed.value) <= printed.step * 1.5 + 8 * Number.EPSILON * Math.abs(value);

/** Whole numbers of five digits and more end in zeros that stand for rounding. */
const stepOf = (line: ValuedLine, form: 'working' | 'display', read: Read): Read => {
  const digits = line.print[form];
  if (!digits || !('sig' in digits) || read.value === 0) return read;
  const first = Math.floor(Math.log10(Math.abs(read.value)) + 1e-12);
  return { ...read, step: Math.max(read.step, 10 ** (first - digits.sig + 1)) };
};

/** Utilisations and differences have decimals; from a million on, digits that count. */
const readRatio = (value: number, digits: Digits | null, otherwise: number) => {
  const used = digits ?? { dec: otherwise };
  const { text } = printNumber(value, used);
  const read = readPrinted(text);
  if (!('dec' in used) || Math.abs(read.value) < 1e6) return { ...read, text };
  const first = Math.floor(Math.log10(Math.abs(read.value)));
  return { ...read, step: 10 ** (first - used.dec - 3), text };
};

/** Faults of a member's printed sheet, each with its address. */
export function printedFaults(member: MemberRecord, set: UnitSet): string[] {
  const placed = placedLines(member);
  const byAddress = new Map(placed.map((p) => [p.address, p.line]));
  const faults: string[] = [];
  for (const { address, combination, line } of placed) {
    const at = (ref: string): ValuedLine => {
      const found = byAddress.get(ref.startsWith(':') ? `${combination}${ref}` : ref);
      if (!found || !('value' in found)) throw new Error(`${address}: nothing at ${ref}`);
      return found;
    };
    const read = (ref: string, form: 'working' | 'display'): Read => {
      const source = at(ref);
      const forms = printedForms(source, set);
      const used = form === 'display' && set.display[source.dimension] ? 'display' : 'working';
      const printed = forms[used];
      if (!printed) throw new Error(`${address}: ${ref} does not print its ${used} form`);
      return stepOf(source, used, readPrinted(printed.number.text));
    };
    try {
      faults.push(...lineFaults(line, read, set).map((f) => `${address}: ${f}`));
    } catch (error) {
      faults.push(String(error));
    }
  }
  return faults;
}

type Reader = (ref: string, form: 'working' | 'display') => Read;

function lineFaults(line: Line, read: Reader, set: UnitSet): string[] {
  switch (line.kind) {
    case 'formula': {
      const operands = Object.entries(line.operands).map(
        ([symbol, { ref }]) => [symbol, read(ref, line.prints)] as const,
      );
      const code = compiled.get(line.expression) ?? math.compile(line.expression);
      compiled.set(line.expression, code);
      const valueWith = (moved: string | null, by: 1 | -1 = 1): number =>
        Number(
          code.evaluate({
            pi: Math.PI,
            ...Object.fromEntries(
              operands.map(([symbol, { value, step }]) => [
                symbol,
                symbol === moved ? value + (by * step) / 2 : value,
              ]),
            ),
          }),
        );
      const value = valueWith(null);
      const forms = printedForms(line, set);
      const form = line.prints === 'display' && set.display[line.dimension] ? 'display' : 'working';
      const own = forms[form];
      if (!own) return ['does not print its result'];
      const printed = stepOf(line, form, readPrinted(own.number.text));
      if (!follows(value, printed))
        return [`prints ${own.number.text}, its operands give ${value}`];
      // Fewer digits than four only where the printed operands say no more.
      const digits = line.print[form];
      if (!digits || !('sig' in digits) || digits.sig >= 4) return [];
      const left = operands.reduce((sum, [s]) => {
        const there = [valueWith(s, 1), valueWith(s, -1)].filter(Number.isFinite);
        return sum + Math.max(...there.map((v) => Math.abs(v - value)));
      }, 0);
      // 1 may stand for 0.96, whose next digit is a hundred times smaller.
      const next = /^−?1(\.0+)?(×|$)/.test(own.number.text) ? 100 : 10;
      return left >= printed.step / next / 2
        ? []
        : [`prints ${own.number.text}, its operands carry more digits`];
    }
    case 'choice':
      return line.tried.flatMap((c) => {
        if ('words' in c.left || 'words' in c.right) return [];
        const [l, r] = [c.left, c.right].map((s) =>
          'constant' in s ? s.constant : 'ref' in s ? read(s.ref, 'display').value : Number.NaN,
        ) as [number, number];
        const holds = {
          '<': l < r,
          '<=': l <= r,
          '>': l > r,
          '>=': l >= r,
          '=': l === r,
          is: false,
        }[c.relation];
        return holds === c.holds ? [] : [`prints ${l} ${c.relation} ${r} as ${c.holds}`];
      });
    case 'governing': {
      const values = line.candidates.map((ref) => read(ref, 'display').value);
      const best = read(line.governs, 'display').value;
      const extreme = line.sense === 'min' ? Math.min(...values) : Math.max(...values);
      return best === extreme ? [] : [`prints ${best} as ${line.sense} of ${values.join(', ')}`];
    }
    case 'check': {
      const ratio = readRatio(line.ratio, line.print.working, 3);
      const { text } = ratio;
      const demand = read(line.demand, 'display').value;
      const capacity = line.capacity === 1 ? 1 : read(line.capacity, 'display').value;
      return [
        ...(follows(demand / capacity, ratio) ? [] : [`prints ${text} for ${demand}/${capacity}`]),
        ...(ratio.value <= 1 === (line.verdict === 'OK') ? [] : [`prints ${text} ${line.verdict}`]),
        ...(demand <= capacity === (line.verdict === 'OK')
          ? []
          : [`prints ${demand} against ${capacity}, ${line.verdict}`]),
      ];
    }
    case 'comparison': {
      const printed = readRatio(line.difference * 100, line.print.working, 1);
      const value =
        (read(line.used, 'display').value / read(line.other, 'display').value - 1) * 100;
      return follows(value, printed) ? [] : [`prints ${printed.text} % for ${value} %`];
    }
    default:
      return [];
  }
}
