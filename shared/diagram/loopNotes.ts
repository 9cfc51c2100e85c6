/** What stands in words under a loop: cable, foreign voltage, what the letters of the picture cannot hold. */
import type { Cable } from '../panel/device';
import type { Panel } from '../panel/panelSchema';
import { say, type Text } from '../panel/says';
import type { LoopFacts } from './loopFacts';
import { figures, loopValues, type LoopValue } from './loopValues';
import { fuseWords } from './rails';
import { ohms } from './sideBranches';

export const sizeWords = ({ size }: Cable): string => ('mm2' in size ? `${size.mm2} mm²` : `AWG ${size.awg}`);

function cableNote(cable: Cable): Text[] {
  const head = cable.tag ?? '';
  const colours = cable.colours ?? [];
  return [
    say(head ? 'diagram.cable' : 'diagram.cable.untagged', {
      tag: head,
      size: sizeWords(cable),
      m: cable.lengthM,
    }),
    ...(colours.length > 0 ? [say('diagram.colours', { colours: colours.join(' ') })] : []),
    ...(cable.screened === true ? [say(`diagram.screen.${cable.screenEarthed ?? 'unsaid'}`)] : []),
  ];
}

/** Foreign voltage at this point: said, said to be none, or not said by anybody. */
export function foreignNotes(panel: Panel, { point }: LoopFacts): Text[] {
  const voltsOf = (tag: string) => panel.supplies.find((each) => each.tag === tag)?.V ?? '?';
  const other = point.otherSupply;
  const devices = [point.device, ...(point.series ?? []), ...(point.parallel ?? [])];
  const loads = devices.flatMap((device) => (device.kind === 'ssr-control' ? [device.load] : []));
  return [
    ...(other === undefined ? [say('diagram.foreign.unsaid', { terminal: point.terminal })] : []),
    ...(other !== undefined && other !== 'none'
      ? [say('diagram.foreign', { supply: other, V: voltsOf(other), terminal: point.terminal })]
      : []),
    ...loads.map(({ supply, V }) => say('diagram.ssr-load', { supply, V })),
  ];
}

export function fittedNotes({ point }: LoopFacts): Text[] {
  const { bleeder, suppressor } = point;
  return [
    ...(bleeder ? [say('diagram.bleeder', { ohm: ohms(bleeder.ohm), W: bleeder.W })] : []),
    ...(suppressor && suppressor.kind !== 'none'
      ? [
          say(`diagram.suppressor.${suppressor.at}`, {
            kind: say(`diagram.suppressor.kind.${suppressor.kind}`),
          }),
        ]
      : []),
  ];
}

function valueNotes(facts: LoopFacts): Text[] {
  const values = loopValues(facts);
  if (!values) return [];
  const { supplyV, on, off } = values;
  const note = (state: 'on' | 'off', { V, mA }: LoopValue) =>
    say(`diagram.values.${state}`, { supplyV, V: figures(V), mA: figures(mA) });
  return [...(on ? [note('on', on)] : []), ...(off ? [note('off', off)] : [])];
}

/** On a three-wire sensor the file does not say which of its wires the point's fuse is in. */
const fuseNote = ({ point, field }: LoopFacts): Text[] =>
  point.fuse && field === 'both-poles'
    ? [say('diagram.words.fuse.point', { fuse: fuseWords(point.fuse) })]
    : [];

export function loopNotes(panel: Panel, facts: LoopFacts): Text[] {
  const { point } = facts;
  return [
    ...valueNotes(facts),
    ...fuseNote(facts),
    ...(point.cable ? cableNote(point.cable) : []),
    ...fittedNotes(facts),
    ...foreignNotes(panel, facts),
    ...(facts.supply ? [] : [say('diagram.supply.unsaid')]),
  ];
}
