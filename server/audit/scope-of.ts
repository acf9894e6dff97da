import type { Viewer } from '#server/auth/viewer.ts';
import type { Deps } from '#server/deps.ts';
import type { AuditScope } from './write-audit.ts';

interface Place {
  readonly firmId: string;
  readonly projectId?: string;
  readonly calculationId?: string;
}

/** The audit scope of what the signed-in person does at a place to a subject. */
export function auditScope(
  { deps, viewer, scope }: { deps: Deps; viewer: Viewer; scope: Place },
  subjectId: string,
): AuditScope {
  return { at: deps.now(), actorId: viewer.userId, subjectId, ...scope };
}

/** The audit scope of what a person does to their own account. */
export function accountScope(deps: Deps, viewer: Viewer): AuditScope {
  return {
    at: deps.now(),
    actorId: viewer.userId,
    firmId: viewer.firm?.firmId ?? null,
    subjectId: viewer.userId,
  };
}
