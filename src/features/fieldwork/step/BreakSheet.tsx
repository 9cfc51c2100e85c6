import { useNavigate } from 'react-router-dom';
import type { LockState } from '../../../../shared/job/types';
import { paths } from '../../../app/paths';
import { FieldButton } from '../../../components/field/FieldButton';
import { LockBox } from '../../../components/field/LockBox';
import { MarkedText } from '../../../components/field/MarkedText';
import { Sheet } from '../../../components/field/Sheet';
import { SignalBox } from '../../../components/SignalBox';
import { useWords } from '../../../components/words';
import { useDeviceStore } from '../../../offline/useDevice';
import { nextFor } from '../job/engine';
import { NotSaved } from '../job/NotSaved';
import { useFieldJob } from '../job/useFieldJob';
import { useSave } from '../job/useSave';
import { answerWords } from './answerWords';
import { proveAgainMs } from './breakSince';
import { lastAnswered } from './lastAnswered';

function LastAnswer() {
  const { t } = useWords();
  const { local, state, me, stepOf, marked, plain } = useFieldJob();
  const last = lastAnswered(local, state, me.person);
  const step = last && stepOf(last.step);
  if (!step) return null;
  return (
    <div className="border-l-8 border-ink bg-paper px-3 py-2">
      <p className="m-0 text-muted">{t('field.break.last')}</p>
      <p className="m-0 font-bold">
        <MarkedText text={marked(step.title)} look="bold" />
      </p>
      <p className="m-0">{answerWords(step, last.answer.value, t, plain)}</p>
    </div>
  );
}

/** After a break: the last answer, and a look at one's own locks before anything else. */
export function BreakSheet({ awayMs, locks }: { awayMs: number; locks: LockState[] }) {
  const { t } = useWords();
  const { pack, me } = useFieldJob();
  const { save, saving, failed } = useSave();
  const store = useDeviceStore();
  const navigate = useNavigate();
  const minutes = Number.isFinite(awayMs) ? Math.floor(awayMs / 60_000) : 0;
  const list = locks.map(({ lock, isolator }) => t('field.break.lockOn', { lock, isolator })).join(', ');
  const isLong = awayMs >= proveAgainMs;
  /** Isolation starts again for everything in scope: a new round, with the reason in words. */
  async function again(words: string) {
    if (!(await save('round-started', { points: pack.checklist.scope, reason: 'break', words }))) return;
    const fresh = await store.job(pack.job.id);
    const next = fresh && nextFor(fresh, me.person);
    await navigate(next ? paths.step(pack.job.id, next.id) : paths.myJob(pack.job.id));
  }
  const confirm = () =>
    isLong
      ? again(t('field.break.noteLong', { minutes, list }))
      : save('note', { words: t('field.break.note', { minutes, list }) });
  return (
    <Sheet
      title={t('field.break.title', { minutes })}
      onClose={() => void navigate(paths.myJob(pack.job.id))}
      closeWords={t('field.job.open')}
      actions={
        <>
          <FieldButton look="primary" disabled={saving} onClick={() => void confirm()}>
            {t(isLong ? 'field.break.onProve' : 'field.break.on')}
          </FieldButton>
          <FieldButton disabled={saving} onClick={() => void again(t('field.break.noteMissing', { list }))}>
            {t('field.break.missing')}
          </FieldButton>
        </>
      }
    >
      <LastAnswer />
      <p className="m-0 text-[1.2rem] font-bold">{t('field.break.look')}</p>
      <p className="m-0 flex flex-wrap gap-2">
        {locks.map(({ entry, isolator, lock }) => (
          <LockBox key={entry} isolator={isolator} lock={lock} />
        ))}
      </p>
      {isLong && <SignalBox signal="warning">{t('field.break.long')}</SignalBox>}
      <NotSaved code={failed} />
    </Sheet>
  );
}
