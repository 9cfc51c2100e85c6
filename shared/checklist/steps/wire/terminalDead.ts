/** The first steps of a point: its terminals read dead, one by one, by the person who is about to touch them. */
import { foreignSupplies } from '../../../isolation/foreignSupplies';
import type { Supply } from '../../../panel/panelSchema';
import { say } from '../../../panel/says';
import { deadReading } from '../../asks';
import type { Facts, PointFacts } from '../../facts';
import { makeStep } from '../../makeStep';
import { naturalCompare } from '../../naturalCompare';
import type { Step } from '../../types';
import { conductorsOf, type Conductor } from './conductorsOf';
import { supplyTerminals } from '../../../isolation/supplyTerminals';
import { otherPoles } from './poles';

const atEarth: ReadonlySet<string> = new Set(['earth', 'screen']);

interface Against {
  name: string;
  second: string;
  supply: string;
  proves: boolean;
}

type Pole = Omit<Against, 'name'>;

const everyPole = (supply: Supply): Pole[] =>
  supplyTerminals(supply).map((second) => ({ second, supply: supply.tag, proves: true }));

/** The group's other pole, where the isolation engine asks nothing of that supply at this terminal. */
function ownPoles({ group, supply }: PointFacts, tested: readonly Pole[]): Pole[] {
  if (!supply) return [];
  const poles = supplyTerminals(supply);
  if (tested.some(({ second }) => poles.includes(second))) return [];
  return otherPoles(group, supply).map((second) => ({ second, supply: supply.tag, proves: true }));
}

/** What the isolation engine asks of this terminal, then the group's other pole, then every foreign pole; each once. */
function polesAgainst(facts: Facts, worked: PointFacts, terminal: string): Against[] {
  const { point } = worked;
  const earth = facts.panel.earthTerminal;
  const tested: Pole[] = facts
    .testsAt(point.address)
    .filter((test) => test.terminal === terminal && test.second !== earth)
    .sort((a, b) => naturalCompare(a.second, b.second));
  const foreign = foreignSupplies(point).flatMap((tag) => {
    const supply = facts.supply(tag ?? undefined);
    return supply ? everyPole(supply) : [];
  });
  const found = new Map<string, Against>();
  for (const { second, supply, proves } of [...tested, ...ownPoles(worked, tested), ...foreign]) {
    if (second === terminal || second === earth) continue;
    // The first that asks says whether it proves; the last that asks gives the place in the order.
    const first = found.get(second) ?? { name: `pole.${second}`, second, supply, proves };
    found.delete(second);
    found.set(second, first);
  }
  return [...found.values()];
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

/** One pair, as AC and as DC: what the two steps have in common is shared, for a checklist holds thousands of pairs. */
function readPair(facts: Facts, worked: PointFacts, { name, terminal }: Conductor, against: Against): Step[] {
  const { address } = worked.point;
  const { second, supply, proves } = against;
  const dead = { supply, pair: `${terminal}/${second}`, terminal, second, proves };
  const places = { terminal, second };
  const where = terminal === worked.point.terminal ? worked.where : { point: address, terminal };
  const detail = proves ? undefined : [say('checklist.dead.proves-nothing', { supply })];
  const pair = `wire.${address}.dead.${name}.${against.name}`;
  const read = (function_: 'AC' | 'DC', id: string, title: string) =>
    makeStep({
      id,
      stage: 'wire',
      family: 'terminal-dead',
      title: say(title, places),
      detail,
      where,
      ask: deadReading(function_, facts.settings.deadLimitV, dead),
      personal: true,
      picture: worked.loop,
    });
  return [
    read('AC', `${pair}.ac`, 'checklist.dead.read.ac'),
    read('DC', `${pair}.dc`, 'checklist.dead.read.dc'),
  ];
}

const readings = (facts: Facts, worked: PointFacts, conductor: Conductor): Step[] =>
  readAgainst(facts, worked, conductor.terminal).flatMap((against) =>
    readPair(facts, worked, conductor, against),
  );

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
