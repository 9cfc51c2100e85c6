import { usePanels } from '../../../api/panels';
import { Answered } from '../../../components/Answered';
import { EmptyState } from '../../../components/EmptyState';
import { MoreButton } from '../../../components/MoreButton';
import { useWords } from '../../../components/words';
import type { JobDraft } from './jobDraft';

interface PanelStepProps {
  site: string;
  draft: JobDraft;
  change: (change: Partial<JobDraft>) => void;
}

/** Which panel: only one with an issued revision can be worked on. */
export function PanelStep({ site, draft, change }: PanelStepProps) {
  const { t } = useWords();
  const panels = usePanels(site);
  // Points and reasons belong to one panel's revision: another choice starts them anew.
  const choose = (panel: string, revision: number) =>
    change(
      panel === draft.panel && revision === draft.revision
        ? {}
        : { panel, revision, points: [], reasons: {} },
    );
  return (
    <Answered query={panels}>
      {(data) => {
        const rows = data.pages.flatMap((page) => page.items);
        if (rows.length === 0)
          return <EmptyState title={t('office.panels.empty')}>{t('office.panels.empty.other')}</EmptyState>;
        return (
          <fieldset className="m-0 border-0 p-0">
            <legend className="mb-2 text-lg font-bold">{t('office.new.panel.ask')}</legend>
            {rows.map((row) => (
              <label
                key={row.id}
                className="flex min-h-11 items-center gap-3 border-b border-rule has-disabled:text-muted"
              >
                <input
                  type="radio"
                  name="panel"
                  className="h-5 w-5 accent-ink"
                  checked={draft.panel === row.id}
                  disabled={row.revision === null}
                  onChange={() => row.revision !== null && choose(row.id, row.revision)}
                />
                <span>
                  <strong className="font-mono">{row.tag}</strong> {row.name}
                </span>
                <span className="ml-auto text-sm">
                  {row.revision === null
                    ? t('office.panel.neverIssued')
                    : t('office.panel.issued', { n: row.revision })}
                </span>
              </label>
            ))}
            <MoreButton query={panels} />
          </fieldset>
        );
      }}
    </Answered>
  );
}
