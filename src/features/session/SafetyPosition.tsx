import { SignalBox } from '../../components/SignalBox';
import { useWords } from '../../components/words';

/** What Coldloop is and is not, before anybody signs in. */
export function SafetyPosition() {
  const { t } = useWords();
  return (
    <SignalBox signal="danger">
      <p className="m-0 text-lg font-bold">{t('app.safety.live')}</p>
      <p className="mt-2 mb-0">{t('app.safety.follow')}</p>
      <p className="mt-2 mb-0">{t('app.safety.rules')}</p>
    </SignalBox>
  );
}
