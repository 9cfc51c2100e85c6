import type { FindingView } from '../../../shared/api/panels';
import { formatNumber } from '../../../shared/wording/renderWith';
import { heldMessage } from '../wording/held';
import { useWords } from '../words';

/** The sum behind a finding, line by line: what, how much, where the number is from. */
export function SumTable({ because }: { because: FindingView['because'] }) {
  const { t, language } = useWords();
  if (because.length === 0) return null;
  return (
    <table className="mt-2 w-full max-w-[44rem] border-collapse text-left text-sm">
      <caption className="sr-only">{t('office.sum')}</caption>
      <thead>
        <tr className="border-b border-ink text-muted">
          <th scope="col" className="pr-3 font-semibold">
            {t('office.sum.name')}
          </th>
          <th scope="col" className="pr-3 text-right font-semibold">
            {t('office.sum.value')}
          </th>
          <th scope="col" className="font-semibold">
            {t('office.sum.basis')}
          </th>
        </tr>
      </thead>
      <tbody>
        {because.map((quantity, index) => (
          <tr key={index} className="border-b border-rule">
            <td className="py-0.5 pr-3">{heldMessage(language, quantity.name) ?? quantity.name}</td>
            <td className="py-0.5 pr-3 text-right font-mono whitespace-nowrap">
              {formatNumber(quantity.value)} {quantity.unit}
            </td>
            <td className="py-0.5 text-muted wrap-anywhere">{quantity.basis}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
