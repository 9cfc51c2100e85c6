import { useCurrentSite } from '../../api/currentSite';
import { useSession } from '../../api/session';
import { SheetPage } from '../../components/sheet/SheetPage';
import { useWords } from '../../components/words';
import { NewJobSteps } from './new/NewJobSteps';

/** Panel, points, people, due, send. */
export function NewJobPage() {
  const { t } = useWords();
  const { site } = useCurrentSite();
  const session = useSession();
  return (
    <SheetPage
      title={t('office.jobs.new')}
      cells={[
        { label: t('app.sheet'), value: t('office.jobs.new') },
        { label: t('app.site'), value: site?.name },
      ]}
    >
      {site && session.data && <NewJobSteps key={site.id} site={site.id} me={session.data.person.id} />}
    </SheetPage>
  );
}
