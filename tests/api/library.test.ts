import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { members } from '#server/db/schema/calculations.ts';
import { memberFormulaUses } from '#server/db/schema/formula-uses.ts';
import { refreshSummaries } from '#server/features/members/refresh-summaries.ts';
import type { MemberUse } from '#shared/contracts/library.ts';
import { memberDraft } from './support/drafts.ts';
import { makeWorld, type World } from './support/world.ts';

let world: World;
beforeAll(async () => {
  world = await makeWorld();
});
afterAll(() => world.api.stop());

const E3 = { book: 'aisc360-22', clause: 'E3' };

async function usesSeenBy(name: keyof World['of'], params = E3) {
  const answer = await world.of[name].client.call('listClauseUses', { params });
  expect(answer.status, answer.text).toBe(200);
  return answer.body as { members: MemberUse[]; total: number };
}
const calculationsSeenBy = async (name: keyof World['of']) =>
  (await usesSeenBy(name)).members.map(({ calculation }) => calculation.id);

it('shows to each person the members of the calculations they may see, and no others', async () => {
  const { calculationId, siblingId } = world;
  for (const name of ['engineer', 'reviewer', 'issuer', 'reader'] as const)
    expect(await calculationsSeenBy(name), name).toEqual([calculationId, siblingId]);
  for (const name of ['guestEngineer', 'guestReviewer', 'guestIssuer', 'guestReader'] as const)
    expect(await calculationsSeenBy(name), name).toEqual([calculationId]);
  for (const name of ['administrator', 'stranger', 'otherFirm'] as const)
    expect(await usesSeenBy(name), name).toEqual({ members: [], total: 0 });
});

it('keeps the members of another firm apart, though they use the same formulas', async () => {
  const { client } = world.of.otherFirm;
  const body = { number: 'Q1', title: 'Mast', client: '', place: '' };
  const projectId = (await client.call('createProject', { body })).body.id;
  const { basis } = (
    await world.of.engineer.client.call('showCalculation', {
      params: { calculationId: world.calculationId },
    })
  ).body;
  const made = await client.call('createCalculation', {
    ...{ params: { projectId }, body: { number: 'CAL-9', title: 'Mast', basis } },
  });
  const draft = { ...memberDraft, mark: 'M-1' };
  await client.call('createMember', {
    params: { calculationId: made.body.id },
    body: { draft },
  });
  const own = await usesSeenBy('otherFirm');
  expect(own.members.map(({ member }) => member.mark)).toEqual(['M-1']);
  expect(await calculationsSeenBy('engineer')).not.toContain(made.body.id);
});

it('names the place of a use as the sheet has it', async () => {
  const { members: seen, total } = await usesSeenBy('engineer');
  expect(total).toBe(seen.length);
  const [first] = seen;
  if (!first) throw new Error('no use');
  expect(first).toMatchObject({
    project: { number: 'P1', title: 'Hall' },
    calculation: { id: world.calculationId, number: 'CAL-1', title: 'Columns' },
    member: { mark: memberDraft.mark, section: memberDraft.section.text },
  });
  // E3-4 about both axes, first the major one; E3-2 for the one stress that governs.
  expect(first.uses).toContainEqual({
    ...{ formula: 'aisc360-22/E3-4', address: 'E3/x/Fe', lines: 2, combinations: 0 },
  });
  expect(first.uses).toContainEqual({
    ...{ formula: 'aisc360-22/E3-2', address: 'E3/Fn', lines: 1, combinations: 0 },
  });
});

it('counts the combinations of lines that stand in them', async () => {
  const { members: seen } = await usesSeenBy('engineer', { book: 'aisc360-22', clause: 'H1.1' });
  const [first] = seen;
  const { combinations } = memberDraft;
  for (const { address, combinations: count } of first?.uses ?? []) {
    expect(address).toMatch(/:H1\//);
    expect(count).toBeGreaterThan(0);
    expect(count).toBeLessThanOrEqual(combinations.length);
  }
  expect(first?.uses.length).toBeGreaterThan(0);
});

it('follows every change of a member', async () => {
  const { client } = world.of.engineer;
  const params = { calculationId: world.siblingId };
  const marks = async () =>
    (await usesSeenBy('engineer')).members
      .filter(({ calculation }) => calculation.id === world.siblingId)
      .map(({ member }) => member.mark);
  const before = await marks();
  const draft = { ...memberDraft, mark: 'C-31' };
  const made = await client.call('createMember', { params, body: { draft } });
  const memberId = made.body.id;
  const ofMember = { ...params, memberId };
  expect(await marks()).toEqual([...before, 'C-31']);
  // A draft that cannot be run uses nothing.
  const invalid = { ...draft, length: { text: '', confirmed: false } };
  await client.call('updateMember', { params: ofMember, body: { version: 1, draft: invalid } });
  expect(await marks()).toEqual(before);
  await client.call('updateMember', { params: ofMember, body: { version: 2, draft } });
  expect(await marks()).toEqual([...before, 'C-31']);
  await client.call('duplicateMember', { params: ofMember, body: {} });
  expect(await marks()).toHaveLength(before.length + 2);
  await client.call('deleteMember', { params: ofMember });
  expect(await marks()).toHaveLength(before.length + 1);
  await client.call('restoreMember', { params: ofMember, body: {} });
  expect(await marks()).toHaveLength(before.length + 2);
});

it('is filled again for members that an older engine ran', async () => {
  const { db } = world.api.deps;
  const ofCalculation = eq(members.calculationId, world.calculationId);
  const [member] = await db.select().from(members).where(ofCalculation);
  if (!member) throw new Error('no member');
  const kept = () =>
    db.select().from(memberFormulaUses).where(eq(memberFormulaUses.memberId, member.id));
  const before = await kept();
  expect(before.length).toBeGreaterThan(10);
  await db.delete(memberFormulaUses).where(eq(memberFormulaUses.memberId, member.id));
  await db.update(members).set({ summaryEngine: '' }).where(eq(members.id, member.id));
  await refreshSummaries(world.api.deps);
  expect(new Set((await kept()).map(({ formula }) => formula))).toEqual(
    new Set(before.map(({ formula }) => formula)),
  );
});

it('knows no clause that the books have not', async () => {
  const { client } = world.of.engineer;
  for (const params of [
    { book: 'aisc360-22', clause: 'Z9' },
    { book: 'no-book', clause: 'E3' },
  ])
    expect((await client.call('listClauseUses', { params })).status).toBe(404);
});
