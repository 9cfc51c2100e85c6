import { useParams } from 'react-router-dom';
import { useChangeSite, useSites } from '../../api/sites';
import { Answered } from '../../components/Answered';
import { EmptyState } from '../../components/EmptyState';
import { SheetPage } from '../../components/sheet/SheetPage';
import { useWords } from '../../components/words';
import { siteValues } from './siteForm';
import { SiteForm } from './SiteForm';

/** Settings of one site. */
export function SitePage() {
  const { t } = useWords();
  const { site: id } = useParams();
  const sites = useSites();
  const change = useChangeSite();
  const site = sites.data?.items.find((each) => each.id === id);
  return (
    <SheetPage
      title={site?.name ?? t('app.site')}
      cells={[
        { label: t('app.sheet'), value: t('office.site.settings') },
        { label: t('app.site'), value: site?.name },
      ]}
    >
      <Answered query={sites}>
        {() =>
          site ? (
            <SiteForm
              key={site.version}
              start={siteValues(site)}
              busy={change.isPending}
              error={change.error}
              saved={change.isSuccess}
              onSave={(values) => change.mutate({ id: site.id, version: site.version, ...values })}
            />
          ) : (
            <EmptyState title={t('app.notFound')}>{t('app.notFound.says')}</EmptyState>
          )
        }
      </Answered>
    </SheetPage>
  );
}
