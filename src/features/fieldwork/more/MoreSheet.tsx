import { useState } from 'react';
import type { Step } from '../../../../shared/checklist/types';
import { paths } from '../../../app/paths';
import { FieldButton, FieldLink } from '../../../components/field/FieldButton';
import { Sheet } from '../../../components/field/Sheet';
import { Switches } from '../../../components/field/Switches';
import { useWords } from '../../../components/words';
import { useFieldJob } from '../job/useFieldJob';
import { DiffersSheet } from './DiffersSheet';
import { JumpSheet } from './JumpSheet';
import { LeftSheet } from './LeftSheet';
import { NoteSheet } from './NoteSheet';
import { TemporarySheet } from './TemporarySheet';

const views = ['jump', 'left', 'differs', 'temporary', 'note'] as const;
type View = (typeof views)[number];

interface MoreSheetProps {
  step: Step | undefined;
  onClose: () => void;
}

function MoreMenu({ onView, onClose }: { onView: (view: View) => void; onClose: () => void }) {
  const { t } = useWords();
  const { pack } = useFieldJob();
  return (
    <Sheet title={t('field.more')} onClose={onClose}>
      <div className="grid grid-cols-2 gap-2">
        {views.map((view) => (
          <FieldButton
            key={view}
            onClick={() => {
              onView(view);
            }}
          >
            {t(`field.more.${view}`)}
          </FieldButton>
        ))}
        <FieldLink to={paths.jobLocks(pack.job.id)}>{t('field.locks.title')}</FieldLink>
        <FieldLink to={paths.myJob(pack.job.id)}>{t('field.job.open')}</FieldLink>
        <FieldLink to={paths.myJobs}>{t('field.jobs.title')}</FieldLink>
        <FieldLink to={paths.device} className="col-span-2">
          {t('field.thisDevice')}
        </FieldLink>
      </div>
      <Switches />
    </Sheet>
  );
}

/** The menu of a job and the sheets it opens, one at a time. */
export function MoreSheet({ step, onClose }: MoreSheetProps) {
  const [view, setView] = useState<View>();
  switch (view) {
    case 'jump':
      return <JumpSheet onClose={onClose} />;
    case 'left':
      return <LeftSheet onClose={onClose} />;
    case 'differs':
      return <DiffersSheet step={step} onClose={onClose} />;
    case 'temporary':
      return <TemporarySheet onClose={onClose} />;
    case 'note':
      return <NoteSheet onClose={onClose} />;
    case undefined:
      return <MoreMenu onView={setView} onClose={onClose} />;
  }
}
