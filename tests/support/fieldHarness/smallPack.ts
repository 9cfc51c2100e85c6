/** A pack whose checklist the real generator made, for looking at every step family on the phone. */
import type { Pack } from '../../../shared/api/jobs';
import { generateChecklist } from '../../../shared/checklist/generate';
import { digestOf } from '../../../shared/panel/canonical';
import { exampleInput } from '../smallPanel';
import { samplePack } from './samplePack';

export function smallPack(): Pack {
  const input = exampleInput();
  const checklist = generateChecklist(input);
  const { digest: _digest, ...sample } = samplePack;
  const rest = {
    ...sample,
    panel: input.panel,
    checklist,
    plan: input.plan,
    waits: input.waits,
    wording: { en: {}, es: {} },
  };
  return { ...rest, digest: digestOf(rest) };
}
