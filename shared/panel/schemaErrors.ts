/** What a schema refused, as paths and reasons that a person can act on. */
import type { z } from 'zod';

export interface SchemaError {
  /** Path of the value, e.g. `supplies.0.terminals.N`; empty for the whole document. */
  path: string;
  says: string;
}

type Issue = z.core.$ZodIssue;

/** Of a choice between shapes, the one that was nearly met: the deepest complaint, then the fewest. */
function nearest(branches: readonly (readonly Issue[])[]): readonly Issue[] {
  const depth = (issues: readonly Issue[]) => Math.max(0, ...issues.map(({ path }) => path.length));
  const [best] = [...branches].sort((a, b) => depth(b) - depth(a) || a.length - b.length);
  return best ?? [];
}

function errorsOf(issue: Issue, above: readonly PropertyKey[]): SchemaError[] {
  const path = [...above, ...issue.path];
  if (issue.code === 'unrecognized_keys')
    return issue.keys.map((key) => ({ path: [...path, key].join('.'), says: 'is not known here' }));
  if (issue.code === 'invalid_union' && issue.errors.length > 0)
    return nearest(issue.errors).flatMap((one) => errorsOf(one, path));
  return [{ path: path.join('.'), says: issue.message }];
}

export const schemaErrors = (error: z.ZodError): SchemaError[] =>
  error.issues.flatMap((issue) => errorsOf(issue, []));
