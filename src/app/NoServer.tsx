import { Button } from '../components/Button';
import { ButtonLink } from '../components/ButtonLink';
import { SheetPage } from '../components/sheet/SheetPage';
import { useWords } from '../components/words';
import { paths } from './paths';

/** Office pages need the server: says so, and shows the way to the work that does not. */
export function NoServer({ retry }: { retry: () => void }) {
  const { t } = useWords();
  return (
    <SheetPage title={t('app.noServer')}>
      <p className="max-w-[66ch]">{t('app.unreachable.next')}</p>
      <div className="flex flex-wrap gap-3">
        <Button look="primary" onClick={retry}>
          {t('app.tryAgain')}
        </Button>
        <ButtonLink to={paths.myJobs}>{t('app.noServer.field')}</ButtonLink>
      </div>
    </SheetPage>
  );
}
