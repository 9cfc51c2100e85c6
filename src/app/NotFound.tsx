import { ButtonLink } from '../components/ButtonLink';
import { SheetFrame } from '../components/sheet/SheetFrame';
import { SheetPage } from '../components/sheet/SheetPage';
import { useWords } from '../components/words';
import { paths } from './paths';

export function NotFound() {
  const { t } = useWords();
  return (
    <SheetFrame>
      <SheetPage title={t('app.notFound')}>
        <p className="max-w-[66ch]">{t('app.notFound.says')}</p>
        <ButtonLink to={paths.home}>{t('app.toStart')}</ButtonLink>
      </SheetPage>
    </SheetFrame>
  );
}
