import { summaryOf } from '#server/features/members/stored-member.ts';
import { worstVerdict } from '#shared/calc/verdict.ts';
import type { CalculationRow } from '#shared/contracts/calculations.ts';
import type { MemberSummary } from '#shared/contracts/members.ts';
import type { VisibleCalculation } from './visible-calculations.ts';

/** What lists show of a calculation: its members' worst verdict, largest ratio and open inputs. */
export function rowOf(found: VisibleCalculation): CalculationRow {
  const { stored, project, basis, members } = found;
  const present = members.filter(({ member }) => member.deletedAt === null);
  const summaries = present.map(({ member }) => summaryOf(member));
  const largest = largestRatio(summaries);
  const last = members.reduce(
    (a, { member, by }) => (member.changedAt > a.at ? { at: member.changedAt, by } : a),
    { at: stored.changedAt, by: found.by },
  );
  return {
    ...{ id: stored.id, number: stored.number, title: stored.title },
    project: { id: project.id, number: project.number, title: project.title },
    ...{ revision: stored.revision, state: 'draft', design: basis.design, units: basis.units },
    verdict: summaries.length > 0 ? worstVerdict(summaries.map(({ verdict }) => verdict)) : null,
    ratio: largest?.ratio ?? null,
    ratioText: largest?.ratioText ?? null,
    members: summaries.length,
    unconfirmed: summaries.reduce((sum, { unconfirmed }) => sum + unconfirmed, 0),
    roles: found.roles,
    changedBy: last.by,
    changedAt: last.at.toISOString(),
  };
}

const largestRatio = (summaries: readonly MemberSummary[]) =>
  summaries.reduce<MemberSummary | null>(
    (a, b) => (b.ratio !== null && (a?.ratio == null || b.ratio > a.ratio) ? b : a),
    null,
  );
