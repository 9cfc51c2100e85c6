/** Every route declares who may call it with this middleware; the access test reads `policy` from the router itself. */
import type { Request, RequestHandler } from 'express';
import type { Role } from '../../shared/api/common';
import type { Actor } from './actor';
import { forbidden, Refused } from './refused';

export type Policy = { who: 'anyone' } | { who: 'signed-in' } | { roles: readonly Role[] };
export type PolicyHandler = RequestHandler & { policy: Policy };

function admits(policy: Policy, actor: Actor | undefined): void {
  if ('who' in policy && policy.who === 'anyone') return;
  if (!actor) throw new Refused(401, 'sign-in-needed');
  if ('roles' in policy && !actor.roles.some((held) => policy.roles.includes(held.role))) throw forbidden();
}

/** Middleware that lets through whom the policy names; the site is judged by the service that knows the row. */
export function authorise(policy: Policy): PolicyHandler {
  const handler: RequestHandler = (request, _response, next) => {
    admits(policy, request.user);
    next();
  };
  return Object.assign(handler, { policy });
}

/** The signed-in person of a request behind a policy that needs one. */
export function actorOf(request: Request): Actor {
  if (!request.user) throw new Refused(401, 'sign-in-needed');
  return request.user;
}
