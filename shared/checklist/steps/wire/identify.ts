/** The right cable, of the right size, before it is cut or landed. */
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import type { PointFacts } from '../../facts';
import { makeStep } from '../../makeStep';
import { sizeText } from '../../sizes';
import type { Step } from '../../types';

export function identify({ point, where }: PointFacts): Step[] {
  const { address, terminal, wire, cable, description, device } = point;
  const seen = makeStep({
    id: `wire.${address}.identify`,
    stage: 'wire',
    family: 'identify',
    where,
    title: say(cable?.tag ? 'checklist.wire.identify.cable' : 'checklist.wire.identify', {
      wire,
      cable: cable?.tag ?? '',
      terminal,
    }),
    detail: [
      say('checklist.said', { words: description }),
      ...(device.location ? [say('checklist.at', { location: device.location })] : []),
    ],
    ask: choice(['numbers-match'], ['numbers-differ']),
  });
  if (!cable) return [seen];
  const size = sizeText(cable.size);
  return [
    seen,
    makeStep({
      id: `wire.${address}.size`,
      stage: 'wire',
      family: 'identify',
      where,
      title: say('checklist.wire.size', { wire, terminal }),
      ask: choice(['size-expected'], ['size-other'], { size }),
    }),
  ];
}
