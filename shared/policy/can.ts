import {
  type CalculationPermission,
  calculationPermissions,
  type FirmPermission,
  type FirmRole,
  firmPermissions,
  type Permission,
  type ProjectPermission,
  projectPermissions,
  type Role,
} from './permissions.ts';

/** Roles of one user on a project, or on one calculation of it. */
export interface Grant {
  readonly projectId: string;
  readonly calculationId: string | null;
  readonly roles: readonly Role[];
}

/** What decides a person's rights: their firm and their grants, nothing else. */
export interface Actor {
  readonly userId: string;
  readonly firm: { readonly firmId: string; readonly role: FirmRole } | null;
  readonly grants: readonly Grant[];
}

export type Resource =
  | { readonly kind: 'firm'; readonly firmId: string }
  | { readonly kind: 'project'; readonly projectId: string }
  | { readonly kind: 'calculation'; readonly projectId: string; readonly calculationId: string };

/**
 * The roles a person has on a resource. A grant on one calculation replaces the project's grant
 * there, so that a person may be engineer of one calculation and reviewer of another of the same
 * project and never holds both on one.
 */
export function rolesOn(
  actor: Actor,
  resource: Exclude<Resource, { kind: 'firm' }>,
): readonly Role[] {
  const ofProject = actor.grants.filter((grant) => grant.projectId === resource.projectId);
  if (resource.kind === 'calculation') {
    const own = ofProject.find((grant) => grant.calculationId === resource.calculationId);
    if (own) return own.roles;
  }
  return ofProject.find((grant) => grant.calculationId === null)?.roles ?? [];
}

const has = <T extends string>(allowed: readonly T[], held: readonly T[]) =>
  held.some((role) => allowed.includes(role));

/** Whether a person may do something to a resource; false where the permission is of another kind. */
export function can(actor: Actor, permission: Permission, resource: Resource): boolean {
  switch (resource.kind) {
    case 'firm':
      return (
        permission in firmPermissions &&
        actor.firm?.firmId === resource.firmId &&
        has<FirmRole>(firmPermissions[permission as FirmPermission], [actor.firm.role])
      );
    case 'project':
      return (
        permission in projectPermissions &&
        has<Role>(projectPermissions[permission as ProjectPermission], rolesOn(actor, resource))
      );
    case 'calculation':
      return (
        permission in calculationPermissions &&
        has<Role>(
          calculationPermissions[permission as CalculationPermission],
          rolesOn(actor, resource),
        )
      );
  }
}

/** Whether a person may know that the resource exists; what may not be seen is not found. */
export function canSee(actor: Actor, resource: Resource): boolean {
  switch (resource.kind) {
    case 'firm':
      return actor.firm?.firmId === resource.firmId;
    case 'project':
      return can(actor, 'project.view', resource);
    case 'calculation':
      return can(actor, 'calculation.view', resource);
  }
}
