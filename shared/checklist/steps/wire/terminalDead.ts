/** The first steps of a point: its terminals read dead, one by one, by the person who is about to touch them. */
import { foreignSupplies } from '../../../isolation/foreignSupplies';
import { say } from '../../../panel/says';
import { deadReading } from '../../asks';
import type { Facts, PointFacts } from '../../facts';
import { makeStep } from '../../makeStep';
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

/** Earth first, then the other pole of the group, then every pole of a supply that reaches the terminal from elsewhere. */
function readAgainst(facts: Facts, { point, group, supply }: PointFacts, terminal: string): Against[] {
  const reaching = foreignSupplies(point).map((tag) => facts.supply(tag ?? undefined));
  const foreign = reaching.filter((each) => each !== undefined);
  // A supply nobody can name may be unearthed: then the pair to earth proves nothing.
  const earthed = [supply, ...reaching].every((each) => each?.earthed ?? false);
  const poles = [
    ...(supply ? otherPoles(group, supply) : []).map((second) => ({ second, supply: supply?.tag ?? '' })),
    ...foreign.flatMap((each) => polesOf(each).map((second) => ({ second, supply: each.tag }))),
  ].filter(({ second }) => second !== terminal && second !== facts.panel.earthTerminal);
  const unique = [...new Map(poles.map((pole) => [pole.second, pole])).values()];
  return [
    { name: 'pe', second: facts.panel.earthTerminal, supply: supply?.tag ?? group.tag, proves: earthed },
    ...unique.map((pole, i) => ({ name: i === 0 ? 'pole' : `pole.${pole.second}`, ...pole, proves: true })),
  ];
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
