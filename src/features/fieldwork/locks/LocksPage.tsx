import { useNavigate } from 'react-router-dom';
import type { LockState } from '../../../../shared/job/types';
import { ActionBar } from '../../../components/field/ActionBar';
import { clockWords } from '../../../components/field/clockWords';
import { FieldButton } from '../../../components/field/FieldButton';
import { FieldPage } from '../../../components/field/FieldPage';
import { LockBox } from '../../../components/field/LockBox';
import { TagBox } from '../../../components/field/TagBox';
import { useWords } from '../../../components/words';
import { JobHeader } from '../job/JobHeader';
import { useFieldJob } from '../job/useFieldJob';
import { UnsentLine } from '../layout/UnsentLine';
import { MoreButton } from '../more/MoreButton';
import { StopButton } from '../more/StopButton';
import { ClearList } from './ClearList';
import { OwnProof } from './OwnProof';

function LockLine({ lock }: { lock: LockState }) {
  const { t, language } = useWords();
  const { nameOf, me } = useFieldJob();
  const at = (time: string) => clockWords(time, language, new Date());
  const isOff = Boolean(lock.offAt ?? lock.removedBy);
  const who = lock.person === me.person ? t('field.locks.you') : nameOf(lock.person);
  return (
    <li className="flex flex-wrap items-center gap-2 leading-snug">
      <LockBox isolator={lock.isolator} lock={lock.lock} off={isOff} />
      <span>
        {who}, {t('field.locks.onAt', { at: at(lock.onAt) })}
        {lock.offAt && `, ${t('field.locks.offAt', { at: at(lock.offAt) })}`}
        {lock.removedBy && `, ${t('field.locks.removed', { name: nameOf(lock.removedBy) })}`}
      </span>
    </li>
  );
}

/** Every isolator of the plan in order, with the locks this phone has heard of. It never says that anything is dead. */
export function LocksPage() {
  const { t, language } = useWords();
  const navigate = useNavigate();
  const { pack, state, local } = useFieldJob();
  return (
    <FieldPage
      header={<JobHeader />}
      banner={<UnsentLine />}
      footer={
        <ActionBar>
          <FieldButton onClick={() => void navigate(-1)}>{t('field.back')}</FieldButton>
          <MoreButton />
          <StopButton pack={pack} />
        </ActionBar>
      }
    >
      <h1 className="m-0 font-bold text-[1.55rem] leading-tight">{t('field.locks.title')}</h1>
      <OwnProof />
      <p className="m-0 text-muted">
        {local.pulledAt
          ? t('field.locks.heard', { at: clockWords(local.pulledAt, language, new Date()) })
          : t('field.locks.neverHeard')}
      </p>
      <ol className="m-0 grid list-none gap-3 p-0">
        {pack.plan.isolators.map(({ isolator }) => {
          const locks = state.isolators[isolator.tag]?.locks ?? [];
          return (
            <li key={isolator.tag} className="grid gap-2 border-2 border-ink bg-sheet p-3">
              <p className="m-0 leading-snug">
                <TagBox>{isolator.tag}</TagBox> {isolator.location}
              </p>
              {locks.length === 0 && <p className="m-0 text-muted">{t('field.locks.noneKnown')}</p>}
              <ul className="m-0 grid list-none gap-2 p-0">
                {locks.map((lock) => (
                  <LockLine key={lock.entry} lock={lock} />
                ))}
              </ul>
            </li>
          );
        })}
      </ol>
      <ClearList />
    </FieldPage>
  );
}
