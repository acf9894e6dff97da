import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type RouteName, routeTable } from '#shared/contracts/route-table.ts';
import { fingerprint } from './support/fingerprint.ts';
import { password } from './support/people.ts';
import { validCalls } from './support/valid-calls.ts';
import { makeWorld, type PersonName, people, type World } from './support/world.ts';

/*
 * Who may do what, written by hand from the roles' descriptions and not from the application's own
 * tables. A route that is missing here fails the test.
 *
 * Columns: engineer, reviewer, issuer, reader of the project · administrator and a stranger of the
 * same firm, an engineer of another firm · a guest of this one calculation as engineer, reviewer,
 * issuer, reader · signed out.
 */
const open /*   */ = [200, 200, 200, 200, 200, 200, 200, 200, 200, 200, 200, 200];
const person /* */ = [200, 200, 200, 200, 200, 200, 200, 200, 200, 200, 200, 401];
const opening /**/ = [200, 403, 403, 403, 200, 403, 200, 403, 403, 403, 403, 401];
const seeProject = [200, 200, 200, 200, 404, 404, 404, 404, 404, 404, 404, 401];
const doProject = [200, 403, 403, 403, 404, 404, 404, 404, 404, 404, 404, 401];
const seeOne /* */ = [200, 200, 200, 200, 404, 404, 404, 200, 200, 200, 200, 401];
const doOne /*  */ = [200, 403, 403, 403, 404, 404, 404, 200, 403, 403, 403, 401];

const expected: Record<string, readonly number[]> = {
  showHealth: open,
  showSession: open,
  signIn: open,
  showWelcome: open,
  acceptWelcome: open,
  signOut: person,
  changePassword: person,
  showDesk: person,
  listProjects: person,
  listClauseUses: person,
  createProject: opening,
  showProject: seeProject,
  updateProject: doProject,
  createDrawing: doProject,
  updateDrawing: doProject,
  deleteDrawing: doProject,
  restoreDrawing: doProject,
  createCalculation: doProject,
  showCalculation: seeOne,
  downloadInput: seeOne,
  showRecord: seeOne,
  showReport: seeOne,
  downloadReport: seeOne,
  updateCalculation: doOne,
  createMember: doOne,
  showMember: seeOne,
  updateMember: doOne,
  duplicateMember: doOne,
  deleteMember: doOne,
  restoreMember: doOne,
  reorderMembers: doOne,
  changeMembers: doOne,
};

/** Reports first, while the calculation has one member only. */
const reports: RouteName[] = ['showRecord', 'showReport', 'downloadReport'];
const routes = [
  ...reports,
  ...(Object.keys(routeTable) as RouteName[]).filter((route) => !reports.includes(route)),
];
/** These change the browser's own session: each gets a browser of its own. */
const ownBrowser: RouteName[] = ['signIn', 'signOut', 'changePassword', 'acceptWelcome'];

let world: World;
beforeAll(async () => {
  world = await makeWorld();
});
afterAll(() => world.api.stop());

async function callAs(name: PersonName, route: RouteName, calculationId: string) {
  const caller = name === 'signedOut' ? null : world.of[name];
  const call = await validCalls[route]({ world, calculationId, caller });
  const fresh = caller === null || ownBrowser.includes(route);
  const client = fresh ? world.api.client() : caller.client;
  if (fresh && caller) await client.signIn(caller.email, password);
  const before = await fingerprint(world.api.deps.pool);
  const answer = await client.call(route, call);
  const changed = (await fingerprint(world.api.deps.pool)) !== before;
  // A new password ends the person's other sessions.
  if (route === 'changePassword') await caller?.client.signIn(caller.email, password);
  return { answer, changed };
}

it('knows every route', () => {
  expect(Object.keys(expected).sort()).toEqual([...routes].sort());
});

describe.each(routes)('%s', (route) => {
  it.each(people.map((name, column) => [name, column] as const))('%s', async (name, column) => {
    const status = expected[route]?.[column];
    const { answer, changed } = await callAs(name, route, world.calculationId);
    expect(answer.status, answer.text).toBe(status);
    if (status !== 200) {
      expect(answer.headers['content-type']).toContain('application/problem+json');
      expect(changed).toBe(false);
    }
  });
});

const ofCalculation = routes.filter((route) =>
  routeTable[route].path.startsWith('/api/calculations/'),
);
const guests = people.filter((name) => name.startsWith('guest'));

describe.each(ofCalculation)('%s of another calculation of the project', (route) => {
  it.each(guests)('%s', async (name) => {
    const { answer, changed } = await callAs(name, route, world.siblingId);
    expect(answer.status).toBe(404);
    expect(changed).toBe(false);
  });
});
