import type { HandlersOf } from '#server/http/handler.ts';
import type { members } from '#shared/contracts/members.ts';
import { createMember } from './create-member.ts';
import { deleteMember } from './delete-member.ts';
import { duplicateMember } from './duplicate-member.ts';
import { loadMember } from './queries.ts';
import { reorderMembers } from './reorder-members.ts';
import { restoreMember } from './restore-member.ts';
import { updateMember } from './update-member.ts';

export const memberHandlers: HandlersOf<typeof members> = {
  createMember,
  showMember: ({ deps, scope, params }) =>
    loadMember(deps.db, scope.calculationId, params.memberId),
  updateMember,
  duplicateMember,
  deleteMember,
  restoreMember,
  reorderMembers,
};
