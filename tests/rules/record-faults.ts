import { placedLines } from '#shared/calc/address.ts';
import { closureProblems } from '#shared/calc/closure-problems.ts';
import { lineGraph } from '#shared/calc/graph.ts';
import type { Line } from '#shared/calc/line.ts';
import {
  type CalculationRecord,
  type CombinationRecord,
  type MemberRecord,
  recordSchema,
} from '#shared/calc/record.ts';
import { LIMIT_STATES } from '#shared/members/limit-states.ts';
import { UNIT_SETS } from '#shared/units/unit-set.ts';
import { printedFaults } from './printed-sheet.ts';

function notFinite(value: unknown, path = ''): string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [`${path} is ${value}`];
  if (value === null || typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, part]) => notFinite(part, `${path}/${key}`));
}

/**
 * What is wrong with a record by itself: its schema, numbers that are not finite, lines that do not
 * follow from what is printed, a hole in the completeness table, a verdict out of rank.
 */
export function recordFaults(record: CalculationRecord): string[] {
  const set = UNIT_SETS[record.units];
  const parsed = recordSchema.safeParse(record);
  return [
    ...(parsed.success ? [] : [parsed.error.message]),
    ...notFinite(record),
    ...record.members.flatMap((member) => {
      const placed = placedLines(member);
      const graph = lineGraph(member);
      return [
        ...closureProblems(placed, set).map((p) => `${p.address}: ${p.reason}`),
        ...printedFaults(member, set),
        ...(graph.lines.size === placed.length ? [] : ['the graph lost a line']),
        ...completenessFaults(member),
        ...member.combinations.flatMap((c) => verdictFaults(member, c)),
      ];
    }),
  ];
}

/** The last segment of a combination that has lines: `s2/H1/check`; 0 where it is in one. */
const lastSegment = ({ lines }: CombinationRecord): number =>
  Math.max(0, ...lines.map(({ key }) => Number(/^s(\d+)\//.exec(key)?.[1] ?? 0)));

/** Segments of a combination in a row of the table, without a hole. */
const inOrder = (segments: readonly (string | null | undefined)[], least: number): boolean =>
  segments.length === 1
    ? segments[0] === null && least === 0
    : segments.length >= least && segments.every((segment, i) => segment === `s${i + 1}`);

/** Every limit state under every combination and in every segment, each with a reason. */
function completenessFaults(member: MemberRecord): string[] {
  const { completeness, combinations } = member;
  const addresses = new Set(placedLines(member).map(({ address }) => address));
  const rows = completeness.map(({ id }) => id).join();
  const missing = rows === LIMIT_STATES.map(({ id }) => id).join() ? [] : [`rows are ${rows}`];
  return [
    ...missing,
    ...LIMIT_STATES.flatMap(({ id, bySegment }) => {
      const cells = completeness.find((row) => row.id === id)?.cells ?? [];
      return [
        ...combinations.flatMap((c) => {
          const own = cells.filter(({ combination }) => combination === c.id);
          const segments = own.map(({ segment }) => segment);
          return inOrder(segments, bySegment ? lastSegment(c) : 0)
            ? []
            : [`${id} ${c.id} has ${segments}`];
        }),
        ...cells.flatMap(({ because, address, combination }) => [
          ...(because.length > 3 ? [] : [`${id} ${combination} has no reason`]),
          ...(address === null || addresses.has(address) ? [] : [`${id} leads to ${address}`]),
        ]),
      ];
    }),
  ];
}

const RANK = ['OK', 'NOT CHECKED', 'NOT OK', 'FAILED'];

/** What a line by itself makes of the verdict, at least. */
const leastVerdict = (line: Line): string => {
  if (line.kind === 'check') return line.ratio > 1 ? 'NOT OK' : 'OK';
  if (line.kind !== 'notice') return 'OK';
  return { failed: 'FAILED', 'outside scope': 'NOT CHECKED', caution: 'OK', note: 'OK' }[
    line.severity
  ];
};

/** The worst line of a combination, no check at all: a verdict is never better than these. */
function verdictFaults(member: MemberRecord, { name, lines, summary }: CombinationRecord) {
  const ranks = lines.map((line) => RANK.indexOf(leastVerdict(line)));
  const checked = lines.some((line) => line.kind === 'check');
  const least = Math.max(checked ? 0 : 1, ...ranks);
  const has = RANK.indexOf(summary.verdict);
  const ratios = lines.flatMap((line) => (line.kind === 'check' ? [line.ratio] : []));
  const numeric = summary.verdict === 'OK' || summary.verdict === 'NOT OK';
  return [
    ...(has >= least ? [] : [`${name} is ${summary.verdict}, a line says ${RANK[least]}`]),
    ...(RANK.indexOf(member.summary.verdict) >= has ? [] : [`the member is better than ${name}`]),
    ...(summary.ratio === (numeric ? Math.max(...ratios) : null)
      ? []
      : [`${name} has ratio ${summary.ratio}`]),
  ];
}
