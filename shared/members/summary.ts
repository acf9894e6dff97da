import type { Clause, Line, LineOf, Verdict } from '../calc/line.ts';
import type { CombinationRecord, MemberRecord, Summary } from '../calc/record.ts';
import { worstVerdict } from '../calc/verdict.ts';
import { printNumber } from '../units/format.ts';
import type { ResolvedCombination } from './resolved.ts';

const NOWHERE: Clause = { book: 'aisc360-22', clause: 'H1', equation: null };

/** Verdicts that notices and checks of some lines carry. */
const verdictsOf = (lines: readonly Line[]): Verdict[] =>
  lines.flatMap((l): Verdict[] => {
    if (l.kind === 'check') return [l.verdict];
    if (l.kind === 'notice' && l.severity === 'failed') return ['FAILED'];
    if (l.kind === 'notice' && l.severity === 'outside scope') return ['NOT CHECKED'];
    return [];
  });

const ratioText = (check: LineOf<'check'>): string =>
  printNumber(check.ratio, check.print.working ?? { dec: 3 }).text;

/** A member notice that nothing could be checked stops every combination. */
const HALTS: ReadonlySet<string> = new Set(['B4/outside', 'C2/outside']);
const stopped = (memberLines: readonly Line[]): LineOf<'notice'> | undefined =>
  memberLines.find(
    (l): l is LineOf<'notice'> =>
      l.kind === 'notice' && (l.severity === 'failed' || HALTS.has(l.key)),
  );

/** Verdict, ratio and what governs one combination. */
export function combinationSummary(
  c: Pick<ResolvedCombination, 'id' | 'name'>,
  memberLines: readonly Line[],
  lines: readonly Line[],
): Summary {
  const checks = lines.filter((l): l is LineOf<'check'> => l.kind === 'check');
  const worst = checks.reduce<LineOf<'check'> | null>(
    (a, b) => (a && a.ratio >= b.ratio ? a : b),
    null,
  );
  const halt = stopped(memberLines);
  const found = verdictsOf(lines);
  const verdict = halt
    ? worstVerdict(verdictsOf([halt]))
    : found.length === 0
      ? 'NOT CHECKED'
      : worstVerdict(found);
  const numeric = verdict === 'OK' || verdict === 'NOT OK';
  const reason = numeric ? null : (halt ?? reasonOf(lines, verdict));
  const governs = numeric ? worst : reason;
  return {
    verdict,
    ratio: numeric && worst ? worst.ratio : null,
    ratioText: numeric && worst ? ratioText(worst) : null,
    governing: governs
      ? {
          address: memberLines.includes(governs) ? governs.key : `${c.id}:${governs.key}`,
          clause: governs.clause ?? NOWHERE,
          combination: c.id,
          combinationName: c.name,
          title: governs.title,
        }
      : null,
  };
}

/** The notice that a verdict without a ratio rests on. */
const reasonOf = (lines: readonly Line[], verdict: Verdict): Line | undefined =>
  lines.find(
    (l) =>
      l.kind === 'notice' &&
      (l.code === 'no-forces' ||
        l.severity === (verdict === 'FAILED' ? 'failed' : 'outside scope')),
  );

const rank = (s: Summary): number => (s.ratio === null ? -1 : s.ratio);

const worstOf = <T extends { readonly summary: Summary }>(
  parts: readonly T[],
): { verdict: Verdict; worst: T | undefined } => {
  const verdict = worstVerdict(parts.map((p) => p.summary.verdict));
  const worst = parts
    .filter((p) => p.summary.verdict === verdict)
    .reduce<T | undefined>((a, b) => (a && rank(a.summary) >= rank(b.summary) ? a : b), undefined);
  return { verdict, worst };
};

/** The member takes its worst combination: the largest ratio of that verdict, null if it is FAILED or NOT CHECKED. */
export function memberSummary(combinations: readonly CombinationRecord[]): Summary {
  const { verdict, worst } = worstOf(combinations);
  return {
    verdict,
    ratio: worst?.summary.ratio ?? null,
    ratioText: worst?.summary.ratioText ?? null,
    governing: worst?.summary.governing ?? null,
  };
}

export function recordSummary(
  members: readonly MemberRecord[],
): Summary & { member: string | null; unconfirmed: number } {
  const { verdict, worst } = worstOf(members);
  return {
    verdict,
    ratio: worst?.summary.ratio ?? null,
    ratioText: worst?.summary.ratioText ?? null,
    governing: worst?.summary.governing ?? null,
    member: worst?.id ?? null,
    unconfirmed: members.reduce((n, m) => n + m.unconfirmed, 0),
  };
}
