import { afterAll, beforeAll, beforeEach, expect, it } from 'vitest';
import { refreshSummaries } from '#server/features/members/refresh-summaries.ts';
import { hashesOf } from '#shared/calc/hashes.ts';
import { inputSchema } from '#shared/members/input.ts';
import { basisDraft, memberDraft } from './support/drafts.ts';
import { makeWorld, type World } from './support/world.ts';

let world: World;
let calculationId: string;
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
  const body = { number: `M-${count}`, title: 'Members', basis: basisDraft };
  const made = await call('createCalculation', { params: { projectId: world.projectId }, body });
  calculationId = made.body.id;
  for (const mark of ['A', 'B', 'C']) await add(mark);
});

const add = async (mark: string, changes = {}) => {
  const body = { draft: { ...memberDraft, mark, ...changes } };
  return (await call('createMember', { params: { calculationId }, body })).body;
};
const show = async () => (await call('showCalculation', { params: { calculationId } })).body;
const marks = async () => (await show()).memberRows.map(({ mark }: { mark: string }) => mark);
const idOf = async (mark: string): Promise<string> =>
  (await show()).memberRows.find((row: { mark: string }) => row.mark === mark).id;

it('puts a copy right after its member, under a free mark', async () => {
  const params = { calculationId, memberId: await idOf('A') };
  await call('duplicateMember', { params, body: {} });
  await call('duplicateMember', { params, body: {} });
  expect(await marks()).toEqual(['A', 'A copy 2', 'A copy', 'B', 'C']);
  expect((await show()).problems).toEqual([]);
});

it('deletes a member and restores it to its place, with what it held', async () => {
  const memberId = await idOf('B');
  const params = { calculationId, memberId };
  const before = await call('showMember', { params });
  const deleted = await call('deleteMember', { params });
  expect(await marks()).toEqual(['A', 'C']);
  expect((await show()).deletedMembers).toEqual([deleted.body]);
  expect((await call('showMember', { params })).status).toBe(404);
  expect((await call('deleteMember', { params })).status).toBe(404);
  const restored = await call('restoreMember', { params, body: {} });
  expect(restored.body.draft).toEqual(before.body.draft);
  expect(await marks()).toEqual(['A', 'B', 'C']);
  expect((await call('restoreMember', { params, body: {} })).status).toBe(404);
});

it('takes no member more than an input holds', async () => {
  const params = { calculationId, memberId: await idOf('B') };
  await call('deleteMember', { params });
  await world.api.deps.pool.query(
    `insert into members (id, calculation_id, position, draft, summary, summary_engine, version,
       changed_by, changed_at)
     select gen_random_uuid(), calculation_id, position + number, draft, summary, summary_engine,
       version, changed_by, changed_at
     from members, generate_series(1, 498) number where id = $1`,
    [await idOf('A')],
  );
  const detail = 'A calculation holds at most 500 members.';
  const one = { calculationId, memberId: await idOf('C') };
  for (const [route, options] of [
    ['createMember', { params, body: { draft: memberDraft } }],
    ['duplicateMember', { params: one, body: {} }],
    ['restoreMember', { params, body: {} }],
  ] as const) {
    expect((await call(route, options)).body).toMatchObject({ status: 400, detail });
  }
});

it('runs every member again when the basis changes', async () => {
  const before = await show();
  const body = { number: before.number, title: before.title, version: before.version };
  const basis = { ...basisDraft, analysis: { ...basisDraft.analysis, secondOrder: 'amplified' } };
  const after = await call('updateCalculation', {
    ...{ params: { calculationId }, body: { ...body, basis } },
  });
  const ratio = ({ memberRows }: { memberRows: { summary: { ratio: number } }[] }) =>
    memberRows.map(({ summary }) => summary.ratio);
  expect(after.body.memberRows).toHaveLength(3);
  for (const [index, value] of ratio(after.body).entries()) {
    expect(value).not.toBe(ratio(before)[index]);
  }
});

it('runs again at start what an older engine ran', async () => {
  const { pool } = world.api.deps;
  const { memberRows } = await show();
  const stale =
    "update members set summary = '{}', summary_engine = '0.0.0' where calculation_id = $1";
  await pool.query(stale, [calculationId]);
  await refreshSummaries(world.api.deps);
  expect((await show()).memberRows).toEqual(memberRows);
});

it('says which members keep the whole from being recorded', async () => {
  await add('B');
  await add('D', { length: { text: '-3 ft', confirmed: true } });
  const { problems } = await show();
  expect(problems.map(({ path }: { path: string }) => path)).toContain('members[D].length');
  const record = await call('showRecord', { params: { calculationId } });
  expect(record.status).toBe(422);
  expect(record.body.problems).toEqual(problems);
  const report = await call('downloadReport', { params: { calculationId } });
  expect(report.body.problems).toEqual(problems);
  // The input can be had all the same.
  const input = await call('downloadInput', { params: { calculationId } });
  expect(input.body.members.map(({ mark }: { mark: string }) => mark)).toEqual([
    ...['A', 'B', 'C', 'B', 'D'],
  ]);
});

it('gives the input file of the command line, and its record with hashes', async () => {
  const input = await call('downloadInput', { params: { calculationId } });
  expect(input.headers['content-disposition']).toBe(`attachment; filename=M-${count}.input.json`);
  expect(inputSchema.safeParse(input.body).error).toBeUndefined();
  expect(input.body.members[0]).toMatchObject({
    ...{ mark: 'A', section: { value: 'W12X79' }, Lb: { value: '22 ft', confirmed: true } },
    combinations: [{ P: { value: '310 kip' }, MxA: { value: '118 kip ft' } }],
  });
  expect(input.body.members[0]).not.toHaveProperty('Cb');
  const { body: record } = await call('showRecord', { params: { calculationId } });
  const { resultHash, snapshotHash } = record;
  expect(hashesOf(record)).toEqual({ resultHash, snapshotHash });
});

it('names downloads by the whole number, with signs that file names take', async () => {
  const { number: before, title, version, basis } = await show();
  const number = `a/b\\c"d:${before}\u202e`;
  await call('updateCalculation', {
    ...{ params: { calculationId }, body: { number, title, version, basis } },
  });
  const input = await call('downloadInput', { params: { calculationId } });
  expect(input.headers['content-disposition']).toBe(
    `attachment; filename=a-b-c-d-${before}-.input.json`,
  );
});

it('records no more combinations than can be waited for', async () => {
  const [row] = memberDraft.combinations;
  const combinations = Array.from({ length: 500 }, (_, index) => ({ ...row, id: `c${index}` }));
  for (const mark of ['X', 'Y', 'Z']) await add(mark, { combinations });
  for (const route of ['showRecord', 'showReport', 'downloadReport'] as const) {
    const refused = await call(route, { params: { calculationId } });
    expect(refused.status).toBe(422);
    expect(refused.body.problems).toEqual([
      {
        path: 'members',
        message: 'hold 1503 combinations; at most 1000 are recorded here at once',
      },
    ]);
  }
});

it('makes the report a PDF that is called by number and revision', async () => {
  const report = await call('downloadReport', { params: { calculationId } });
  expect(report.headers).toMatchObject({
    'content-type': 'application/pdf',
    'content-disposition': `attachment; filename="M-${count} rev A draft.pdf"`,
  });
  expect(report.body.subarray(0, 5).toString()).toBe('%PDF-');
});
