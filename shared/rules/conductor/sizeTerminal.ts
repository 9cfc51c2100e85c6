/** Whether the conductor fits the module's terminal: too thin it slips out, too thick it does not go in. */
import { areaMm2 } from '../../electrical/size';
import { found, missing, quantity, titleOf, type RuleAt } from '../rule';
import { settleOnSite } from '../settleOnSite';
import { isUnused } from '../output/drawnLoads';

const id = 'wire.size-terminal';

export const sizeTerminal: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: "the module's stated terminal range",
  appliesTo: 'point',
  check: (place) => {
    const { module, point, path, where } = place;
    if (!module || isUnused(place)) return [];
    const range = module.terminalRange;
    if (!point.cable) return [missing(`${path}.cable`)];
    if (!range) return [missing(`modules.${module.tag}.terminalRange`)];
    const mm2 = areaMm2(point.cable.size);
    if (mm2 >= range.minMm2 * (1 - 1e-9) && mm2 <= range.maxMm2 * (1 + 1e-9)) return ['ok'];
    return [
      found(id, {
        harm: 'doubt',
        where,
        variant: mm2 < range.minMm2 ? 'thin' : 'thick',
        params: { mm2, minMm2: range.minMm2, maxMm2: range.maxMm2, terminal: point.terminal },
        because: [
          quantity('conductor-size', mm2, 'mm²', `${path}.cable.size`),
          quantity('terminal-least', range.minMm2, 'mm²', `modules.${module.tag}.terminalRange`),
          quantity('terminal-most', range.maxMm2, 'mm²', `modules.${module.tag}.terminalRange`),
        ],
        remedy: { says: { key: 'remedy.wire.size-terminal' } },
        addsSteps: settleOnSite(id, where),
      }),
    ];
  },
};
