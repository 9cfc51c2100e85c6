import { useNavigate } from 'react-router-dom';
import { useSignOut } from '../../api/session';
import { paths } from '../../app/paths';
import { FieldButton } from '../../components/field/FieldButton';
import { setHere } from '../../components/field/here';
import { useWords } from '../../components/words';
import { useSendState } from '../../offline/useDevice';
import { Section } from './Section';

/** Signing out, refused while answers wait here: they would wait for somebody who is gone. */
export function LeaveSection() {
  const { t } = useWords();
  const { unsent } = useSendState();
  const signOut = useSignOut();
  const navigate = useNavigate();
  const leave = () => {
    signOut.mutate(undefined, {
      onSuccess: () => {
        setHere(null);
        void navigate(paths.signIn);
      },
    });
  };
  return (
    <Section title={t('app.signOut')}>
      <p className="m-0">{unsent > 0 ? t('device.leave.refused', { n: unsent }) : t('device.leave.what')}</p>
      <p role="alert" className="m-0 font-bold empty:hidden">
        {signOut.isError && t('device.leave.failed')}
      </p>
      <FieldButton disabled={unsent > 0 || signOut.isPending} onClick={leave}>
        {t('app.signOut')}
      </FieldButton>
    </Section>
  );
}
