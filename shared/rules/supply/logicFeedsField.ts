/** Field wiring on the supply of the controller's own electronics: a fault outside stops the controller. */
import { say } from '../../panel/says';
import { found, titleOf, type RuleAt } from '../rule';
import { atFedGroup } from './fedGroup';

const id = 'supply.logic-feeds-field';

export const logicFeedsField: RuleAt<'group'> = {
  id,
  title: titleOf(id),
  basis: 'common practice, no source',
  appliesTo: 'group',
  check: (place) =>
    atFedGroup(place, ({ supply }) =>
      supply.purpose === 'field'
        ? ['ok']
        : [
            found(id, {
              harm: 'fails',
              where: place.where,
              params: { supply: supply.tag, common: place.group.terminal },
              remedy: { says: say(`finding.${id}.remedy`) },
            }),
          ],
    ),
};
