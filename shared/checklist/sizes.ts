/** How a conductor's size is written, and which ferrule and torque go with it. */
import { say, type Text } from '../panel/says';
import type { Cable } from '../panel/device';
import type { Module } from '../panel/panelSchema';
import type { FerruleScheme } from './facts';

/** Collar colours by cross-section: three schemes that contradict each other, so the site says which (reference §9.2). */
const collars: Record<FerruleScheme, Record<number, string>> = {
  'DIN 46228-4': {
    0.14: 'grey',
    0.25: 'yellow',
    0.34: 'turquoise',
    0.5: 'white',
    0.75: 'grey',
    1: 'red',
    1.5: 'black',
    2.5: 'blue',
    4: 'grey',
    6: 'yellow',
    10: 'red',
    16: 'blue',
    25: 'yellow',
  },
  'German old code': {
    0.14: 'grey',
    0.25: 'light-blue',
    0.34: 'turquoise',
    0.5: 'orange',
    0.75: 'white',
    1: 'yellow',
    1.5: 'red',
    2.5: 'blue',
    4: 'grey',
    6: 'black',
    10: 'ivory',
    16: 'green',
    25: 'brown',
  },
  'French code': {
    0.14: 'brown',
    0.25: 'violet',
    0.34: 'pink',
    0.5: 'white',
    0.75: 'blue',
    1: 'red',
    1.5: 'black',
    2.5: 'grey',
    4: 'orange',
    6: 'green',
    10: 'brown',
    16: 'ivory',
    25: 'black',
  },
};

export const ferruleColour = (mm2: number, scheme: FerruleScheme): string | undefined => collars[scheme][mm2];

/** "1.5 mm²" or "16 AWG". */
export const sizeText = (size: Cable['size']): Text =>
  'mm2' in size
    ? say('checklist.size.mm2', { mm2: size.mm2 })
    : // 1/0 to 4/0 are −0 to −3 by the wire tables' counting.
      size.awg > 0
      ? say('checklist.size.awg', { awg: size.awg })
      : say('checklist.size.awg-aught', { aughts: 1 - size.awg });

/** Only for a stranded metric conductor whose size the scheme lists; AWG sleeves differ by maker. */
export function ferruleText(cable: Cable | undefined, scheme: FerruleScheme): Text {
  if (cable?.conductor === 'class1-2') return say('checklist.wire.ferrule.class');
  const mm2 = cable && 'mm2' in cable.size ? cable.size.mm2 : undefined;
  const colour = mm2 === undefined ? undefined : ferruleColour(mm2, scheme);
  if (mm2 === undefined || colour === undefined) return say('checklist.wire.ferrule.unknown');
  return say('checklist.wire.ferrule', { mm2, colour: say(`checklist.colour.${colour}`), scheme });
}

/** The maker's torque, else the test torques of IEC 60999-1, marked as such: the panel file does not know the thread. */
export const torqueText = (terminalRange: Module['terminalRange']): Text =>
  terminalRange?.torqueNm === undefined
    ? say('checklist.wire.torque.test')
    : say('checklist.wire.torque', { Nm: terminalRange.torqueNm });
