import { and, inArray } from 'drizzle-orm';
import type { Viewer } from '#server/auth/viewer.ts';
import { memberFormulaUses } from '#server/db/schema/formula-uses.ts';
import type { Db } from '#server/db/transaction.ts';
import { visibleCalculations } from '#server/features/calculations/visible-calculations.ts';
import { draftOf } from '#server/features/members/stored-member.ts';
import { notFound } from '#server/http/app-error.ts';
import { type MemberUse, mostMemberUses } from '#shared/contracts/library.ts';
import { bookNamed } from '#shared/standards/library.ts';

/** Present members of visible calculations that use a clause's formulas. Not found: no such clause. */
export async function clauseUses(
  db: Db,
  viewer: Viewer,
  place: { readonly book: string; readonly clause: string },
) {
  const formulas = [...(bookNamed(place.book)?.formulas.values() ?? [])]
    .filter(({ clause }) => clause === place.clause)
    .map(({ id }) => id);
  if (formulas.length === 0) throw notFound();
  const present = (await visibleCalculations(db, viewer, {})).flatMap(
    ({ stored, project, members }) =>
      members
        .filter(({ member }) => member.deletedAt === null)
        .map(({ member }) => ({ calculation: stored, project, member })),
  );
  const rows = await db
    .select()
    .from(memberFormulaUses)
    .where(
      and(
        inArray(memberFormulaUses.formula, formulas),
        inArray(
          memberFormulaUses.memberId,
          present.map(({ member }) => member.id),
        ),
      ),
    );
  // In the order in which the clause has its formulas.
  rows.sort((a, b) => formulas.indexOf(a.formula) - formulas.indexOf(b.formula));
  const users = new Set(rows.map(({ memberId }) => memberId));
  const using = present.filter(({ member }) => users.has(member.id));
  const members = using
    .slice(0, mostMemberUses)
    .map(({ calculation, project, member }): MemberUse => {
      const { mark, section } = draftOf(member);
      return {
        project: { number: project.number, title: project.title },
        calculation: {
          ...{ id: calculation.id, number: calculation.number, title: calculation.title },
        },
        member: { id: member.id, mark, section: section.text },
        uses: rows.filter(({ memberId }) => memberId === member.id),
      };
    });
  return { members, total: using.length };
}
