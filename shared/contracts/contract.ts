import type { z } from 'zod';
import type { Permission } from '#shared/policy/permissions.ts';

/** Who may call a route: anyone, any signed-in person, or a person with a permission. */
export type Access = AnyoneAccess | SignedInAccess | PermittedAccess;
export interface AnyoneAccess {
  readonly who: 'anyone';
}
export interface SignedInAccess {
  readonly who: 'signed-in';
}
export interface PermittedAccess<Needed extends Permission = Permission> {
  readonly who: 'permitted';
  readonly permission: Needed;
}

/** An answer that is a download and not JSON. */
export interface FileAnswer {
  readonly file: 'application/pdf' | 'application/json';
}

export type Method = 'GET' | 'POST' | 'PUT' | 'DELETE';

/**
 * One route of the API, shared by server and client. `params` are the path's `:names`; `answer` is
 * the schema of a 200 answer's JSON, or the kind of file.
 */
export interface Contract<
  Params extends z.ZodType = z.ZodType,
  Body extends z.ZodType | null = z.ZodType | null,
  Answer extends z.ZodType | FileAnswer = z.ZodType | FileAnswer,
  Allowed extends Access = Access,
> {
  readonly method: Method;
  readonly path: string;
  readonly access: Allowed;
  readonly params: Params;
  readonly body: Body;
  readonly answer: Answer;
}

/** Declares a route; only fixes the types. */
export function contract<
  Params extends z.ZodType,
  Body extends z.ZodType | null,
  Answer extends z.ZodType | FileAnswer,
  Allowed extends Access,
>(route: Contract<Params, Body, Answer, Allowed>): Contract<Params, Body, Answer, Allowed> {
  return Object.freeze(route);
}

export const anyone: AnyoneAccess = { who: 'anyone' };
export const signedIn: SignedInAccess = { who: 'signed-in' };
export const permitted = <Needed extends Permission>(
  permission: Needed,
): PermittedAccess<Needed> => ({ who: 'permitted', permission });

export type ParamsOf<C extends Contract> = z.output<C['params']>;
export type BodyOf<C extends Contract> = C['body'] extends z.ZodType ? z.output<C['body']> : null;
export type BodyInputOf<C extends Contract> = C['body'] extends z.ZodType
  ? z.input<C['body']>
  : null;
export type AnswerOf<C extends Contract> = C['answer'] extends z.ZodType
  ? z.output<C['answer']>
  : never;

/** The path with its `:names` filled in, each encoded. Throws where a name has no value. */
export function pathOf(route: Pick<Contract, 'path'>, params: Readonly<Record<string, string>>) {
  return route.path.replace(/:([A-Za-z]+)/g, (_, name: string) => {
    const value = params[name];
    if (value === undefined) throw new Error(`${route.path} needs ${name}`);
    return encodeURIComponent(value);
  });
}
