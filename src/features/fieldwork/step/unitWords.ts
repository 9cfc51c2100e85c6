import type { ReadingAsk } from '../../../../shared/checklist/types';
import { formatNumber } from '../../../../shared/wording/renderWith';
import type { useWords } from '../../../components/words';

type Say = ReturnType<typeof useWords>['t'];

const signs: Record<Exclude<ReadingAsk['unit'], 'padlocks'>, string> = {
  'V AC': 'V AC',
  'V DC': 'V DC',
  A: 'A',
  mA: 'mA',
  ohm: 'Ω',
  Mohm: 'MΩ',
  mm2: 'mm²',
  Nm: 'Nm',
  s: 's',
};

/** The unit as it stands on a meter. */
export const unitSign = (unit: ReadingAsk['unit'], t: Say): string =>
  unit === 'padlocks' ? t('field.unit.padlocks') : signs[unit];

/** A reading with its unit, minus as a minus sign. */
export const readingWords = (value: number, unit: ReadingAsk['unit'], t: Say): string =>
  `${formatNumber(value).replace('-', '−')} ${unitSign(unit, t)}`;

/** The limits in words, shown while typing: "18.2 to 26.4 V DC". Empty when the reading is only noted. */
export function limitWords(ask: ReadingAsk, t: Say): string {
  const unit = unitSign(ask.unit, t);
  const number = (value: number | undefined) =>
    value === undefined ? '' : formatNumber(value).replace('-', '−');
  const [low, high] = [number(ask.low), number(ask.high)];
  if (ask.dead) return t('field.limit.dead', { high: (ask.high ?? 0).toFixed(1) });
  if (low && high)
    return low === high
      ? t('field.limit.exact', { low, unit })
      : t('field.limit.between', { low, high, unit });
  if (high) return t('field.limit.most', { high, unit });
  return low ? t('field.limit.least', { low, unit }) : '';
}
