import { paths } from '../../../app/paths';
import { FieldLink } from '../../../components/field/FieldButton';
import { LockBox } from '../../../components/field/LockBox';
import { StageStrip } from '../../../components/field/StageStrip';
import { TitleStrip } from '../../../components/field/TitleStrip';
import { useWords } from '../../../components/words';
import type { LocalJob } from '../../../offline/types';
import { folded } from '../job/folded';
import { locksOn } from '../job/ownLocks';
import { stageCells, stageWords } from '../job/stageCells';
import { ReadyVerdict } from './ReadyVerdict';

/** One job as a small drawing sheet: its title block, how far it is, who is locked on, and whether it works with no signal. */
export function JobCard({ local, person }: { local: LocalJob; person: string }) {
  const { t } = useWords();
  const { pack } = local;
  const state = folded(local);
  const cells = stageCells(state, t);
  const locks = locksOn(state);
  const isForeman = pack.people.find(({ id }) => id === person)?.part === 'foreman';
  return (
    <li className="border-2 border-ink bg-sheet">
      <TitleStrip
        cells={[
          { label: t('field.title.panel'), value: pack.panel.tag, note: pack.panel.name },
          { label: t('field.title.job'), value: pack.job.number },
          { label: t('field.title.round'), value: String(state.round.number) },
        ]}
      />
      <StageStrip cells={cells} words={stageWords(cells, t)} />
      <div className="grid gap-2.5 px-3 pb-3">
        <p className="m-0 leading-snug">
          {t(`field.status.${state.status}`)} {t('field.jobs.points', { n: pack.checklist.scope.length })}
        </p>
        <p className="m-0 flex flex-wrap items-center gap-2 leading-snug">
          {locks.length === 0 && t('field.locks.noneKnown')}
          {locks.map(({ entry, isolator, lock }) => (
            <LockBox key={entry} isolator={isolator} lock={lock} />
          ))}
        </p>
        <ReadyVerdict job={pack.job.id} />
        <FieldLink look="primary" to={paths.myJob(pack.job.id)}>
          {t('field.jobs.open', { number: pack.job.number })}
        </FieldLink>
        {isForeman && <FieldLink to={paths.review(pack.job.id)}>{t('field.jobs.review')}</FieldLink>}
      </div>
    </li>
  );
}
