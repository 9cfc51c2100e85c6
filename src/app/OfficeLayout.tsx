import { Navigate, Outlet, useLocation } from 'react-router-dom';
import { useSession } from '../api/session';
import { Loading } from '../components/Loading';
import { SheetFrame } from '../components/sheet/SheetFrame';
import { NoServer } from './NoServer';
import { OfficeHeader } from './OfficeHeader';
import { paths } from './paths';

/** The frame of the office screens; somebody not signed in goes to sign in and comes back to where they wanted. */
export function OfficeLayout() {
  const session = useSession();
  const { pathname, search } = useLocation();
  if (session.data === null)
    return <Navigate to={`${paths.signIn}?to=${encodeURIComponent(pathname + search)}`} replace />;
  if (session.data === undefined)
    return (
      <SheetFrame>
        {session.error ? <NoServer retry={() => void session.refetch()} /> : <Loading />}
      </SheetFrame>
    );
  return (
    <SheetFrame>
      <OfficeHeader />
      <Outlet />
    </SheetFrame>
  );
}
