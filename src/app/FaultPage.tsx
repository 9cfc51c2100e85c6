import { useRouteError } from 'react-router-dom';
import { Button } from '../components/Button';
import { SheetFrame } from '../components/sheet/SheetFrame';
import { SheetPage } from '../components/sheet/SheetPage';
import { useWords } from '../components/words';

/** The one place where a fault of ours surfaces: nothing is swallowed, and what is safe is said. */
export function FaultPage() {
  const { t } = useWords();
  const error = useRouteError();
  return (
    <SheetFrame>
      <SheetPage title={t('app.fault')}>
        <p className="max-w-[66ch]">{t('app.fault.says')}</p>
        <Button look="primary" onClick={() => window.location.reload()}>
          {t('app.reload')}
        </Button>
        <pre className="mt-6 overflow-auto border border-rule p-3 font-mono text-sm whitespace-pre-wrap">
          {error instanceof Error ? `${error.name}: ${error.message}` : String(error)}
        </pre>
      </SheetPage>
    </SheetFrame>
  );
}
