import { randomUUID } from 'node:crypto';
import { transaction } from '#server/db/transaction.ts';
import { makeWelcomeToken } from '#server/features/account/welcome-token.ts';
import type { RouteName } from '#shared/contracts/route-table.ts';
import type { Call } from './api-client.ts';
import { basisDraft, memberDraft } from './drafts.ts';
import { addPerson, password, type Somebody } from './people.ts';
import type { World } from './world.ts';

interface Target {
  readonly world: World;
  readonly calculationId: string;
  /** Who will call; null when signed out. */
  readonly caller: Somebody | null;
}

type Prepare = (target: Target) => Call | Promise<Call>;

const unique = () => randomUUID().slice(0, 8);
const nothing: Prepare = () => ({});

const ofProject = ({ world }: Target) => ({ projectId: world.projectId });

async function newDrawing(target: Target) {
  const params = ofProject(target);
  const body = { number: unique(), title: 'Plan', revision: 'A', status: 'preliminary' };
  const made = await target.world.of.engineer.client.call('createDrawing', { params, body });
  return { params: { ...params, drawingId: made.body.id }, body: { ...body, version: 1 } };
}

async function newMember({ world, calculationId }: Target) {
  const body = { draft: { ...memberDraft, mark: unique() } };
  const params = { calculationId };
  const made = await world.of.engineer.client.call('createMember', { params, body });
  return { calculationId, memberId: made.body.id as string };
}

async function welcomeToken({ world: { api } }: Target) {
  const invited = await addPerson(api, `invited ${unique()}`, null);
  return transaction(api.deps.pool, (tx) => makeWelcomeToken(tx, invited.id, api.deps.now()));
}

/** For each route a call that is right in itself, on things made for it. */
export const validCalls: Record<RouteName, Prepare> = {
  showHealth: nothing,
  showSession: nothing,
  signIn: ({ caller, world }) => ({
    body: { email: (caller ?? world.of.reader).email, password },
  }),
  signOut: nothing,
  changePassword: () => ({ body: { current: password, next: password } }),
  showWelcome: async (target) => ({ params: { token: await welcomeToken(target) } }),
  acceptWelcome: async (target) => ({
    params: { token: await welcomeToken(target) },
    body: { password },
  }),
  showDesk: nothing,
  listProjects: nothing,
  listClauseUses: () => ({ params: { book: 'aisc360-22', clause: 'E3' } }),
  createProject: () => ({ body: { number: unique(), title: 'New', client: '', place: '' } }),
  showProject: (target) => ({ params: ofProject(target) }),
  updateProject: async (target) => {
    const params = ofProject(target);
    const { body } = await target.world.of.engineer.client.call('showProject', { params });
    const { number, client, place, version } = body;
    return { params, body: { number, title: unique(), client, place, version } };
  },
  createDrawing: (target) => ({
    params: ofProject(target),
    body: { number: unique(), title: '', revision: 'A', status: 'preliminary' },
  }),
  updateDrawing: async (target) => {
    const { params, body } = await newDrawing(target);
    return { params, body: { ...body, revision: 'B' } };
  },
  deleteDrawing: async (target) => ({ params: (await newDrawing(target)).params }),
  restoreDrawing: async (target) => {
    const { params } = await newDrawing(target);
    await target.world.of.engineer.client.call('deleteDrawing', { params });
    return { params, body: {} };
  },
  createCalculation: (target) => ({
    params: ofProject(target),
    body: { number: unique(), title: 'New', basis: basisDraft },
  }),
  showCalculation: ({ calculationId }) => ({ params: { calculationId } }),
  updateCalculation: async ({ world, calculationId }) => {
    const params = { calculationId };
    const { body } = await world.of.engineer.client.call('showCalculation', { params });
    const { number, basis, version } = body;
    return { params, body: { number, title: unique(), basis, version } };
  },
  downloadInput: ({ calculationId }) => ({ params: { calculationId } }),
  showRecord: ({ calculationId }) => ({ params: { calculationId } }),
  showReport: ({ calculationId }) => ({ params: { calculationId } }),
  downloadReport: ({ calculationId }) => ({ params: { calculationId } }),
  createMember: ({ calculationId }) => ({
    params: { calculationId },
    body: { draft: { ...memberDraft, mark: unique() } },
  }),
  showMember: async (target) => ({ params: await newMember(target) }),
  updateMember: async (target) => ({
    params: await newMember(target),
    body: { version: 1, draft: { ...memberDraft, mark: unique() } },
  }),
  duplicateMember: async (target) => ({ params: await newMember(target), body: {} }),
  deleteMember: async (target) => ({ params: await newMember(target) }),
  restoreMember: async (target) => {
    const params = await newMember(target);
    await target.world.of.engineer.client.call('deleteMember', { params });
    return { params, body: {} };
  },
  reorderMembers: async ({ world, calculationId }) => {
    const params = { calculationId };
    const { body } = await world.of.engineer.client.call('showCalculation', { params });
    const memberIds = body.memberRows.map(({ id }: { id: string }) => id).reverse();
    return { params, body: { memberIds } };
  },
  changeMembers: async (target) => {
    const { calculationId, memberId } = await newMember(target);
    const patch = { set: { material: 'A36' }, drop: [], combinations: [] };
    return { params: { calculationId }, body: { changes: [{ memberId, version: 1, patch }] } };
  },
};
