import { ProblemMessage } from '../../components/ProblemMessage';
import { useWords } from '../../components/words';

/** A mailed link that does not open: what the server said, or that the address is cut short. */
export function BadLink({ error }: { error: unknown }) {
  const { t } = useWords();
  if (error) return <ProblemMessage error={error} kept="" next={t('app.invitation.bad.says')} />;
  return (
    <div className="max-w-[66ch]">
      <p className="font-bold">{t('app.invitation.bad')}</p>
      <p>{t('app.invitation.bad.says')}</p>
    </div>
  );
}
