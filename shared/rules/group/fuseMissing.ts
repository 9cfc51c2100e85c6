/** An output group with no fuse in series anywhere: a short circuit burns its wires. */
import { say } from '../../panel/says';
import { found, titleOf, type RuleAt } from '../rule';
import { isConnected } from '../spare';
import { atFedGroup } from '../supply/fedGroup';

const id = 'group.fuse-missing';

export const fuseMissing: RuleAt<'group'> = {
  id,
  title: titleOf(id),
  basis: 'IEC 60204-1 7.2: overcurrent protection of control circuits',
  appliesTo: 'group',
  check: (place) => {
    const { module, group, points, where } = place;
    const wired = points.filter(({ point }) => point.spare !== true || isConnected(point));
    if (module?.io.kind !== 'digital-output' || wired.length === 0) return [];
    if (group.fuse || wired.every(({ point }) => point.fuse)) return ['ok'];
    return atFedGroup(place, ({ supply }) => {
      if (supply.protectionA !== undefined) return ['ok'];
      const { groupA } = module.io.kind === 'digital-output' ? module.io : { groupA: undefined };
      return [
        found(id, {
          harm: 'damages',
          where,
          params: { group: group.tag, supply: supply.tag },
          remedy: {
            says:
              groupA === undefined
                ? say(`finding.${id}.remedy`)
                : say(`finding.${id}.remedy.most`, { A: groupA }),
            ...(groupA !== undefined && { values: { A: groupA } }),
          },
          addsSteps: [
            { family: 'check-fuse', where, ...(groupA !== undefined && { params: { maxA: groupA } }) },
          ],
        }),
      ];
    });
  },
};
