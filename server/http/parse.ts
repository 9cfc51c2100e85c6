/** The edge: what came in is parsed by a schema of the contract, or refused with every path and reason. */
import { z } from 'zod';
import { schemaErrors } from '../../shared/panel/schemaErrors';
import { Refused, type PathError } from './refused';

export const pathErrors = (error: z.ZodError): PathError[] => schemaErrors(error);

/** A person mends the first errors; ten thousand of them would only hide those. */
const mostErrors = 200;

/** @throws Refused 422 with path and reason of each error. */
export function parse<S extends z.ZodType>(schema: S, value: unknown): z.output<S> {
  const parsed = schema.safeParse(value);
  if (!parsed.success) throw new Refused(422, 'invalid', {}, pathErrors(parsed.error).slice(0, mostErrors));
  return parsed.data;
}

const idParam = z.uuid();
/** An id in the URL; one that is no id is simply not found. */
export function parseId(value: unknown): string {
  const parsed = idParam.safeParse(value);
  if (!parsed.success) throw new Refused(404, 'not-found');
  return parsed.data;
}
