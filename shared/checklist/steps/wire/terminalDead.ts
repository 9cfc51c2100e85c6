/** The first steps of a point: its terminals read dead, one by one, by the person who is about to touch them. */
import { foreignSupplies } from '../../../isolation/foreignSupplies';
import { say } from '../../../panel/says';
import { deadReading } from '../../asks';
import type { Facts, PointFacts } from '../../facts';
import { makeStep } from '../../makeStep';
import { naturalCompare } from '../../naturalCompare';
import type { Step } from '../../types';
import { conductorsOf, type Conductor } from './conductorsOf';
import { otherPoles, polesOf } from './poles';

const functions = ['AC', 'DC'] as const;
const atEarth: ReadonlySet<string> = new Set(['earth', 'screen']);

interface Against {
  name: string;
  second: string;
  supply: string;
  proves: boolean;
}

/** What the isolation engine asks of this terminal; the group's other pole where it asks nothing of that supply. */
function polesAgainst(facts: Facts, { point, group, supply }: PointFacts, terminal: string): Against[] {
  const earth = facts.panel.earthTerminal;
  const tested = facts
    .testsAt(point.address)
    .filter((test) => test.terminal === terminal && test.second !== earth)
    .sort((a, b) => naturalCompare(a.second, b.second));
  const own = supply
    ? otherPoles(group, supply).map((second) => ({ second, supply: supply.tag, proves: true }))
    : [];
  const foreign = foreignSupplies(point)
    .map((tag) => facts.supply(tag ?? undefined))
    .filter((each) => each !== undefined)
    .flatMap((each) => polesOf(each).map((second) => ({ second, supply: each.tag, proves: true })));
  const ownPoles = new Set(supply ? polesOf(supply) : []);
  const ownTested = tested.some(({ second }) => ownPoles.has(second));
  const against = [...tested, ...(ownTested ? [] : own), ...foreign];
  const unique = new Map(
    against
      .filter(({ second }) => second !== terminal && second !== earth)
      .reverse()
      .map((each) => [each.second, each]),
  );
  return [...unique.values()].reverse().map(({ second, supply: tag, proves }) => ({
    name: `pole.${second}`,
    second,
    supply: tag,
    proves,
  }));
}

/** Earth first, then every pole. A supply nobody can name may be unearthed: then the pair to earth proves nothing. */
function readAgainst(facts: Facts, worked: PointFacts, terminal: string): Against[] {
  const { point, group, supply } = worked;
  const reaching = foreignSupplies(point).map((tag) => facts.supply(tag ?? undefined));
  const proves = [supply, ...reaching].every((each) => each?.earthed ?? false);
  const second = facts.panel.earthTerminal;
  const toEarth = { name: 'pe', second, supply: supply?.tag ?? group.tag, proves };
  return [...(second === terminal ? [] : [toEarth]), ...polesAgainst(facts, worked, terminal)];
}

function readings(facts: Facts, worked: PointFacts, { name, terminal }: Conductor): Step[] {
  const { address } = worked.point;
  return readAgainst(facts, worked, terminal).flatMap((against) =>
    functions.map((function_) => {
      const { second, supply, proves } = against;
      return makeStep({
        id: `wire.${address}.dead.${name}.${against.name}.${function_.toLowerCase()}`,
        stage: 'wire',
        family: 'terminal-dead',
        title: say(`checklist.dead.read.${function_.toLowerCase()}`, { terminal, second }),
        detail: proves ? [] : [say('checklist.dead.proves-nothing', { supply })],
        where: terminal === worked.point.terminal ? worked.where : { point: address, terminal },
        ask: deadReading(function_, facts.settings.deadLimitV, {
          supply,
          pair: `${terminal}/${second}`,
          terminal,
          second,
          proves,
        }),
        personal: true,
        picture: worked.loop,
      });
    }),
  );
}

/** A plus or return that lands on a terminal which Prove dead already reads by name is not read twice. */
export function terminalDead(facts: Facts, worked: PointFacts): Step[] {
  const { point } = worked;
  const seen = new Set<string>();
  return conductorsOf(point)
    .filter(({ role, terminal }) => {
      const own = terminal === point.terminal;
      const read = !own && (facts.provedDead.has(terminal) || atEarth.has(role));
      const first = !read && !seen.has(terminal);
      seen.add(terminal);
      return first;
    })
    .flatMap((conductor) => readings(facts, worked, conductor));
}
