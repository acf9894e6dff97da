import type { BasisDraft } from './calculations.ts';
import type { MemberDraft } from './members.ts';

interface ProjectSnapshot {
  readonly number: string;
  readonly title: string;
  readonly client: string;
  readonly place: string;
}
interface DrawingSnapshot {
  readonly number: string;
  readonly title: string;
  readonly revision: string;
  readonly status: string;
}
interface CalculationSnapshot {
  readonly number: string;
  readonly title: string;
  readonly basis: BasisDraft;
}
interface GrantSnapshot {
  readonly userId: string;
  readonly roles: readonly string[];
}

/** The snapshot each verb needs: without it the call does not compile. */
type Created<Action extends string, T> = { action: Action; before?: never; after: T };
type Updated<Action extends string, T> = { action: Action; before: T; after: T };
type Deleted<Action extends string, T> = { action: Action; before: T; after?: never };
type Happened<Action extends string> = { action: Action; before?: never; after?: never };

/**
 * Everything that is written to the audit log. Stored rows depend on these names and shapes: add
 * to the union, never change a member of it.
 */
export type AuditEvent =
  | Created<'firm.created', { name: string }>
  | Created<'account.created', { role: string }>
  | Happened<'account.welcomed'>
  | Happened<'account.signed-in'>
  | Happened<'account.signed-out'>
  | Happened<'account.sign-in-refused'>
  | Happened<'account.password-changed'>
  | Created<'project.created', ProjectSnapshot>
  | Updated<'project.updated', ProjectSnapshot>
  | Created<'grant.given', GrantSnapshot>
  | Created<'drawing.created', DrawingSnapshot>
  | Updated<'drawing.updated', DrawingSnapshot>
  | Deleted<'drawing.deleted', DrawingSnapshot>
  | Created<'drawing.restored', DrawingSnapshot>
  | Created<'calculation.created', CalculationSnapshot>
  | Updated<'calculation.updated', CalculationSnapshot>
  | Created<'member.created', MemberDraft>
  | Created<'member.duplicated', MemberDraft>
  | Updated<'member.updated', MemberDraft>
  | Deleted<'member.deleted', MemberDraft>
  | Created<'member.restored', MemberDraft>
  | Updated<'members.reordered', readonly string[]>;

export type AuditAction = AuditEvent['action'];
