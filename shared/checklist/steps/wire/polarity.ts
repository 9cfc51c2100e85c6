/** Plus where plus belongs: compared with the loop as the panel file says it, not from memory. */
import { say, type Text } from '../../../panel/says';
import { choice } from '../../asks';
import type { PointFacts } from '../../facts';
import { makeStep } from '../../makeStep';
import type { Step } from '../../types';

// Both switch either pole, so neither asks for a kind of common: checklist and rules agree to say so.
const suitsEitherCommon: ReadonlySet<string> = new Set(['contact', 'push-pull']);

function remarks({ point, group }: PointFacts): Text[] {
  const { kind } = point.device;
  return [
    say(`checklist.wire.polarity.common.${group.common}`, { terminal: group.terminal }),
    ...(suitsEitherCommon.has(kind) ? [say(`checklist.wire.polarity.either.${kind}`)] : []),
  ];
}

function polarisedLoad({ point }: PointFacts): Step[] {
  const { address, terminal, device } = point;
  const polarised = (device.kind === 'load' || device.kind === 'ssr-control') && device.polarised;
  if (!polarised) return [];
  return [
    makeStep({
      id: `wire.${address}.load-polarity`,
      stage: 'wire',
      family: 'polarity',
      title: say('checklist.wire.load-polarity', { load: device.tag ?? address, terminal }),
      where: { point: address, terminal },
      ask: choice(['plus-on-plus'], ['plus-on-minus']),
      picture: { kind: 'loop', point: address },
    }),
  ];
}

export const polarity = (worked: PointFacts): Step[] => [
  makeStep({
    id: `wire.${worked.point.address}.polarity`,
    stage: 'wire',
    family: 'polarity',
    title: say('checklist.wire.polarity', { terminal: worked.point.terminal }),
    detail: remarks(worked),
    where: worked.where,
    ask: choice(['as-picture'], ['not-as-picture']),
    picture: worked.loop,
  }),
  ...polarisedLoad(worked),
];
