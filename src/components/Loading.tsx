import { useWords } from './words';

/** Says that data is on its way, in words. */
export function Loading() {
  const { t } = useWords();
  return (
    <p role="status" className="text-muted">
      {t('app.loading')}
    </p>
  );
}
