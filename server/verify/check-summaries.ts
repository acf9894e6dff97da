import { placedLines } from '#shared/calc/address.ts';
import { canonicalText } from '#shared/calc/hashes.ts';
import type { CalculationRecord, MemberRecord, Summary } from '#shared/calc/record.ts';
import {
  type ExpectedSummary,
  expectedOfCombination,
  unconfirmedIn,
  unconfirmedOf,
  worstPart,
} from './expected-summary.ts';

export interface SummaryProblem {
  readonly member: MemberRecord | null;
  readonly reason: string;
}

/** Verdict, ratio and what governs, of every combination, member and the whole. */
export function* checkSummaries(record: CalculationRecord): Iterable<SummaryProblem> {
  for (const member of record.members)
    for (const reason of memberReasons(member)) yield { member, reason };
  const { verdict, part } = worstPart(record.members);
  const { summary } = record;
  const said = (reason: string): SummaryProblem => ({ member: null, reason });
  yield* wholeReasons('the calculation', summary, verdict, part?.summary ?? null).map(said);
  if (summary.member !== (part?.id ?? null))
    yield said(`the calculation names the member ${summary.member}, not ${part?.id}`);
  const unconfirmed = unconfirmedOf(record);
  if (summary.unconfirmed !== unconfirmed)
    yield said(`the calculation counts ${summary.unconfirmed} unconfirmed, not ${unconfirmed}`);
}

function memberReasons(member: MemberRecord): string[] {
  const { verdict, part } = worstPart(member.combinations);
  const unconfirmed = unconfirmedIn(member);
  return [
    ...member.combinations.flatMap((c) => [
      ...reasons(`combination ${c.name}`, c.summary, expectedOfCombination(member, c)),
      ...governingReasons(member, c),
    ]),
    ...wholeReasons('the member', member.summary, verdict, part?.summary ?? null),
    ...(member.unconfirmed === unconfirmed
      ? []
      : [`the member counts ${member.unconfirmed} unconfirmed, not ${unconfirmed}`]),
  ];
}

function reasons(who: string, said: Summary, expected: ExpectedSummary): string[] {
  const { verdict, ratio, ratioText, governing } = said;
  const found: string[] = [];
  if (verdict !== expected.verdict)
    found.push(`${who} says ${verdict}, its lines give ${expected.verdict}`);
  if (ratio !== expected.ratio)
    found.push(`${who} says the ratio ${ratio}, its lines give ${expected.ratio}`);
  if (ratioText !== expected.ratioText)
    found.push(`${who} prints the ratio ${ratioText}, its lines print ${expected.ratioText}`);
  if ((governing?.address ?? null) !== expected.address)
    found.push(
      `${who} says that ${governing?.address} governs, its lines give ${expected.address}`,
    );
  return found;
}

/** What governs is named as its line names itself. */
function governingReasons(
  member: MemberRecord,
  { id, name, summary: { governing } }: MemberRecord['combinations'][number],
): string[] {
  if (!governing) return [];
  const line = placedLines(member).find((p) => p.address === governing.address)?.line;
  if (!line) return [];
  const same =
    governing.title === line.title &&
    (line.clause === null || canonicalText(governing.clause) === canonicalText(line.clause)) &&
    governing.combination === id &&
    governing.combinationName === name;
  return same ? [] : [`combination ${name} names what governs otherwise than ${governing.address}`];
}

/** A whole says what its worst part says. */
function wholeReasons(
  who: string,
  said: Summary,
  verdict: Summary['verdict'],
  part: Summary | null,
): string[] {
  const { ratio = null, ratioText = null, governing = null } = part ?? {};
  const address = governing?.address ?? null;
  const found = reasons(who, said, { verdict, ratio, ratioText, address });
  return found.length === 0 && canonicalText(said.governing) !== canonicalText(governing)
    ? [`${who} names what governs otherwise than its worst part`]
    : found;
}
