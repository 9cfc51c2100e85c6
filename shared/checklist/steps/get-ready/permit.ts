/** The number of the site's permit to work, where the site asks for one. */
import { say } from '../../../panel/says';
import type { Facts } from '../../facts';
import { makeStep } from '../../makeStep';
import type { Step } from '../../types';

export const permit = ({ settings }: Facts): Step[] =>
  settings.permitAsked
    ? [
        makeStep({
          id: 'ready.permit',
          stage: 'get-ready',
          family: 'permit',
          title: say('checklist.ready.permit'),
          ask: { kind: 'text', maxLength: 80 },
        }),
      ]
    : [];
