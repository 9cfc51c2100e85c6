/** Every pair of every worked supply, common and foreign terminal, read as AC and as DC, in parts that a proved tester closes. */
import { highestVolts } from '../../../isolation/highestVolts';
import type { DeadTest, Pair } from '../../../isolation/types';
import { say } from '../../../panel/says';
import type { Where } from '../../../rules/finding';
import { deadReading } from '../../asks';
import type { Facts } from '../../facts';
import { partSize, type Block } from '../../intoParts';
import { makeStep } from '../../makeStep';
import { naturalCompare } from '../../naturalCompare';
import { testerProved, voltagesToProve, type KnownVoltage } from '../../testerProved';
import type { Step } from '../../types';
import { readInWire } from '../wire/readInWire';

const functions = ['AC', 'DC'] as const;
const pairOrder: readonly Pair[] = [
  ...(['+/0 V', '+/PE', '0 V/PE', 'L/N', 'L1/L2', 'L2/L3', 'L1/L3'] as const),
  ...(['L1/N', 'L2/N', 'L3/N', 'L/PE', 'L1/PE', 'L2/PE', 'L3/PE', 'N/PE'] as const),
];
/** A pair whose pole the file does not name comes after those with a name. */
const orderOf = (pair: Pair): number =>
  pairOrder.includes(pair) ? pairOrder.indexOf(pair) : pairOrder.length;
const rank = { supply: 0, group: 1, point: 2 };

function placeOf({ at }: DeadTest): { kind: keyof typeof rank; tag: string } {
  if ('supply' in at) return { kind: 'supply', tag: at.supply };
  return 'group' in at ? { kind: 'group', tag: at.group } : { kind: 'point', tag: at.point };
}

/** The highest voltage first; one place's pairs together. */
function inOrder(facts: Facts): DeadTest[] {
  const volts = (test: DeadTest) => facts.supply(test.supply)?.V ?? 0;
  return facts.deadTests
    .filter((test) => !readInWire(facts, test))
    .sort((a, b) => {
      const [x, y] = [placeOf(a), placeOf(b)];
      return (
        volts(b) - volts(a) ||
        naturalCompare(a.supply, b.supply) ||
        rank[x.kind] - rank[y.kind] ||
        naturalCompare(x.tag, y.tag) ||
        orderOf(a.pair) - orderOf(b.pair) ||
        naturalCompare(a.terminal + a.second, b.terminal + b.second)
      );
    });
}

/** Tags are unique only in their kind, so two tests may come with one id: both then name kind and terminals. */
function stableIds(tests: DeadTest[]): Map<DeadTest, string> {
  const counts = new Map<string, number>();
  for (const { id } of tests) counts.set(id, (counts.get(id) ?? 0) + 1);
  return new Map(
    tests.map((test) => {
      const shared = (counts.get(test.id) ?? 0) > 1;
      return [test, shared ? `${test.id}.${placeOf(test).kind}.${test.terminal}-${test.second}` : test.id];
    }),
  );
}

function readings(facts: Facts, test: DeadTest, id: string): Step[] {
  const { supply, pair, terminal, second, proves } = test;
  const where: Where = { ...test.at, terminal };
  const limitV = Math.min(test.limitV, facts.settings.deadLimitV);
  return functions.map((function_) =>
    makeStep({
      id: `${id}.${function_.toLowerCase()}`,
      stage: 'prove-dead',
      family: 'dead-tests',
      title: say(`checklist.dead.read.${function_.toLowerCase()}`, { terminal, second }),
      detail: [
        say('checklist.dead.read.of', { supply, pair }),
        ...(proves ? [] : [say('checklist.dead.proves-nothing', { supply })]),
      ],
      where,
      ask: deadReading(function_, limitV, { supply, pair, terminal, second, proves }),
      by: 'each',
    }),
  );
}

/** Each voltage that the drawings give the supply; one they do not have counts as the highest there is. */
function nominal(facts: Facts, { supply }: DeadTest): KnownVoltage[] {
  const found = facts.described(supply);
  if (found.length === 0) return [{ kind: 'ac', V: highestVolts(facts.cabinet) }];
  return found.map(({ kind, V }) => ({ kind: kind === 'dc' ? 'dc' : 'ac', V }));
}

interface Part {
  tests: DeadTest[];
  known: KnownVoltage[];
}

/** As many tests as fit with the proofs their voltages ask for; a place's pairs are kept together by the order. */
function inParts(facts: Facts, tests: DeadTest[]): Part[] {
  const items = ({ tests: held, known }: Part) => 2 * held.length + 2 * voltagesToProve(facts, known).length;
  return tests.reduce<Part[]>((parts, test) => {
    const last = parts.at(-1);
    const grown = last && {
      tests: [...last.tests, test],
      known: [...last.known, ...nominal(facts, test)],
    };
    if (grown && items(grown) <= partSize) return [...parts.slice(0, -1), grown];
    return [...parts, { tests: [test], known: nominal(facts, test) }];
  }, []);
}

/**
 * One block a part: tester proved, readings, tester proved again.
 * A part's own id is its first test's, so that a new point elsewhere renames no other part.
 */
export function deadTests(facts: Facts): Block[] {
  const tests = inOrder(facts);
  const ids = stableIds(tests);
  const idOf = (test: DeadTest) => ids.get(test) ?? test.id;
  return inParts(facts, tests).map(({ tests: held, known }) => {
    const name = held[0] ? idOf(held[0]) : '';
    const proofs = testerProved(facts, known);
    return {
      section: name,
      steps: [
        ...proofs(name, 'before', 'prove-dead', 'each'),
        ...held.flatMap((test) => readings(facts, test, idOf(test))),
        ...proofs(name, 'after', 'prove-dead', 'each'),
      ],
    };
  });
}
