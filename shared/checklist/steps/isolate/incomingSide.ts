/** An isolator behind the door is reached only past its own incoming side: measured first, with a tester proved for it. */
import { say } from '../../../panel/says';
import { choice, deadReading } from '../../asks';
import type { Facts, IsolatorFacts } from '../../facts';
import { staysLive } from '../../liveSignal';
import { makeStep } from '../../makeStep';
import { testerProved } from '../../testerProved';
import type { Step } from '../../types';

const functions = ['AC', 'DC'] as const;

/** The highest voltage that can stand there: of every supply fed through it, every source of the panel counted in. */
function fedThrough({ panel }: Facts, tag: string) {
  const supplies = panel.supplies.filter(({ feeds }) => feeds.some(({ through }) => through.includes(tag)));
  const sources = new Set(
    supplies.flatMap(({ feeds }) =>
      feeds.filter(({ through }) => through.includes(tag)).map(({ from }) => from),
    ),
  );
  const from = [...panel.sources, ...panel.supplies].filter((each) => sources.has(each.tag));
  const V = Math.max(0, ...supplies.map((each) => each.V), ...from.map((each) => each.V ?? 0));
  const dc = supplies.length > 0 && supplies.every(({ kind }) => kind === 'dc');
  const most = Math.max(...panel.supplies.map((each) => each.V), 0);
  return {
    supply: [...supplies.map((each) => each.tag)].sort()[0] ?? tag,
    V: V || most,
    kind: dc ? 'dc' : 'ac',
  } as const;
}

/** Work near a part that stays live: only with the employer's leave, said so in red. */
const asLiveWork = (tag: string, V: number, kind: 'dc' | undefined): Step =>
  makeStep({
    id: `isolate.${tag}.live-work`,
    stage: 'isolate',
    family: 'incoming-side',
    title: say('checklist.isolate.live-work', { tag }),
    warnings: [staysLive(say('checklist.place.incoming', { tag }), V, kind)],
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
  const { supply, V, kind } = fedThrough(facts, tag);
  const stays = facts.plan.cover.find(({ incomingOf }) => incomingOf === tag);
  if (stays) return [asLiveWork(tag, stays.V, kind === 'dc' ? kind : undefined)];
  const proofs = testerProved(facts, [{ kind, V }]);
  const proved = (when: 'before' | 'after') => proofs(`isolate.${tag}`, when, 'isolate', 'one');
  return [...proved('before'), ...readings(facts, tag, supply), ...proved('after')];
}
