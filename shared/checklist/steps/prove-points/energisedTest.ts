/** From here on the panel is live: who may be there, what is covered, who watches, and what nobody does. */
import { say } from '../../../panel/says';
import { choice, written } from '../../asks';
import { makeStep } from '../../makeStep';
import type { Step } from '../../types';

const common = { stage: 'prove-points', family: 'energised-test', everyRound: true } as const;

const seen = (name: string, good: string, bad: string): Step =>
  makeStep({
    ...common,
    id: `prove.${name}`,
    title: say(`checklist.prove.${name}`),
    ask: choice([good], [bad]),
  });

const named = (name: string): Step =>
  makeStep({ ...common, id: `prove.${name}`, title: say(`checklist.prove.${name}`), ask: written });

export const energisedTest = (): Step[] => [
  makeStep({
    ...common,
    id: 'prove.rule',
    title: say('checklist.prove.rule'),
    detail: [say('checklist.prove.rule.fault')],
    warnings: [{ signal: 'danger', says: say('checklist.warning.energised') }],
    ask: choice(['rule-understood'], ['rule-not-understood']),
    by: 'each',
  }),
  named('allowed'),
  seen('area', 'area-closed', 'area-open'),
  seen('covers', 'live-parts-covered', 'live-parts-bare'),
  seen('leads', 'leads-shrouded', 'leads-bare'),
  named('second'),
  seen('radio', 'radio-heard', 'radio-not-heard'),
  seen('controller', 'controller-run', 'controller-stop'),
];
