import { addressOf, placedLines, splitAddress } from '../calc/address.ts';
import { isValued, type LineOf } from '../calc/line.ts';
import type { Governing, MemberRecord } from '../calc/record.ts';
import { parseExpression } from '../expr/parse.ts';
import { printNumber } from '../units/format.ts';
import type { BlockOf } from './tree.ts';

type Term = BlockOf<'verdict'>['terms'][number];

/** Required strengths of an interaction equation, with what each stands for. */
const DEMANDS: readonly (readonly [operand: string, label: string])[] = [
  ['Pr', 'axial'],
  ['Mrx', 'major'],
  ['Mry', 'minor'],
];

/**
 * The parts of the governing ratio: each is the interaction equation of the record with the other
 * required strengths at zero, which its sum of terms allows. A check of one strength is one part.
 */
export function verdictTerms(member: MemberRecord, governing: Governing): Term[] {
  const lines = new Map(placedLines(member).map((p) => [p.address, p.line]));
  const { combination } = splitAddress(governing.address);
  const line = lines.get(governing.address);
  const demand =
    line?.kind === 'check' ? lines.get(addressOf(line.demand, combination)) : undefined;
  const interaction = line?.kind === 'check' && line.capacity === 1 ? demand : line;
  if (interaction?.kind === 'formula')
    return agreeing(interaction.value, interactionTerms(interaction, lines, combination));
  if (line?.kind !== 'check') return [];
  const label =
    demand && 'dimension' in demand && demand.dimension === 'moment' ? 'moment' : 'axial';
  return agreeing(line.ratio, [{ label, value: line.ratio }]);
}

function interactionTerms(
  line: LineOf<'formula'>,
  lines: ReadonlyMap<string, MemberRecord['lines'][number]>,
  combination: string | null,
): { label: string; value: number }[] {
  const values = Object.entries(line.operands).map(([name, { ref }]) => {
    const operand = lines.get(addressOf(ref, combination));
    return [name, operand && isValued(operand) ? operand.value : Number.NaN] as const;
  });
  const { evaluate } = parseExpression(line.expression);
  const demands = DEMANDS.filter(([name]) => name in line.operands);
  return demands.map(([kept, label]) => {
    const others = demands.filter(([name]) => name !== kept).map(([name]) => [name, 0] as const);
    return {
      label,
      value: evaluate({ ...Object.fromEntries(values), ...Object.fromEntries(others) }),
    };
  });
}

/** Prints three decimals, more while the printed terms don't add up to the ratio as printed. */
function agreeing(ratio: number, terms: readonly { label: string; value: number }[]): Term[] {
  for (let dec = 3; ; dec += 1) {
    const printed = terms.map((t) => printNumber(t.value, { dec }));
    const sum = printed.reduce((total, n) => total + n.value, 0);
    const off = Math.round(Math.abs(sum - printNumber(ratio, { dec }).value) * 10 ** dec);
    if (off <= 1 || dec === 6) return terms.map((t, i) => ({ ...t, text: printed[i]?.text ?? '' }));
  }
}
