import { Navigate, Outlet, useLocation } from 'react-router-dom';
import { paths } from '../lib/paths';
import { useSession } from '../lib/session-context';
import { ErrorState, Loading, Page } from '../ui';

/** Lets through who is signed in, and remembers where the others wanted to go. */
export function Gate() {
  const { session, retry } = useSession();
  const { pathname, search } = useLocation();
  if (session.state === 'in') return <Outlet />;
  if (session.state === 'out') {
    return <Navigate to={paths.signIn()} replace state={{ from: pathname + search }} />;
  }
  return (
    <Page width="reading">
      {session.state === 'loading' ? (
        <Loading />
      ) : (
        <ErrorState error={session.error} onRetry={retry} />
      )}
    </Page>
  );
}
