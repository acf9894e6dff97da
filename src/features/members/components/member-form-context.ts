import { createContext, useContext } from 'react';
import type { LengthName, MemberDraft } from '#shared/contracts/members.ts';

/** The member's form, for the fields in it. */
export interface MemberForm {
  readonly draft: MemberDraft;
  readonly edit: (draft: MemberDraft, field: string) => void;
  readonly editable: boolean;
  /** Why the value at a path is refused. */
  /** A length that follows from the points held, as the sheet prints it; null where none does. */
  readonly derived: (name: LengthName) => string | null;
  readonly problemAt: (path: string) => string | undefined;
}

export const MemberFormContext = createContext<MemberForm | null>(null);

export function useMemberForm(): MemberForm {
  const form = useContext(MemberFormContext);
  if (!form) throw new Error('a field outside the form of a member');
  return form;
}
