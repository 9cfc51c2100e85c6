/** Every route of the server, read from its own router, with the policy it declares. */
import type { Express } from 'express';
import { z } from 'zod';
import type { Policy } from '../../server/http/authorise';

export interface DeclaredRoute {
  method: string;
  /** As the router matches it, e.g. `/api/jobs/:id`. */
  path: string;
  /** Null: nobody said who may call it. */
  policy: Policy | null;
}

const layer = z.looseObject({
  rawPath: z.string().optional(),
  handle: z.unknown(),
  route: z
    .looseObject({
      path: z.string(),
      stack: z.array(z.looseObject({ method: z.string().optional(), handle: z.unknown() })),
    })
    .optional(),
});
const stacked = z.custom<{ stack: unknown[] }>(
  (value) => typeof value === 'function' && 'stack' in value && Array.isArray(value.stack),
);
const declaring = z.custom<{ policy: Policy }>((value) => typeof value === 'function' && 'policy' in value);

/** The policy must stand first, before anything reads the request. */
function policyOf(handles: readonly unknown[]): Policy | null {
  const first = declaring.safeParse(handles[0]);
  return first.success ? first.data.policy : null;
}

const joined = (prefix: string, path: string) => `${prefix}${path}`.replace(/\/+/g, '/');

function walk(stack: readonly unknown[], prefix: string): DeclaredRoute[] {
  return stack.flatMap((each) => {
    const { rawPath = '/', handle, route } = layer.parse(each);
    if (route) {
      const methods = [...new Set(route.stack.map(({ method }) => method ?? 'all'))];
      return methods.map((method) => ({
        method,
        path: joined(prefix, route.path),
        policy: policyOf(route.stack.filter((one) => one.method === method).map((one) => one.handle)),
      }));
    }
    const inner = stacked.safeParse(handle);
    return inner.success ? walk(inner.data.stack, joined(prefix, rawPath)) : [];
  });
}

export const routesOf = (app: Express): DeclaredRoute[] => walk(stacked.parse(app.router).stack, '');
