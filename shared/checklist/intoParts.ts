/** Splits a stage into parts with a finish line each, at the borders a person sees. */
import type { Step } from './types';

/** Items a part may hold: checklist.md, Order (short lists with a completion call are finished, long ones are lost in). */
export const partSize = 12;

/** Steps that belong together: one isolator, one point, one module's worth of checks. */
export interface Block {
  /** Blocks of different sections never share a part (a module, say). */
  section: string;
  steps: Step[];
}

const chunks = (steps: Step[]): Step[][] => {
  if (steps.length <= partSize) return [steps];
  const count = Math.ceil(steps.length / partSize);
  const size = Math.ceil(steps.length / count);
  return Array.from({ length: count }, (_, i) => steps.slice(i * size, (i + 1) * size));
};

/** Numbers the parts of freshly made steps from 1; a block is cut only when it alone exceeds a part. */
export function intoParts(blocks: readonly Block[]): Step[] {
  let part = 1;
  let room = partSize;
  let section: string | undefined;
  const numbered: Step[] = [];
  for (const block of blocks.filter(({ steps }) => steps.length > 0))
    for (const chunk of chunks(block.steps)) {
      const fresh = section !== undefined && (section !== block.section || chunk.length > room);
      if (fresh) part += 1;
      if (fresh) room = partSize;
      section = block.section;
      room -= chunk.length;
      for (const step of chunk) step.part = part;
      numbered.push(...chunk);
    }
  return numbered;
}
