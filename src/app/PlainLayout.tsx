import { Link, Outlet } from 'react-router-dom';
import { useSession } from '../api/session';
import { SheetFrame } from '../components/sheet/SheetFrame';
import { useWords } from '../components/words';
import { OfficeHeader } from './OfficeHeader';
import { paths } from './paths';

/** The frame of the pages that work without signing in; whoever is signed in keeps their tabs. */
export function PlainLayout() {
  const { t } = useWords();
  const session = useSession();
  if (session.data)
    return (
      <SheetFrame>
        <OfficeHeader />
        <Outlet />
      </SheetFrame>
    );
  return (
    <SheetFrame>
      <header className="flex border-b-2 border-ink">
        <Link to={paths.signIn} className="flex min-h-12 items-center px-5 font-bold no-underline">
          {t('app.name')}
        </Link>
      </header>
      <Outlet />
    </SheetFrame>
  );
}
