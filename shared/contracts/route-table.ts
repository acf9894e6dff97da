import { account } from './account.ts';
import { calculations } from './calculations.ts';
import type { Contract } from './contract.ts';
import { desk } from './desk.ts';
import { health } from './health.ts';
import { library } from './library.ts';
import { members } from './members.ts';
import { projects } from './projects.ts';
import { reports } from './reports.ts';
import { severalMembers } from './several-members.ts';

/** Every route of the API by its name. What is not here is not served. */
export const routeTable = {
  ...health,
  ...account,
  ...desk,
  ...projects,
  ...calculations,
  ...members,
  ...severalMembers,
  ...reports,
  ...library,
} as const satisfies Record<string, Contract>;

export type RouteName = keyof typeof routeTable;
