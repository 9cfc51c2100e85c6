import type { PanelView } from '../../../shared/api/panels';
import { useSaveDraft } from '../../api/panels';
import { ProblemMessage } from '../../components/ProblemMessage';
import { SheetSection } from '../../components/sheet/SheetSection';
import { useWords } from '../../components/words';
import { PanelFileDrop } from './PanelFileDrop';

/** Puts a mended file in place of the draft. Somebody else's newer draft is never overwritten: the version tells. */
export function DraftUpload({ panel }: { panel: PanelView }) {
  const { t } = useWords();
  const save = useSaveDraft(panel.id);
  return (
    <SheetSection title={t('office.draft.replace')} note={t('office.draft.replace.note')}>
      <PanelFileDrop
        label={t('office.panels.file')}
        busy={save.isPending}
        onPanel={(file) => save.mutate({ version: panel.draft.version, panel: file })}
      />
      {save.isSuccess && <p role="status">{t('office.draft.saved', { version: panel.draft.version })}</p>}
      <ProblemMessage error={save.error} kept={t('office.draft.kept')} />
    </SheetSection>
  );
}
