import { randomUUID } from 'node:crypto';
import { sql } from 'drizzle-orm';
import { writeAudit } from '#server/audit/write-audit.ts';
import { hashPassword } from '#server/auth/password.ts';
import { grants } from '#server/db/schema/grants.ts';
import { firms } from '#server/db/schema/people.ts';
import { drawings, projects } from '#server/db/schema/projects.ts';
import { type Transaction, transaction } from '#server/db/transaction.ts';
import type { Deps } from '#server/deps.ts';
import { createAccount } from '#server/features/account/create-account.ts';
import { createFirm } from '#server/features/account/create-firm.ts';
import { craneBasis, craneMembers } from './crane-bay.ts';
import { demoAccounts, demoPassword } from './demo-accounts.ts';
import { hallBasis, hallMembers } from './hall-columns.ts';
import { type SeedPlace, seedCalculation } from './seed-calculation.ts';

/** Any fixed number: the lock under which one process seeds. */
const lock = 4_310_002;

const project = {
  number: 'TQ',
  title: 'Tern Quay Ferry Hall',
  client: 'Tern Quay Port Trust',
  place: 'Tern Quay',
};

const register = [
  { number: 'S-201', title: 'Ferry hall, framing plan', revision: 'C', status: 'for construction' },
  { number: 'S-210', title: 'Ferry hall, column schedule', revision: 'B', status: 'for approval' },
  { number: 'S-305', title: 'Crane bay, sections', revision: 'D', status: 'for approval' },
  { number: 'S-310', title: 'Canopy, plan and details', revision: 'A', status: 'preliminary' },
] as const;

/** Fills an empty database with the invented firm, project and calculations of the demo. */
export async function seedDemo(deps: Deps): Promise<void> {
  const passwordHash = await hashPassword(demoPassword);
  await transaction(deps.pool, async (tx) => {
    await tx.db.execute(sql`select pg_advisory_xact_lock(${lock})`);
    if ((await tx.db.select().from(firms).limit(1)).length > 0) return;
    const place = await seedProject(tx, passwordHash, deps.now());
    await seedCalculation(tx, deps.runs, place, {
      ...{ number: 'TQ-CAL-012', title: 'Hall columns', revision: 'B' },
      ...{ basis: hallBasis, members: hallMembers },
    });
    await seedCalculation(tx, deps.runs, place, {
      ...{ number: 'TQ-CAL-014', title: 'Crane bay and canopy', revision: 'A' },
      ...{ basis: craneBasis, members: craneMembers },
    });
  });
}

async function seedProject(tx: Transaction, passwordHash: string, now: Date): Promise<SeedPlace> {
  const firmId = await createFirm(tx, 'Harrow & Pike Structural', now);
  const people = [];
  for (const { name, email, role } of demoAccounts) {
    const firmRole = role === 'engineer' ? 'originator' : 'member';
    const firm = role === 'reader' ? null : ({ firmId, role: firmRole } as const);
    people.push({
      role,
      userId: await createAccount(tx, { name, email, firm, passwordHash }, now),
    });
  }
  const engineer = people.find(({ role }) => role === 'engineer');
  if (!engineer) throw new Error('the demo has no engineer');
  const projectId = randomUUID();
  const place = { firmId, projectId, engineerId: engineer.userId, now };
  const changed = { version: 1, changedBy: engineer.userId, changedAt: now };
  const scope = { at: now, actorId: engineer.userId, firmId, projectId };
  await tx.db.insert(projects).values({ id: projectId, firmId, ...project, ...changed });
  const created = { action: 'project.created', after: project } as const;
  await writeAudit(tx, { ...scope, subjectId: projectId }, created);
  for (const { role, userId } of people) {
    const id = randomUUID();
    await tx.db.insert(grants).values({ id, userId, projectId, roles: [role] });
    const given = { action: 'grant.given', after: { userId, roles: [role] } } as const;
    await writeAudit(tx, { ...scope, subjectId: id }, given);
  }
  for (const drawing of register) {
    const id = randomUUID();
    await tx.db.insert(drawings).values({ id, projectId, ...drawing, ...changed });
    const added = { action: 'drawing.created', after: drawing } as const;
    await writeAudit(tx, { ...scope, subjectId: id }, added);
  }
  return place;
}
