/** A pack whose checklist the real generator made, for looking at every step family on the phone. */
import type { Language } from '../../../shared/api/common';
import type { Pack } from '../../../shared/api/jobs';
import type { Checklist } from '../../../shared/checklist/types';
import { wordingKeys } from '../../../shared/checklist/textsOf';
import { messageOf } from '../../../shared/wording/render';
import { generateChecklist } from '../../../shared/checklist/generate';
import { digestOf } from '../../../shared/panel/canonical';
import { exampleInput } from '../smallPanel';
import { samplePack } from './samplePack';

const carried = (language: Language, checklist: Checklist): Record<string, string> =>
  Object.fromEntries(wordingKeys(checklist).map((key) => [key, messageOf(language, key) ?? '']));

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
    wording: { en: carried('en', checklist), es: carried('es', checklist) },
  };
  return { ...rest, digest: digestOf(rest) };
}
