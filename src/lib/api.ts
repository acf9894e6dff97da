import { csrfHeader, sessionState } from '#shared/contracts/account.ts';
import {
  type AnswerOf,
  type BodyInputOf,
  type ParamsOf,
  pathOf,
} from '#shared/contracts/contract.ts';
import { type RouteName, routeTable } from '#shared/contracts/route-table.ts';
import { isProblem, problemOf, unreachable } from './problem.ts';

type Routes = typeof routeTable;
type FileRoute = {
  [N in RouteName]: Routes[N]['answer'] extends { file: string } ? N : never;
}[RouteName];
type JsonRoute = Exclude<RouteName, FileRoute>;

type Parts<N extends RouteName> = (string extends keyof ParamsOf<Routes[N]>
  ? { params?: undefined }
  : { params: ParamsOf<Routes[N]> }) &
  (BodyInputOf<Routes[N]> extends null ? { body?: undefined } : { body: BodyInputOf<Routes[N]> });

interface Sent {
  params?: Readonly<Record<string, string>> | undefined;
  body?: unknown;
  signal?: AbortSignal | undefined;
}

let csrfToken: string | null = null;

/** Calls a route of the table; throws a Problem. Answers are checked against the contract. */
export async function call<N extends JsonRoute>(
  name: N,
  request: Parts<N> & { signal?: AbortSignal },
): Promise<AnswerOf<Routes[N]>> {
  const route = routeTable[name];
  const response = await send(name, request as Sent);
  const answer = route.answer.parse(await response.json());
  const session = sessionState.safeParse(answer);
  if (session.success) csrfToken = session.data.csrfToken;
  return answer as AnswerOf<Routes[N]>;
}

/** Fetches a download; throws a Problem. */
export async function download<N extends FileRoute>(
  name: N,
  request: Parts<N> & { signal?: AbortSignal },
): Promise<Blob> {
  const response = await send(name, request as Sent);
  return response.blob();
}

async function send(name: RouteName, request: Sent): Promise<Response> {
  try {
    return await attempt(name, request);
  } catch (error) {
    if (!isProblem(error, 'wrong-token')) throw error;
    csrfToken = null;
    return attempt(name, request);
  }
}

async function attempt(name: RouteName, { params, body, signal }: Sent): Promise<Response> {
  const route = routeTable[name];
  const headers: Record<string, string> = { accept: 'application/json' };
  if (route.method !== 'GET') headers[csrfHeader] = await token();
  const init: RequestInit = { method: route.method, headers, credentials: 'same-origin' };
  if (signal) init.signal = signal;
  if (body !== undefined) {
    headers['content-type'] = 'application/json';
    init.body = JSON.stringify(body);
  }
  const response = await reach(pathOf(route, params ?? {}), init);
  if (!response.ok) throw await problemOf(response);
  return response;
}

async function reach(path: string, init: RequestInit): Promise<Response> {
  try {
    return await fetch(path, init);
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') throw error;
    throw unreachable();
  }
}

async function token(): Promise<string> {
  if (csrfToken === null) await call('showSession', {});
  return csrfToken ?? '';
}
