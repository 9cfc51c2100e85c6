import { Link } from 'react-router-dom';
import { paths } from '../../../app/paths';
import { clockWords } from '../../../components/field/clockWords';
import { SaveLine } from '../../../components/field/SaveLine';
import { useWords } from '../../../components/words';
import { useSendState } from '../../../offline/useDevice';
import type { SendState } from '../../../offline/types';
import type { WordingKey } from '../../../../shared/wording/render';

/** Which sentence says what is unsent, worst news first. */
function sentence(send: SendState): WordingKey {
  if (send.needsAttention.length > 0) return 'field.unsent.attention';
  if (send.unsent === 0) return 'field.unsent.none';
  if (send.state === 'needs-sign-in') return 'field.unsent.signIn';
  return send.lastError ? 'field.unsent.noServer' : 'field.unsent.some';
}

/** One line on every field screen: what is not sent, that it is safe here, and since when it waits. */
export function UnsentLine({ saved }: { saved?: string }) {
  const { t, language } = useWords();
  const send = useSendState();
  const key = sentence(send);
  const words = t(key, {
    n: send.needsAttention.length || send.unsent,
    since: send.oldestUnsentAt ? clockWords(send.oldestUnsentAt, language, new Date()) : '',
  });
  const linked = key === 'field.unsent.attention' || key === 'field.unsent.signIn';
  return (
    <SaveLine
      ticked={key !== 'field.unsent.attention'}
      end={
        // Signed out with nothing unsent: what others do on the job no longer comes.
        key === 'field.unsent.none' &&
        send.state === 'needs-sign-in' && (
          <Link className="inline-flex min-h-14 items-center font-bold text-ink" to={paths.signIn}>
            {t('app.signIn')}
          </Link>
        )
      }
    >
      {saved && key === 'field.unsent.none' && <>{saved} </>}
      {linked ? (
        <Link
          className="inline-flex min-h-14 items-center text-ink"
          to={key === 'field.unsent.signIn' ? paths.signIn : paths.device}
        >
          {words}
        </Link>
      ) : (
        words
      )}
    </SaveLine>
  );
}
