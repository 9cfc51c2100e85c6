import { SignalBox } from '../../../components/SignalBox';
import { useWords } from '../../../components/words';
import type { NotSavedError } from '../../../offline/types';

/** What was entered is still on the screen and not kept yet: says so, why, and what to do. */
export function NotSaved({ code }: { code: NotSavedError['code'] | undefined }) {
  const { t } = useWords();
  if (!code) return null;
  return (
    <div role="alert">
      <SignalBox signal="notice">
        <p className="m-0 font-bold">{t('field.notSaved')}</p>
        <p className="m-0">{t(`field.notSaved.${code}`)}</p>
      </SignalBox>
    </div>
  );
}
