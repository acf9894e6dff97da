import type { Line, LineOf, Verdict } from '#shared/calc/line.ts';
import type { CalculationRecord, MemberRecord, Summary } from '#shared/calc/record.ts';
import { printNumber } from '#shared/units/format.ts';

/*
 * Verdicts and what governs, made again from the lines by the ranking of the rules:
 * FAILED > NOT OK > NOT CHECKED > OK; a ratio only with OK and NOT OK.
 */
const RANKED: readonly Verdict[] = ['OK', 'NOT CHECKED', 'NOT OK', 'FAILED'];
const RATIO = { dec: 3 } as const;
const hasRatio = (verdict: Verdict): boolean => verdict === 'OK' || verdict === 'NOT OK';

/** The worst of some verdicts; of none, NOT CHECKED. */
const worst = (verdicts: readonly Verdict[]): Verdict =>
  RANKED.findLast((v) => verdicts.includes(v)) ?? 'NOT CHECKED';

/** What a summary must say; `address` is that of the line that governs. */
export interface ExpectedSummary {
  readonly verdict: Verdict;
  readonly ratio: number | null;
  readonly ratioText: string | null;
  readonly address: string | null;
}

const verdictOf = (line: Line): Verdict | null => {
  if (line.kind === 'check') return line.verdict;
  if (line.kind !== 'notice') return null;
  if (line.severity === 'failed') return 'FAILED';
  return line.severity === 'outside scope' ? 'NOT CHECKED' : null;
};

/** A member's notice that stops every combination. */
const haltOf = ({ lines }: MemberRecord): Line | undefined =>
  lines.find(
    (l) =>
      l.kind === 'notice' &&
      (l.severity === 'failed' || l.key === 'B4/outside' || l.key === 'C2/outside'),
  );

/** What the summary of a combination must say, from its lines and its member's. */
export function expectedOfCombination(
  member: MemberRecord,
  { id, lines }: MemberRecord['combinations'][number],
): ExpectedSummary {
  const halt = haltOf(member);
  const idle = lines.find((l) => l.kind === 'notice' && l.code === 'no-forces');
  const own = lines.map(verdictOf).filter((v) => v !== null);
  const verdict = halt ? (verdictOf(halt) ?? 'OK') : idle ? 'NOT CHECKED' : worst(own);
  const place = (line: Line | undefined): string | null => (line ? `${id}:${line.key}` : null);
  if (!hasRatio(verdict)) {
    const reason = idle ?? lines.find((l) => l.kind === 'notice' && verdictOf(l) === verdict);
    return { verdict, ratio: null, ratioText: null, address: halt?.key ?? place(reason) };
  }
  const checks = lines.filter((l): l is LineOf<'check'> => l.kind === 'check');
  const ratio = Math.max(0, ...checks.map((c) => c.ratio));
  const largest = checks.find((c) => c.ratio === ratio);
  const ratioText = largest ? printNumber(ratio, largest.print.working ?? RATIO).text : null;
  return { verdict, ratio, ratioText, address: place(largest) };
}

/** What the summary of a whole must say, from those of its parts: the worst, then the largest. */
export function worstPart<T extends { readonly summary: Summary }>(
  parts: readonly T[],
): { readonly verdict: Verdict; readonly part: T | null } {
  const verdict = worst(parts.map((p) => p.summary.verdict));
  const candidates = parts.filter((p) => p.summary.verdict === verdict);
  const ratios = candidates.map((p) => p.summary.ratio ?? -1);
  return { verdict, part: candidates[ratios.indexOf(Math.max(...ratios))] ?? null };
}

/** Given values and statements that nobody confirmed. */
export const unconfirmedIn = ({ lines, combinations }: MemberRecord): number =>
  [...lines, ...combinations.flatMap((c) => c.lines)].filter(
    (l) => (l.kind === 'given' || l.kind === 'statement') && !l.confirmed,
  ).length;

export const unconfirmedOf = (record: CalculationRecord): number =>
  record.members.reduce((total, member) => total + unconfirmedIn(member), 0);
