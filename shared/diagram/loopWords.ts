/** The loop of a point in words: the text alternative of its picture. */
import type { Device } from '../panel/device';
import type { Panel } from '../panel/panelSchema';
import { say, type Text } from '../panel/says';
import { loopFacts, wiresOf, type LoopFacts } from './loopFacts';
import { loopNotes } from './loopNotes';
import type { Pole } from './poles';
import { fuseWords } from './rails';

const poleWords = ({ name, terminal }: Pole): Text => {
  if (name === '?') return say('diagram.words.pole.unsaid');
  return terminal ? say('diagram.words.pole', { name, terminal }) : say('diagram.words.pole.bare', { name });
};

function deviceWords(device: Device): Text {
  const kind = say(`diagram.kind.${device.kind === 'load' ? device.load : device.kind}`);
  return device.tag ? say('diagram.words.device', { kind, tag: device.tag }) : kind;
}

function fieldWords({ field, poles, point }: LoopFacts): Text {
  const far = poles.common === 'top' ? poles.bottom : poles.top;
  return say(`diagram.words.${field}`, {
    device: deviceWords(point.device),
    far: poleWords(far),
    top: poleWords(poles.top),
    bottom: poleWords(poles.bottom),
    terminal: point.terminal,
  });
}

const deviceLines = ({ point }: LoopFacts): Text[] => [
  ...(point.series ?? []).map((each) => say('diagram.words.series', { device: deviceWords(each) })),
  ...(point.parallel ?? []).map((each) => say('diagram.words.parallel', { device: deviceWords(each) })),
];

const wireLines = ({ point }: LoopFacts): Text[] =>
  wiresOf(point, ['signal', 'plus', 'minus', 'line', 'neutral', 'return', 'screen', 'earth']).map(
    ({ role, wire, terminal, colour }) =>
      say(colour ? 'diagram.words.wire.colour' : 'diagram.words.wire', {
        role: say(`diagram.role.${role}`),
        wire,
        terminal,
        colour: colour ?? '',
      }),
  );

function moduleLine({ module, group, poles, point }: LoopFacts): Text {
  if (!module || !group) return say('diagram.words.module.unsaid', { terminal: point.terminal });
  return say('diagram.words.module', {
    module: module.tag,
    terminal: point.terminal,
    common: group.terminal,
    pole: poleWords(poles[poles.common]),
  });
}

const fuseLines = ({ group, point, field }: LoopFacts): Text[] => [
  ...(group?.fuse ? [say('diagram.words.fuse.group', { fuse: fuseWords(group.fuse) })] : []),
  ...(point.fuse && field !== 'both-poles'
    ? [say('diagram.words.fuse.point', { fuse: fuseWords(point.fuse) })]
    : []),
];

/** Sentences, in the order in which the picture is read. */
export function loopSentences(panel: Panel, address: string): Text[] {
  const facts = loopFacts(panel, address);
  if (!facts) return [say('diagram.words.no-point', { address })];
  const { supply } = facts;
  return [
    ...(supply ? [say('diagram.words.supply', { tag: supply.tag, V: supply.V })] : []),
    fieldWords(facts),
    ...deviceLines(facts),
    ...wireLines(facts),
    moduleLine(facts),
    ...fuseLines(facts),
    ...loopNotes(panel, facts),
  ];
}

/** The same as one text. */
export const loopWords = (panel: Panel, address: string): Text =>
  loopSentences(panel, address).reduce((said, next) => say('diagram.words.then', { said, next }));
