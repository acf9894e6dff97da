import type { ApiClient } from './api-client.ts';
import { basisDraft, memberDraft } from './drafts.ts';
import { addFirm, addPerson, grant, type Somebody } from './people.ts';
import { type Api, startApi } from './start-api.ts';

/** Everyone the permission matrix asks about, in its columns' order. */
export const people = [
  'engineer',
  'reviewer',
  'issuer',
  'reader',
  'administrator',
  'stranger',
  'otherFirm',
  'guestEngineer',
  'guestReviewer',
  'guestIssuer',
  'guestReader',
  'signedOut',
] as const;
export type PersonName = (typeof people)[number];

export interface World {
  readonly api: Api;
  readonly of: Record<Exclude<PersonName, 'signedOut'>, Somebody>;
  readonly projectId: string;
  /** The calculation that guests are let into. */
  readonly calculationId: string;
  /** Another one of the same project. */
  readonly siblingId: string;
}

/**
 * A firm with a project of two calculations and one person per role; its administrator and a
 * colleague without grants; a person of another firm; guests of one calculation, of no firm.
 */
export async function makeWorld(): Promise<World> {
  const api = await startApi();
  const firmId = await addFirm(api, 'First');
  const otherFirmId = await addFirm(api, 'Second');
  const ofFirm = (name: string) => addPerson(api, name, { firmId, role: 'member' });
  const of = {
    engineer: await addPerson(api, 'engineer', { firmId, role: 'originator' }),
    reviewer: await ofFirm('reviewer'),
    issuer: await ofFirm('issuer'),
    reader: await ofFirm('reader'),
    administrator: await addPerson(api, 'administrator', { firmId, role: 'administrator' }),
    stranger: await ofFirm('stranger'),
    otherFirm: await addPerson(api, 'other', { firmId: otherFirmId, role: 'originator' }),
    guestEngineer: await addPerson(api, 'guest engineer', null),
    guestReviewer: await addPerson(api, 'guest reviewer', null),
    guestIssuer: await addPerson(api, 'guest issuer', null),
    guestReader: await addPerson(api, 'guest reader', null),
  };
  const call = async (...args: Parameters<ApiClient['call']>) => {
    const answer = await of.engineer.client.call(...args);
    if (answer.status !== 200) throw new Error(`${args[0]}: ${answer.text}`);
    return answer;
  };
  const project = await call('createProject', {
    body: { number: 'P1', title: 'Hall', client: '', place: '' },
  });
  const projectId: string = project.body.id;
  const calculation = async (number: string): Promise<string> => {
    const body = { number, title: 'Columns', basis: basisDraft };
    const made = await call('createCalculation', { params: { projectId }, body });
    const params = { calculationId: made.body.id };
    await call('createMember', { params, body: { draft: memberDraft } });
    return made.body.id;
  };
  const calculationId = await calculation('CAL-1');
  const siblingId = await calculation('CAL-2');
  await grant(api, of.reviewer.id, { projectId }, ['reviewer']);
  await grant(api, of.issuer.id, { projectId }, ['issuer']);
  await grant(api, of.reader.id, { projectId }, ['reader']);
  const one = { projectId, calculationId };
  await grant(api, of.guestEngineer.id, one, ['engineer']);
  await grant(api, of.guestReviewer.id, one, ['reviewer']);
  await grant(api, of.guestIssuer.id, one, ['issuer']);
  await grant(api, of.guestReader.id, one, ['reader']);
  return { api, of, projectId, calculationId, siblingId };
}
