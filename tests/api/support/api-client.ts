import type { Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import request, { type Response } from 'supertest';
import { csrfHeader } from '#shared/contracts/account.ts';
import { pathOf } from '#shared/contracts/contract.ts';
import { type RouteName, routeTable } from '#shared/contracts/route-table.ts';

export interface Call {
  readonly params?: Readonly<Record<string, string>>;
  readonly body?: object | undefined;
  /** Headers to set; an empty one is left out. */
  readonly headers?: Readonly<Record<string, string>>;
}

/** A browser of the API: keeps cookies, sends Origin and token as our pages do. */
export interface ApiClient {
  call(route: RouteName, call?: Call): Promise<Response>;
  signIn(email: string, password: string): Promise<Response>;
  readonly agent: ReturnType<typeof request.agent>;
}

export const originOf = (server: Server) =>
  `http://127.0.0.1:${(server.address() as AddressInfo).port}`;

export function apiClient(server: Server): ApiClient {
  const agent = request.agent(server);
  let token: string | null = null;
  const remember = (response: Response) => {
    if (response.body?.csrfToken) token = response.body.csrfToken;
    return response;
  };
  const call = async (route: RouteName, { params = {}, body, headers = {} }: Call = {}) => {
    const { method, path } = routeTable[route];
    const verb = method.toLowerCase() as 'get' | 'post' | 'put' | 'delete';
    if (verb !== 'get' && token === null) remember(await agent.get('/api/session'));
    const all = { Origin: originOf(server), [csrfHeader]: token ?? '', ...headers };
    let sent = agent[verb](pathOf({ path }, params));
    for (const [name, value] of Object.entries(all)) if (value) sent = sent.set(name, value);
    return remember(await (body ? sent.send(body) : sent));
  };
  return {
    agent,
    call,
    signIn: (email, password) => {
      token = null;
      return call('signIn', { body: { email, password } });
    },
  };
}
