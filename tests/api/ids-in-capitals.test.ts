import { afterAll, beforeAll, expect, it } from 'vitest';
import { grant } from './support/people.ts';
import { validCalls } from './support/valid-calls.ts';
import { makeWorld, type World } from './support/world.ts';

/** The stranger is engineer of the project, but reviewer of this one calculation. */
let world: World;
beforeAll(async () => {
  world = await makeWorld();
  const { api, of, projectId, calculationId } = world;
  await grant(api, of.stranger.id, { projectId }, ['engineer']);
  await grant(api, of.stranger.id, { projectId, calculationId }, ['reviewer']);
});
afterAll(() => world.api.stop());

it.each(['updateCalculation', 'createMember', 'updateMember', 'deleteMember'] as const)(
  'decides %s by the same grant however the id is written',
  async (route) => {
    const { calculationId, of } = world;
    const call = await validCalls[route]({ world, calculationId, caller: of.stranger });
    const capital = { ...call.params, calculationId: calculationId.toUpperCase() };
    expect(capital.calculationId).not.toBe(calculationId);
    expect((await of.stranger.client.call(route, call)).status).toBe(403);
    expect((await of.stranger.client.call(route, { ...call, params: capital })).status).toBe(403);
  },
);

it('finds the same calculation', async () => {
  const params = { calculationId: world.calculationId.toUpperCase() };
  const shown = await world.of.stranger.client.call('showCalculation', { params });
  expect(shown.body).toMatchObject({ id: world.calculationId, roles: ['reviewer'] });
});
