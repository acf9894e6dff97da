import { afterAll, beforeAll, beforeEach, expect, it } from 'vitest';
import { memberDraft } from './support/drafts.ts';
import { makeWorld, type World } from './support/world.ts';

let world: World;
let calculationId: string;
let ids: Record<string, string>;
let count = 0;
beforeAll(async () => {
  world = await makeWorld();
});
afterAll(() => world.api.stop());

const call: World['of']['engineer']['client']['call'] = (route, options) =>
  world.of.engineer.client.call(route, options);

/** A calculation of its own for each test, with members A, B and C. */
beforeEach(async () => {
  count += 1;
  const { body: calculation } = await call('showCalculation', {
    params: { calculationId: world.calculationId },
  });
  const body = { number: `S-${count}`, title: 'Several', basis: calculation.basis };
  const made = await call('createCalculation', { params: { projectId: world.projectId }, body });
  calculationId = made.body.id;
  ids = {};
  for (const mark of ['A', 'B', 'C']) {
    const draft = { ...memberDraft, mark };
    ids[mark] = (await call('createMember', { params: { calculationId }, body: { draft } })).body
      .id as string;
  }
});

const toA36 = { set: { material: 'A36' }, drop: [], combinations: [] };
const change = (mark: string, version = 1, patch: object = toA36) => ({
  ...{ memberId: ids[mark] ?? mark, version, patch },
});
const send = (changes: readonly object[]) =>
  call('changeMembers', { params: { calculationId }, body: { changes } });
const show = async (mark: string) =>
  (await call('showMember', { params: { calculationId, memberId: ids[mark] ?? '' } })).body;
const auditOf = async (mark: string) =>
  (
    await world.api.deps.pool.query(
      'select action, before, after from audit where subject_id = $1 order by id',
      [ids[mark]],
    )
  ).rows;

it('changes all of them, each with a verdict of its own run and one audit entry', async () => {
  const before = await show('A');
  const answer = await send([change('A'), change('B')]);
  expect(answer.status, answer.text).toBe(200);
  expect(answer.body).toEqual({
    changed: [
      { memberId: ids.A, version: 2 },
      { memberId: ids.B, version: 2 },
    ],
  });
  for (const mark of ['A', 'B']) {
    const { draft, summary, version } = await show(mark);
    expect(version).toBe(2);
    expect(draft).toEqual({ ...memberDraft, mark, material: 'A36' });
    // The yield stress falls from 50 to 36 ksi.
    expect(summary.ratio).toBeGreaterThan(before.summary.ratio);
    const entries = await auditOf(mark);
    expect(entries.map(({ action }) => action)).toEqual(['member.created', 'member.updated']);
    expect(JSON.parse(entries[1].before).material).toBe('A992');
    expect(JSON.parse(entries[1].after).material).toBe('A36');
  }
  expect((await show('C')).draft.material).toBe('A992');
});

it('changes none where one was changed or deleted meanwhile, and names each', async () => {
  const draft = { ...memberDraft, mark: 'B', place: 'grid 9/Z' };
  const paramsOf = (mark: string) => ({ calculationId, memberId: ids[mark] ?? '' });
  await call('updateMember', { params: paramsOf('B'), body: { version: 1, draft } });
  await call('deleteMember', { params: paramsOf('C') });
  const refused = await send([change('A'), change('B'), change('C')]);
  expect(refused.status).toBe(409);
  const by = (await show('B')).changedBy;
  expect(refused.body.problems).toEqual([
    { path: ids.B, message: `B was changed by ${by}` },
    { path: ids.C, message: `C was deleted by ${by}` },
  ]);
  expect(refused.body.conflict.theirs).toEqual([await show('B')]);
  expect((await show('A')).draft.material).toBe('A992');
  expect(await auditOf('A')).toHaveLength(1);

  // With the version that is there, what the other person changed stays.
  const answer = await send([change('A'), change('B', 2)]);
  expect(answer.status).toBe(200);
  expect((await show('B')).draft).toEqual({ ...draft, material: 'A36' });
});

it('takes a change again whose answer was lost, without a second entry', async () => {
  const first = await send([change('A')]);
  const again = await send([change('A')]);
  expect(again.status).toBe(200);
  expect(again.body).toEqual(first.body);
  expect(await auditOf('A')).toHaveLength(2);
});

it('changes parts and single combinations, and leaves the rest', async () => {
  const restraints = [{ id: 'r1', at: '11 ft', holds: ['twist'], confirmed: false }];
  await send([
    change('A', 1, {
      set: { restraints },
      drop: [],
      combinations: [{ id: 'c1', set: { analysedWith: 'W12X65' }, drop: [] }],
    }),
  ]);
  const { draft } = await show('A');
  expect(draft.restraints).toEqual(restraints);
  expect(draft.combinations).toEqual([{ ...memberDraft.combinations[0], analysedWith: 'W12X65' }]);
  await send([change('A', 2, { set: {}, drop: ['restraints'], combinations: [] })]);
  expect((await show('A')).draft).not.toHaveProperty('restraints');
});

it.each([
  ['no member', () => []],
  ['a member twice', () => [change('A'), change('A')]],
  ['no version', () => [{ memberId: ids.A, patch: toA36 }]],
  ['a field that is none', () => [change('A', 1, { ...toA36, set: { material: 7 } })]],
] as const)('refuses %s', async (_, changes) => {
  const refused = await send(changes());
  expect(refused.status).toBe(400);
  expect((await show('A')).version).toBe(1);
});

it('does not find members of another calculation', async () => {
  const body = { draft: { ...memberDraft, mark: 'X' } };
  const other = await call('createMember', {
    params: { calculationId: world.calculationId },
    body,
  });
  const refused = await send([change('A'), change(other.body.id)]);
  expect(refused.status).toBe(404);
  expect((await show('A')).version).toBe(1);
});
