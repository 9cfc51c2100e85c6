/** The tester each person will prove dead with, and what it is proved on. */
import type { Panel } from '../../../panel/panelSchema';
import { say } from '../../../panel/says';
import { choice, written } from '../../asks';
import type { Facts } from '../../facts';
import { makeStep } from '../../makeStep';
import type { Ask, Step } from '../../types';

const electrical: ReadonlySet<string> = new Set(['feeder', 'other-panel', 'battery', 'generator']);
// The top of low voltage (AC): what a tester must bear while a source's voltage is not stated.
const unknownV = 1000;

/** The least tester that is allowed: for the highest source, an unknown one counted as the highest there is. */
export function weakestTester({ sources, supplies }: Panel): Extract<Ask, { kind: 'instrument' }> {
  const feeding = sources.filter(({ kind }) => electrical.has(kind));
  // Wired from the building's installation is CAT III; a battery alone is not (IEC 61010-2-030, from memory).
  const onBatteries = feeding.length > 0 && feeding.every(({ kind }) => kind === 'battery');
  const volts = [...feeding.map(({ V }) => V ?? unknownV), ...supplies.map(({ V }) => V)];
  return {
    kind: 'instrument',
    minCategory: onBatteries ? 'CAT II' : 'CAT III',
    minV: feeding.length > 0 ? Math.max(...volts) : unknownV,
  };
}

export function instrument({ cabinet, settings }: Facts): Step[] {
  const tester = weakestTester(cabinet);
  const each = { stage: 'get-ready', family: 'instrument', by: 'each' } as const;
  return [
    makeStep({
      ...each,
      id: 'ready.instrument',
      title: say('checklist.ready.instrument'),
      detail: [say('checklist.ready.instrument.least', { category: tester.minCategory, V: tester.minV })],
      ask: tester,
    }),
    makeStep({
      ...each,
      id: 'ready.leads',
      title: say('checklist.ready.leads'),
      ask: choice(['leads-sound'], ['leads-bad']),
    }),
    makeStep({
      ...each,
      id: 'ready.lowest',
      title: say('checklist.ready.lowest'),
      detail: [say('checklist.ready.lowest.second', { V: settings.deadLimitV })],
      ask: {
        kind: 'reading',
        unit: 'V DC',
        low: 0,
        high: settings.deadLimitV,
        why: say('checklist.why.lowest', { V: settings.deadLimitV }),
      },
    }),
    makeStep({
      ...each,
      id: 'ready.proving',
      title: say('checklist.ready.proving'),
      detail: [say('checklist.ready.proving.kind')],
      ask: choice(['proving-unit', 'proving-live-point'], ['proving-nothing']),
    }),
    makeStep({
      ...each,
      id: 'ready.proving.name',
      title: say('checklist.ready.proving.name'),
      ask: written,
    }),
  ];
}
