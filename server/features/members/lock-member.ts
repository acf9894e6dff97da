import { and, eq, isNotNull, isNull } from 'drizzle-orm';
import { members } from '#server/db/schema/calculations.ts';
import type { Transaction } from '#server/db/transaction.ts';
import { lockCalculation } from '#server/features/calculations/lock-calculation.ts';
import { notFound } from '#server/http/app-error.ts';

/** Loads a member and its calculation's basis for a change of it. */
export async function lockMember(
  tx: Transaction,
  calculationId: string,
  memberId: string,
  state: 'present' | 'deleted',
) {
  const { basis } = await lockCalculation(tx, calculationId);
  const [stored] = await tx.db
    .select()
    .from(members)
    .where(
      and(
        eq(members.id, memberId),
        eq(members.calculationId, calculationId),
        state === 'present' ? isNull(members.deletedAt) : isNotNull(members.deletedAt),
      ),
    );
  if (!stored) throw notFound();
  return { stored, basis };
}
