import { useJobPreview } from '../../../api/jobs';
import { useRevision } from '../../../api/panels';
import { Answered } from '../../../components/Answered';
import { Button } from '../../../components/Button';
import { useWords } from '../../../components/words';
import { useJobDraft, wizardSteps, type JobDraft, type WizardStep } from './jobDraft';
import { PanelStep } from './PanelStep';
import { PeopleStep } from './PeopleStep';
import { PointsStep } from './PointsStep';
import { PreviewPane } from './PreviewPane';
import { SendStep } from './SendStep';
import { StepStrip } from './StepStrip';

/** Is what this step asks for there, so that the next one may open? */
const complete: Record<WizardStep, (draft: JobDraft) => boolean> = {
  panel: (draft) => draft.panel !== null && draft.revision !== null,
  points: (draft) => draft.points.length > 0,
  people: (draft) => draft.electricians.length > 0 && draft.foreman !== '' && draft.due !== '',
  send: () => false,
};

/** The four steps of a new job, with what the choice means beside them. */
export function NewJobSteps({ site, me }: { site: string; me: string }) {
  const { t, language } = useWords();
  const [draft, change] = useJobDraft(site, me);
  const revision = useRevision(draft.panel ?? '', draft.panel === null ? null : draft.revision);
  const choice =
    draft.panel !== null && draft.revision !== null
      ? { panel: draft.panel, revision: draft.revision, points: draft.points }
      : null;
  const preview = useJobPreview(choice, language);
  const at = wizardSteps.indexOf(draft.step);
  const blocked = (preview.data?.blocked.length ?? 0) > 0;
  const go = (step: WizardStep | undefined) => step && change({ step });
  const mayGoOn = complete[draft.step](draft) && !(draft.step !== 'panel' && blocked);
  return (
    <>
      <StepStrip current={draft.step} />
      {draft.step !== 'panel' && revision.data && (
        <p className="m-0 mb-4 font-bold">
          {t('office.new.so.far', { tag: revision.data.panel.tag, points: draft.points.length })}
        </p>
      )}
      <div className="grid items-start gap-x-10 gap-y-6 lg:grid-cols-2">
        <div>
          {draft.step === 'panel' && <PanelStep site={site} draft={draft} change={change} />}
          {draft.step === 'points' && (
            <Answered query={revision}>
              {({ panel }) => <PointsStep panel={panel} draft={draft} change={change} />}
            </Answered>
          )}
          {draft.step === 'people' && <PeopleStep site={site} draft={draft} change={change} />}
          {draft.step === 'send' && <SendStep draft={draft} change={change} preview={preview.data} />}
          <div className="mt-6 flex flex-wrap gap-3">
            {at > 0 && <Button onClick={() => go(wizardSteps[at - 1])}>{t('app.back')}</Button>}
            {draft.step !== 'send' && (
              <Button look="primary" disabled={!mayGoOn} onClick={() => go(wizardSteps[at + 1])}>
                {t('app.next')}
              </Button>
            )}
          </div>
        </div>
        {draft.step !== 'panel' && (
          <PreviewPane
            preview={draft.points.length > 0 ? preview : null}
            disconnect={revision.data?.panel.disconnect ?? null}
          />
        )}
      </div>
    </>
  );
}
