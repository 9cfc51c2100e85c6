import { useSearchParams, Navigate } from 'react-router-dom';
import { paths } from '../../app/paths';
import { useSession } from '../../api/session';
import { SheetPage } from '../../components/sheet/SheetPage';
import { useWords } from '../../components/words';
import { SafetyPosition } from './SafetyPosition';
import { SignInForm } from './SignInForm';

/** Only a path of our own is followed after signing in, never another host. */
const ownPath = (to: string | null): string =>
  to !== null && to.startsWith('/') && !to.startsWith('//') && !to.includes('\\') ? to : paths.home;

export function SignInPage() {
  const { t } = useWords();
  const session = useSession();
  const [search] = useSearchParams();
  if (session.data) return <Navigate to={ownPath(search.get('to'))} replace />;
  return (
    <SheetPage title={t('app.signIn')} cells={[{ label: t('app.sheet'), value: t('app.signIn') }]}>
      <div className="grid items-start gap-x-12 gap-y-6 md:grid-cols-2">
        <SignInForm done={search.get('done')} />
        <div className="max-w-[34rem]">
          <p className="m-0 mb-4 text-lg">{t('app.signIn.purpose')}</p>
          <SafetyPosition />
        </div>
      </div>
    </SheetPage>
  );
}
