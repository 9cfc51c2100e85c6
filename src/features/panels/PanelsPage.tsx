import { useNavigate } from 'react-router-dom';
import { useState } from 'react';
import { v7 as uuid } from 'uuid';
import type { Panel } from '../../../shared/panel/panelSchema';
import { paths } from '../../app/paths';
import { useCurrentSite } from '../../api/currentSite';
import { usePanels, useUploadPanel } from '../../api/panels';
import { holds, useSession } from '../../api/session';
import { Answered } from '../../components/Answered';
import { EmptyState } from '../../components/EmptyState';
import { MoreButton } from '../../components/MoreButton';
import { ProblemMessage } from '../../components/ProblemMessage';
import { SheetPage } from '../../components/sheet/SheetPage';
import { SheetSection } from '../../components/sheet/SheetSection';
import { useWords } from '../../components/words';
import { PanelFileDrop } from './PanelFileDrop';
import { PanelsTable } from './PanelsTable';

function Upload({ site }: { site: string }) {
  const { t } = useWords();
  const navigate = useNavigate();
  const upload = useUploadPanel();
  // One id a page visit: a second try of the same upload cannot make a second panel.
  const [id] = useState(() => uuid());
  const send = (panel: Panel) =>
    upload.mutate({ id, site, panel }, { onSuccess: () => void navigate(paths.panel(id)) });
  return (
    <SheetSection title={t('office.panels.add')}>
      <PanelFileDrop label={t('office.panels.file')} busy={upload.isPending} onPanel={send} />
      <ProblemMessage error={upload.error} kept={t('office.panel.file.nothing')} />
    </SheetSection>
  );
}

/** The panels of the site: issued revisions, drafts, and the way to bring in one more. */
export function PanelsPage() {
  const { t } = useWords();
  const { site } = useCurrentSite();
  const session = useSession();
  const panels = usePanels(site?.id);
  const mayEdit = session.data && holds(session.data, 'panel-engineer', site?.id);
  return (
    <SheetPage
      title={t('app.tab.panels')}
      titleHidden
      asOf={panels.dataUpdatedAt}
      cells={[
        { label: t('app.sheet'), value: t('app.tab.panels') },
        { label: t('app.site'), value: site?.name },
      ]}
    >
      <Answered query={panels}>
        {(data) => {
          const rows = data.pages.flatMap((page) => page.items);
          return rows.length === 0 ? (
            <EmptyState title={t('office.panels.empty')}>
              {mayEdit ? t('office.panels.empty.engineer') : t('office.panels.empty.other')}
            </EmptyState>
          ) : (
            <PanelsTable rows={rows} />
          );
        }}
      </Answered>
      <MoreButton query={panels} />
      <div className="mt-10">{mayEdit && site && <Upload site={site.id} />}</div>
    </SheetPage>
  );
}
