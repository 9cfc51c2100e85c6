import type { PanelCheck } from '../../../shared/api/panels';
import { Tag } from '../Tag';
import { useWords } from '../words';

/** How long stored charge needs before each supply may be measured; unknown times are said to be unknown. */
export function WaitsList({ waits }: { waits: PanelCheck['isolation']['waits'] }) {
  const { t } = useWords();
  if (waits.length === 0) return null;
  return (
    <ul className="mt-3 mb-0 list-none p-0">
      {waits.map((wait) => (
        <li key={wait.supply}>
          <Tag>{wait.supply}</Tag>{' '}
          {wait.t1S === null && wait.statedS === undefined
            ? t('office.wait.unknown')
            : t('office.wait', { s: Math.ceil(Math.max(wait.t1S ?? 0, wait.statedS ?? 0)) })}
        </li>
      ))}
    </ul>
  );
}
