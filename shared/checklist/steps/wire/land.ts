/** Each conductor on its terminal, with its ferrule, its torque and its colour. */
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import type { Facts, PointFacts } from '../../facts';
import { makeStep } from '../../makeStep';
import { ferruleText, torqueText } from '../../sizes';
import type { Step } from '../../types';
import { conductorsOf } from './conductorsOf';

/** Screens have a family of their own: they are earthed, not landed. */
export function land({ settings }: Facts, { point, module, where }: PointFacts): Step[] {
  const ferrule = ferruleText(point.cable, settings.ferruleScheme);
  return conductorsOf(point)
    .filter(({ role }) => role !== 'screen')
    .map(({ name, role, wire, terminal, colour }) => {
      const own = terminal === point.terminal;
      return makeStep({
        id: `wire.${point.address}.land.${name}`,
        stage: 'wire',
        family: 'land',
        title: say('checklist.wire.land', { wire, terminal }),
        detail: [
          say('checklist.wire.land.role', { role: say(`checklist.role.${role}`) }),
          ferrule,
          // The maker's torque is for the module's own terminals; it is said of the point's terminal only.
          torqueText(own ? module.terminalRange : undefined),
        ],
        where: own ? where : { point: point.address, terminal },
        ask: colour
          ? choice(['landed-colour'], ['other-colour'], { colour })
          : choice(['landed'], ['not-landed']),
        picture: { kind: 'loop', point: point.address, mark: role },
      });
    });
}
