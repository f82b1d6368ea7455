import { type ReactNode, Suspense, lazy, useDeferredValue } from 'react';
import { Navigate, useLocation } from 'react-router-dom';
import { useSession } from '../api/session';
import { Loading } from '../components/states';

const SignInAgainDialog = lazy(() => import('../features/auth/sign-in-again-dialog'));

/** Lets nobody in who is not signed in; who was, and is not any more, signs in again over the page as it stands. */
export function RequireSession({ children }: { children: ReactNode }) {
  // The page that a restored sign-in opens is drawn in slices, so that the browser answers meanwhile.
  const state = useDeferredValue(useSession());
  const location = useLocation();
  switch (state.status) {
    case 'restoring':
      return <Loading label="Restoring the sign-in" />;
    case 'signed-out':
      return (
        <Navigate to={`/sign-in?next=${encodeURIComponent(location.pathname + location.search)}`} replace />
      );
    case 'signed-in':
    case 'expired':
      return (
        <>
          {children}
          {state.status === 'expired' && (
            <Suspense fallback={null}>
              <SignInAgainDialog email={state.session.user.email} />
            </Suspense>
          )}
        </>
      );
  }
}
