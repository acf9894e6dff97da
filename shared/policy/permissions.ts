/** What a grant's roles allow on a project or on one calculation. */
export const roles = ['engineer', 'reviewer', 'issuer', 'reader'] as const;
export type Role = (typeof roles)[number];

/** What a person is in their firm. An originator may open projects; a member sees only grants. */
export const firmRoles = ['administrator', 'originator', 'member'] as const;
export type FirmRole = (typeof firmRoles)[number];

const everyRole = roles;

/** Permissions of a firm, by firm role. */
export const firmPermissions = {
  'project.create': ['administrator', 'originator'],
} as const satisfies Record<string, readonly FirmRole[]>;

/** Permissions on a whole project, by granted role. */
export const projectPermissions = {
  'project.view': everyRole,
  'project.edit': ['engineer'],
  'drawing.edit': ['engineer'],
  'calculation.create': ['engineer'],
} as const satisfies Record<string, readonly Role[]>;

/** Permissions on one calculation, by granted role. */
export const calculationPermissions = {
  'calculation.view': everyRole,
  'calculation.edit': ['engineer'],
  'member.edit': ['engineer'],
} as const satisfies Record<string, readonly Role[]>;

export type FirmPermission = keyof typeof firmPermissions;
export type ProjectPermission = keyof typeof projectPermissions;
export type CalculationPermission = keyof typeof calculationPermissions;
export type Permission = FirmPermission | ProjectPermission | CalculationPermission;
