/** HQ-OP9: the old pump hall panel as it was found, with at least one finding of every check. */
import type { Panel } from '../../../../shared/panel/panelSchema';
import { analogueGroups, analogueModules, analoguePoints } from './faulty/analogues';
import { isolators, sources, supplies } from './faulty/energy';
import { inputGroups, inputModules, inputPoints } from './faulty/inputs';
import { outputGroups, outputModules, outputPoints } from './faulty/outputs';

export const faultyPanel: Panel = {
  format: 'coldloop-panel/1',
  tag: 'HQ-OP9',
  name: 'Old pump hall, as found',
  location: 'Old pump hall',
  drawing: { number: 'E-109', revision: 'A' },
  practice: 'IEC 60204-1',
  frequencyHz: 50,
  ambientC: 40,
  wiringMethod: 'B2',
  disconnect: 'Q1',
  earthTerminal: 'PE',
  sources,
  isolators,
  supplies,
  modules: [...inputModules, ...outputModules, ...analogueModules],
  groups: [...inputGroups, ...outputGroups, ...analogueGroups],
  points: [...inputPoints(), ...outputPoints(), ...analoguePoints()],
  stopControls: [
    {
      tag: 'S1',
      location: 'Door of HQ-OP9',
      stop: 'Press the red mushroom head S1',
      start: 'Press the green button S2',
      beforeTry: 'Turn S1 to release it',
    },
  ],
};
