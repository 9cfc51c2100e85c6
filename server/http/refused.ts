/** An expected failure of a request, with the code a program branches on and the words a person reads. */
import type { Text } from '../../shared/panel/says';
import type { WordingKey } from '../../shared/wording/render';

export interface PathError {
  path: string;
  /** A text is rendered in the language of who asked. */
  says: string | Text;
}
export type ProblemCode =
  Extract<WordingKey, `problem.${string}`> extends `problem.${infer Code}` ? Code : never;

/** Thrown by services and middleware; the error handler answers it as application/problem+json. */
export class Refused extends Error {
  constructor(
    readonly status: number,
    readonly code: ProblemCode,
    readonly params: Text['params'] = {},
    readonly errors: PathError[] = [],
    readonly headers: Record<string, string> = {},
    /** What a program needs to go on, beside the problem's own members. */
    readonly facts: Record<string, unknown> = {},
  ) {
    super(code);
  }
}

export const notFound = (): Refused => new Refused(404, 'not-found');
export const forbidden = (): Refused => new Refused(403, 'forbidden');
