import { Router, type Request, type RequestHandler, type Response } from 'express';

import { matrix, type HttpMethod, type MatrixLine, type RoutePath } from '#shared/permissions/matrix';

import type { Access } from '../auth/Access.ts';

import { csrf } from './csrf.ts';
import { HttpError, notFound } from './HttpError.ts';

type OfAccess = Awaited<ReturnType<Access['building']>>;
export type SignedIn = NonNullable<Awaited<ReturnType<Access['person']>>>;

export interface Call {
  readonly request: Request;
  readonly response: Response;
}
export interface PersonCall extends Call {
  readonly signedIn: SignedIn;
}
export interface BuildingCall extends PersonCall {
  readonly building: NonNullable<NonNullable<OfAccess>['building']>;
}

const noSession = (): HttpError => new HttpError(401, 'no-session', 'Sign in to go on.');
const forbidden = (): HttpError => new HttpError(403, 'forbidden', 'Your role does not include this.');

/** Registers routes; each needs its line in the permission matrix and gets its refusals, in the contract's order, from it. */
export class ApiRouter {
  readonly router = Router({ caseSensitive: true });
  readonly registered: { readonly method: HttpMethod; readonly path: string }[] = [];

  constructor(private readonly access: Access) {}

  /** health, readiness and sign-in: no session asked for */
  open(
    method: HttpMethod,
    path: RoutePath,
    handler: (call: Call) => Promise<void>,
    before: RequestHandler[] = [],
  ): void {
    this.lineOf(method, path);
    this.add(method, path, before, (request, response) => handler({ request, response }));
  }

  /** asks for a session and the role */
  person(
    method: HttpMethod,
    path: RoutePath,
    handler: (call: PersonCall) => Promise<void>,
    before: RequestHandler[] = [],
  ): void {
    const line = this.lineOf(method, path);
    this.add(method, path, before, async (request, response) => {
      const signedIn = await this.access.person(request);
      if (signedIn === null) throw noSession();
      if (line.answers[signedIn.caller.role] === 403) throw forbidden();
      await handler({ request, response, signedIn });
    });
  }

  /** asks for a session, for a building that this person may know of, and the role, in this order */
  building(
    method: HttpMethod,
    path: RoutePath,
    handler: (call: BuildingCall) => Promise<void>,
    before: RequestHandler[] = [],
  ): void {
    const line = this.lineOf(method, path);
    this.add(method, path, before, async (request, response) => {
      const found = await this.access.building(request, String(request.params.id));
      if (found === null) throw noSession();
      if (found.building === null) throw notFound();
      if (line.answers[found.caller.role] === 403) throw forbidden();
      await handler({ request, response, signedIn: found, building: found.building });
    });
  }

  private lineOf(method: HttpMethod, path: string): MatrixLine {
    const line = matrix.find((one) => one.method === method && one.path === path);
    if (line === undefined) throw new Error(`${method} ${path} has no line in the permission matrix`);
    return line;
  }

  private add(method: HttpMethod, path: string, before: RequestHandler[], handler: RequestHandler): void {
    const register = { GET: 'get', POST: 'post', PUT: 'put', PATCH: 'patch', DELETE: 'delete' } as const;
    this.router[register[method]](path, ...before, csrf, handler);
    this.registered.push({ method, path });
  }
}
