import { FieldButton, FieldLink } from '../../../components/field/FieldButton';
import { paths } from '../../../app/paths';
import { useWords } from '../../../components/words';
import type { Readiness } from '../../../offline/types';
import { useReadiness } from './useReadiness';

function Mark({ ok }: { ok: boolean }) {
  return (
    <svg viewBox="0 0 16 16" className="h-5 w-5 shrink-0" aria-hidden="true">
      <path d="M1.2 1.2h13.6v13.6H1.2z" fill="none" stroke="currentColor" strokeWidth="2.4" />
      <path
        d={ok ? 'm4.2 8.2 2.6 2.8 5-6' : 'M8 3.5v5.5M8 11v2'}
        fill="none"
        stroke="currentColor"
        strokeWidth="2.2"
      />
    </svg>
  );
}

type Check = Readiness['checks'][number];

function Missing({ check, mending, onMend }: { check: Check; mending: boolean; onMend: () => void }) {
  const { t, say } = useWords();
  return (
    <div className="grid gap-1">
      <p className="m-0 leading-snug">{say(check.says)}</p>
      {check.check === 'pin' ? (
        <FieldLink to={paths.device}>{check.button ? say(check.button) : t('field.thisDevice')}</FieldLink>
      ) : (
        check.button && (
          <FieldButton disabled={mending} aria-busy={mending} onClick={onMend}>
            {mending ? t('field.ready.mending') : say(check.button)}
          </FieldButton>
        )
      )}
    </div>
  );
}

/** "Works with no signal", or what is missing, each with the button that mends it. */
export function ReadyVerdict({ job }: { job: string }) {
  const { t } = useWords();
  const { readiness, mending, mend } = useReadiness(job);
  if (!readiness) return <p className="m-0 min-h-7 text-muted">{t('field.ready.looking')}</p>;
  return (
    <div role="status" className="grid gap-2">
      <p className="m-0 flex items-center gap-2 font-bold">
        <Mark ok={readiness.ready} />
        {t(readiness.ready ? 'field.ready.yes' : 'field.ready.no')}
      </p>
      {readiness.checks
        .filter(({ ok }) => !ok)
        .map((check) => (
          <Missing
            key={check.check}
            check={check}
            mending={mending === check.check}
            onMend={() => void mend(check.check)}
          />
        ))}
    </div>
  );
}
