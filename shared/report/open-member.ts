import type { CalculationRecord, MemberRecord } from '../calc/record.ts';
import { createPresenter, type Presenter } from './presenter.ts';
import { symbolTex } from './sheet-books.ts';

/** A member of a record with its presenter; throws if it is not there. */
export function openMember(
  record: CalculationRecord,
  memberId: string,
): { member: MemberRecord; presenter: Presenter } {
  const position = record.members.findIndex((m) => m.id === memberId);
  const member = record.members[position];
  if (!member) throw new Error(`no member ${memberId} in the record`);
  const presenter = createPresenter(member, position + 1, record.units, (book, name) =>
    symbolTex(book ?? record.standard, name),
  );
  return { member, presenter };
}
