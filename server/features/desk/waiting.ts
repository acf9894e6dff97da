import type { VisibleCalculation } from '#server/features/calculations/visible-calculations.ts';
import { memberRowOf } from '#server/features/members/stored-member.ts';
import { type WaitingItem, waitingReasons } from '#shared/contracts/desk.ts';
import type { MemberRow } from '#shared/contracts/members.ts';

/** What waits for the engineer in their calculations, the worst first. */
export function waitingOf(calculations: readonly VisibleCalculation[]): WaitingItem[] {
  return calculations
    .filter(({ roles }) => roles.includes('engineer'))
    .flatMap(({ stored: { id, number, title }, members }) =>
      members
        .filter(({ member }) => member.deletedAt === null)
        .map(({ member }) => memberRowOf(member))
        .flatMap((row) =>
          reasonsOf(row).map(({ reason, count }) => ({
            reason,
            calculation: { id, number, title },
            member: { id: row.id, mark: row.mark, section: row.section },
            ratioText: row.summary.ratioText,
            count,
          })),
        ),
    )
    .sort((a, b) => waitingReasons.indexOf(a.reason) - waitingReasons.indexOf(b.reason));
}

function reasonsOf({ summary }: MemberRow): Pick<WaitingItem, 'reason' | 'count'>[] {
  const { verdict, problems, unconfirmed } = summary;
  const invalid = problems.length > 0;
  return [
    ...(verdict === 'FAILED' ? [{ reason: 'failed' as const, count: 0 }] : []),
    ...(verdict === 'NOT OK' ? [{ reason: 'over-limit' as const, count: 0 }] : []),
    ...(verdict === 'NOT CHECKED' && !invalid
      ? [{ reason: 'not-checked' as const, count: 0 }]
      : []),
    ...(invalid ? [{ reason: 'invalid' as const, count: problems.length }] : []),
    ...(unconfirmed > 0 ? [{ reason: 'unconfirmed' as const, count: unconfirmed }] : []),
  ];
}
