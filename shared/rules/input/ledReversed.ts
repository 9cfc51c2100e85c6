/** An input with one LED whose common stands on the wrong pole: it stays dark, and above its reverse volts it breaks. */
import { say } from '../../panel/says';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { ledReversed as isReversed } from './fieldDevices';
import { atInput, isAc, type InputPlace } from './inputPlace';

const id = 'input.led-reversed';

function reversed({ where, group, io, ioPath, volts }: InputPlace): Outcome[] {
  const { reverseV } = io;
  const breaks = reverseV !== undefined && volts.maxV > reverseV;
  const finding = found(id, {
    harm: breaks ? 'damages' : 'fails',
    where,
    ...(breaks && { variant: 'breaks' }),
    params: { common: group.terminal, pole: say(`finding.pole.${group.common}`) },
    because: [
      quantity('supply-high', volts.maxV, 'V', volts.tolerancePath),
      ...(reverseV === undefined ? [] : [quantity('reverse-volts', reverseV, 'V', `${ioPath}.reverseV`)]),
    ],
    remedy: { says: say(`finding.${id}.remedy`, { group: group.tag }) },
  });
  if (reverseV === undefined) return [finding, missing(`${ioPath}.reverseV`)];
  return breaks || volts.known ? [finding] : [finding, missing(volts.tolerancePath)];
}

export const ledReversed: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: "the module's polarity and reverse volts",
  appliesTo: 'point',
  check: (place, context) =>
    atInput(place, context, (at) => {
      if (isAc(at) || at.io.polarity === 'either') return [];
      return isReversed(at) ? reversed(at) : ['ok'];
    }),
};
