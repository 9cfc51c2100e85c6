import { Navigate } from 'react-router-dom';
import { useSession } from '../api/session';
import { Loading } from '../components/Loading';
import { landing } from './landing';
import { paths } from './paths';

/** Sends everybody to where their work is; without a server, to the work on this device. */
export function Home() {
  const session = useSession();
  if (session.data === null) return <Navigate to={paths.signIn} replace />;
  if (session.data) return <Navigate to={landing(session.data.roles.map((each) => each.role))} replace />;
  if (session.error) return <Navigate to={paths.myJobs} replace />;
  return <Loading />;
}
