/** The lock-out table and the dead tests. */
import { formatNumber } from '../../../../shared/wording/render';
import type { Printing } from './printed';
import { table } from './table';

const tag = { face: 'tag', size: 8 } as const;
const bold = { face: 'bold' } as const;

export function lockOutSection({ sheet, words: { t, at }, document }: Printing): void {
  sheet.heading(t('records.lockOut'), 2);
  table(
    sheet,
    [
      { head: t('records.round'), share: 7 },
      { head: t('records.isolator'), share: 16, written: tag },
      { head: t('records.lock'), share: 12, written: tag },
      { head: t('records.person'), share: 22 },
      { head: t('records.on'), share: 18 },
      { head: t('records.off'), share: 25 },
    ],
    document.lockOut.map(({ round, isolator, lock, person, onAt, offAt, removedBy }) => [
      String(round),
      isolator,
      lock,
      person,
      at(onAt),
      [
        offAt === null ? t('records.off.never') : at(offAt),
        removedBy && t('records.removedBy', { name: removedBy }),
      ]
        .filter(Boolean)
        .join(', '),
    ]),
  );
}

export function deadTestSection({ sheet, words: { t, at }, document }: Printing): void {
  sheet.heading(t('records.deadTests'), 2);
  table(
    sheet,
    [
      { head: t('records.round'), share: 7 },
      { head: t('records.between'), share: 20, written: tag },
      { head: t('records.pair'), share: 15, written: tag },
      { head: t('records.supply'), share: 10, written: tag },
      { head: t('records.reading'), share: 12, written: bold },
      { head: t('records.verdict'), share: 12 },
      { head: t('records.person'), share: 17 },
      { head: t('records.at'), share: 16 },
    ],
    document.deadTests.map((test) => [
      String(test.round),
      `${test.terminal} – ${test.second}`,
      test.pair,
      test.supply,
      `${formatNumber(test.value)} ${test.unit}`,
      t(`records.verdict.${test.verdict}`),
      test.person,
      at(test.at),
    ]),
  );
}
