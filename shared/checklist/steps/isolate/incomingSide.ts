/** An isolator behind the door is reached only past its own incoming side: measured first, with a tester proved for it. */
import { say } from '../../../panel/says';
import { choice, deadReading } from '../../asks';
import type { Facts, IsolatorFacts } from '../../facts';
import { staysLive } from '../../liveSignal';
import { makeStep } from '../../makeStep';
import { naturalCompare } from '../../naturalCompare';
import { testerProved, type KnownVoltage } from '../../testerProved';
import type { Step } from '../../types';

const functions = ['AC', 'DC'] as const;

/** What can stand on its incoming side: everything that feeds a supply through it, at the voltages of those. */
function fedThrough({ cabinet: panel }: Facts, tag: string): { supply: string; known: KnownVoltage[] } {
  const supplies = panel.supplies.filter(({ feeds }) => feeds.some(({ through }) => through.includes(tag)));
  const from = new Set(
    supplies.flatMap(({ feeds }) =>
      feeds.filter(({ through }) => through.includes(tag)).map((feed) => feed.from),
    ),
  );
  const most = Math.max(...panel.supplies.map(({ V }) => V), ...panel.sources.map(({ V }) => V ?? 0));
  const known = [
    ...panel.sources
      .filter((each) => from.has(each.tag))
      .map(
        ({ V, phases, kind }) =>
          ({ kind: phases === 'dc' || kind === 'battery' ? 'dc' : 'ac', V: V ?? most }) as const,
      ),
    ...panel.supplies
      .filter((each) => from.has(each.tag))
      .map(({ V, kind }) => ({ kind: kind === 'dc' ? 'dc' : 'ac', V }) as const),
  ];
  const first = supplies.map((each) => each.tag).sort(naturalCompare)[0];
  return { supply: first ?? tag, known: known.length > 0 ? known : [{ kind: 'ac', V: most }] };
}

/** Work near a part that stays live: only with the employer's leave, said so in red. */
const asLiveWork = (tag: string, V: number): Step =>
  makeStep({
    id: `isolate.${tag}.live-work`,
    stage: 'isolate',
    family: 'incoming-side',
    title: say('checklist.isolate.live-work', { tag }),
    warnings: [staysLive(say('checklist.place.incoming', { tag }), V, undefined)],
    where: { isolator: tag },
    ask: choice(['live-work-allowed'], ['live-work-not-allowed']),
    by: 'each',
  });

function readings(facts: Facts, tag: string, supply: string): Step[] {
  const { settings, panel } = facts;
  const pairs = [
    { name: 'poles', pair: 'L/N', second: `incoming:${tag}`, proves: true },
    // Whether the incoming side is earthed is not in the panel file, so this pair alone proves nothing.
    { name: 'earth', pair: 'L/PE', second: panel.earthTerminal, proves: false },
  ];
  return pairs.flatMap(({ name, pair, second, proves }) =>
    functions.map((function_) =>
      makeStep({
        id: `isolate.${tag}.incoming.${name}.${function_.toLowerCase()}`,
        stage: 'isolate',
        family: 'incoming-side',
        title: say(`checklist.isolate.incoming.${name}.${function_.toLowerCase()}`, {
          tag,
          earth: panel.earthTerminal,
        }),
        where: { isolator: tag },
        ask: deadReading(function_, settings.deadLimitV, {
          supply,
          pair,
          terminal: `incoming:${tag}`,
          second,
          proves,
        }),
        picture: { kind: 'energy' },
      }),
    ),
  );
}

export function incomingSide(facts: Facts, { isolator, afterDoor }: IsolatorFacts): Step[] {
  if (!afterDoor) return [];
  const { tag } = isolator;
  const { supply, known } = fedThrough(facts, tag);
  const stays = facts.plan.cover.find(({ incomingOf }) => incomingOf === tag);
  if (stays) return [asLiveWork(tag, stays.V)];
  const proofs = testerProved(facts, known);
  const proved = (when: 'before' | 'after') => proofs(`isolate.${tag}`, when, 'isolate', 'one');
  return [...proved('before'), ...readings(facts, tag, supply), ...proved('after')];
}
