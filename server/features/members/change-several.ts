import { eq } from 'drizzle-orm';
import { auditScope } from '#server/audit/scope-of.ts';
import { writeAudit } from '#server/audit/write-audit.ts';
import { members } from '#server/db/schema/calculations.ts';
import { type Transaction, transaction } from '#server/db/transaction.ts';
import { lockCalculation } from '#server/features/calculations/lock-calculation.ts';
import { AppError, notFound } from '#server/http/app-error.ts';
import type { Handler, HandlersOf } from '#server/http/handler.ts';
import { canonicalText } from '#shared/calc/hashes.ts';
import { withPatch } from '#shared/contracts/draft-patch.ts';
import type { MemberDraft } from '#shared/contracts/members.ts';
import type { ProblemPlace } from '#shared/contracts/problems.ts';
import type {
  severalMembers as contracts,
  MemberPatch,
} from '#shared/contracts/several-members.ts';
import { keepFormulaUses } from './keep-formula-uses.ts';
import { storedMembers } from './queries.ts';
import { draftOf, memberOf, runDraft } from './stored-member.ts';

type Found = Awaited<ReturnType<typeof storedMembers>>[number];

/**
 * Changes several members of a calculation, all or none, with one audit entry each. A change that
 * is stored already changes nothing, so that one whose answer was lost can be sent again.
 */
const changeMembers: Handler<typeof contracts.changeMembers> = async (context) => {
  const { deps, viewer, scope, body } = context;
  return transaction(deps.pool, async (tx) => {
    const { basis } = await lockCalculation(tx, scope.calculationId);
    const planned = await plan(tx, scope.calculationId, body.changes);
    const changed: { memberId: string; version: number }[] = [];
    for (const { stored, draft } of planned) {
      if (stored.draft === canonicalText(draft)) {
        changed.push({ memberId: stored.id, version: stored.version });
        continue;
      }
      const { columns, uses } = await runDraft(deps.runs, basis, stored.id, draft);
      const set = {
        ...columns,
        ...{ version: stored.version + 1, changedBy: viewer.userId, changedAt: deps.now() },
      };
      await tx.db.update(members).set(set).where(eq(members.id, stored.id));
      await keepFormulaUses(tx, stored.id, uses);
      const event = { action: 'member.updated', before: draftOf(stored), after: draft } as const;
      await writeAudit(tx, auditScope(context, stored.id), event);
      changed.push({ memberId: stored.id, version: set.version });
    }
    return { changed };
  });
};

export const severalMemberHandlers: HandlersOf<typeof contracts> = { changeMembers };

interface Planned {
  readonly stored: Found['member'];
  readonly draft: MemberDraft;
}

/** What each member comes to; throws the conflict of all that moved on meanwhile. */
async function plan(
  tx: Transaction,
  calculationId: string,
  changes: readonly MemberPatch[],
): Promise<readonly Planned[]> {
  const all = new Map(
    (await storedMembers(tx.db, calculationId)).map((found) => [found.member.id, found]),
  );
  const planned: Planned[] = [];
  const moved: Found[] = [];
  for (const { memberId, version, patch } of changes) {
    const found = all.get(memberId);
    if (!found) throw notFound();
    const { member: stored } = found;
    const draft = withPatch(draftOf(stored), patch);
    const isThere = stored.draft === canonicalText(draft);
    if (stored.deletedAt || (stored.version !== version && !isThere)) moved.push(found);
    else planned.push({ stored, draft });
  }
  const [first, ...rest] = moved;
  if (first) throw movedOn([first, ...rest]);
  return planned;
}

function movedOn(moved: readonly [Found, ...Found[]]): AppError {
  const last = moved.reduce((a, b) => (b.member.changedAt > a.member.changedAt ? b : a));
  const theirs = moved
    .filter(({ member }) => member.deletedAt === null)
    .map(({ member, by }) => memberOf(member, by));
  return new AppError('conflict', {
    detail: 'Some of the members were changed meanwhile; nothing was changed here.',
    problems: moved.map(({ member, by }): ProblemPlace => {
      const did = member.deletedAt ? 'deleted' : 'changed';
      return {
        path: member.id,
        message: `${draftOf(member).mark || 'The member without a mark'} was ${did} by ${by}`,
      };
    }),
    conflict: { theirs, changedBy: last.by, changedAt: last.member.changedAt.toISOString() },
  });
}
