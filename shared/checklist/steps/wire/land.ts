/** Each conductor on its terminal, with its ferrule, its torque and its colour. */
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import type { Facts, PointFacts } from '../../facts';
import { makeStep } from '../../makeStep';
import { ferruleText, torqueText } from '../../sizes';
import type { Step } from '../../types';
import { conductorsOf } from './conductorsOf';

/** Screens have a family of their own: they are earthed, not landed. */
export const land = ({ settings }: Facts, { point, module }: PointFacts): Step[] =>
  conductorsOf(point)
    .filter(({ role }) => role !== 'screen')
    .map(({ name, role, wire, terminal, colour }) =>
      makeStep({
        id: `wire.${point.address}.land.${name}`,
        stage: 'wire',
        family: 'land',
        title: say('checklist.wire.land', { wire, terminal }),
        detail: [
          say('checklist.wire.land.role', { role: say(`checklist.role.${role}`) }),
          ferruleText(point.cable, settings.ferruleScheme),
          // The maker's torque is for the module's own terminals; it is said of the point's terminal only.
          torqueText(terminal === point.terminal ? module : { ...module, terminalRange: undefined }),
        ],
        where: { point: point.address, terminal },
        ask: colour
          ? choice(['landed-colour'], ['other-colour'], { colour })
          : choice(['landed'], ['not-landed']),
        picture: { kind: 'loop', point: point.address, mark: role },
      }),
    );
