/** AC on a DC module, or the reverse; or a common on a pole that its supply does not have. */
import type { ModuleIo } from '../../panel/moduleIo';
import type { Group, Supply } from '../../panel/panelSchema';
import { say } from '../../panel/says';
import { found, quantity, titleOf, type RuleAt } from '../rule';
import { atFedGroup } from './fedGroup';

const id = 'supply.kind';

/** What a module's terminals are made for; `either` where both do no harm. */
function madeFor(io: ModuleIo): 'ac' | 'dc' | 'either' {
  switch (io.kind) {
    case 'digital-input':
      return io.current;
    case 'opto-input':
      return io.polarity === 'either' ? 'either' : 'dc';
    case 'digital-output':
      if (io.technology === 'triac') return 'ac';
      return io.technology === 'sinking' || io.technology === 'sourcing' ? 'dc' : 'either';
    default:
      return 'dc';
  }
}

const isAc = ({ kind }: Supply) => kind !== 'dc';
const isAcPole = ({ common }: Group) => common === 'line' || common === 'neutral';

export const supplyKind: RuleAt<'group'> = {
  id,
  title: titleOf(id),
  basis: "the module's own kind of current",
  appliesTo: 'group',
  check: (place) =>
    atFedGroup(place, ({ module, supply, volts }) => {
      const made = madeFor(module.io);
      const fed = isAc(supply) ? 'ac' : 'dc';
      const params = {
        supply: supply.tag,
        module: module.tag,
        fed: say(`finding.current.${fed}`),
        common: place.group.terminal,
        pole: say(`finding.pole.${place.group.common}`),
      };
      const because = [quantity('supply-high', volts.maxV, 'V', `supplies.${supply.tag}.V`)];
      const remedy = { says: say(`finding.${id}.remedy`) };
      if (made !== 'either' && made !== fed)
        return [found(id, { harm: 'damages', where: place.where, params, because, remedy })];
      return isAcPole(place.group) === (fed === 'ac')
        ? ['ok']
        : [found(id, { harm: 'damages', where: place.where, variant: 'pole', params, because, remedy })];
    }),
};
