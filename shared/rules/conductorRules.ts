/** The rules of conductors and of what protects them. */
import { colour } from './conductor/colour';
import { drop } from './conductor/drop';
import { fuseMissing } from './conductor/fuseMissing';
import { fuseTooBig } from './conductor/fuseTooBig';
import { fuseTooSmall } from './conductor/fuseTooSmall';
import { screen } from './conductor/screen';
import { sizeTerminal } from './conductor/sizeTerminal';
import { tooSmall } from './conductor/tooSmall';
import type { Rule } from './rule';

export const conductorRules: readonly Rule[] = [
  colour,
  tooSmall,
  fuseTooBig,
  fuseMissing,
  fuseTooSmall,
  drop,
  sizeTerminal,
  screen,
];
