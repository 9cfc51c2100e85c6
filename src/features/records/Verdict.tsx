import { useWords } from '../../components/words';

/** In limits, out of limits, or not counted: as a word with a shape. */
export function Verdict({ verdict }: { verdict: 'ok' | 'out' | 'refused' }) {
  const { t } = useWords();
  return (
    <span className={verdict === 'ok' ? '' : 'font-bold'}>
      <span aria-hidden="true">{{ ok: '✓', out: '▲', refused: '×' }[verdict]} </span>
      {t(`records.verdict.${verdict}`)}
    </span>
  );
}
