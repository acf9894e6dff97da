import type { Request, Response } from 'express';
import type { Auth } from '#server/auth/auth.ts';
import type { Viewer } from '#server/auth/viewer.ts';
import type { Deps } from '#server/deps.ts';
import type {
  AnswerOf,
  BodyOf,
  Contract,
  FileAnswer,
  ParamsOf,
  PermittedAccess,
} from '#shared/contracts/contract.ts';
import type {
  CalculationPermission,
  FirmPermission,
  Permission,
  ProjectPermission,
} from '#shared/policy/permissions.ts';

/** Where a permitted request acts; what it names is there and may be seen. */
export type ScopeOf<P extends Permission> = P extends FirmPermission
  ? { readonly firmId: string }
  : P extends ProjectPermission
    ? { readonly firmId: string; readonly projectId: string }
    : P extends CalculationPermission
      ? { readonly firmId: string; readonly projectId: string; readonly calculationId: string }
      : never;

export interface Context<C extends Contract = Contract> {
  readonly deps: Deps;
  readonly auth: Auth;
  readonly req: Request;
  readonly res: Response;
  readonly params: ParamsOf<C>;
  readonly body: BodyOf<C>;
  readonly viewer: C['access'] extends { who: 'anyone' } ? Viewer | null : Viewer;
  readonly scope: C['access'] extends PermittedAccess<infer P> ? ScopeOf<P> : null;
}

/** A download: its bytes or text, and the name that the browser saves it under. */
export interface FileContent {
  readonly content: Uint8Array | string;
  readonly filename: string;
}

type Answer<C extends Contract> = C['answer'] extends FileAnswer ? FileContent : AnswerOf<C>;

/** What a route does once the request is known to be allowed and well-formed. */
export type Handler<C extends Contract> = (context: Context<C>) => Promise<Answer<C>> | Answer<C>;

/** One handler for each contract of a feature. */
export type HandlersOf<Table extends Record<string, Contract>> = {
  readonly [Name in keyof Table]: Handler<Table[Name]>;
};
