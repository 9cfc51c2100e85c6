import { useNavigate } from 'react-router-dom';
import { useSignOut } from '../api/session';
import { useWords } from '../components/words';
import { paths } from './paths';

/** Ends the session. */
export function SignOutButton() {
  const { t } = useWords();
  const signOut = useSignOut();
  const navigate = useNavigate();
  const leave = () => signOut.mutate(undefined, { onSuccess: () => void navigate(paths.signIn) });
  return (
    <button
      type="button"
      onClick={leave}
      disabled={signOut.isPending}
      className="min-h-11 cursor-pointer px-1 text-ink underline underline-offset-4"
    >
      {t('app.signOut')}
    </button>
  );
}
