import { Navigate, type RouteObject, createBrowserRouter } from 'react-router-dom';
import { Loading } from './components/states';
import { ErrorPage } from './shell/error-page';
import { NotFoundPage } from './shell/not-found-page';
import { Shell } from './shell/shell';

/** Every page is a file of its own that loads when it is first opened. */
export const routes: RouteObject[] = [
  {
    errorElement: <ErrorPage />,
    hydrateFallbackElement: <Loading label="Opening the page" />,
    children: [
      { path: '/sign-in', lazy: () => import('./features/auth/sign-in-page') },
      { path: '/forgotten-password', lazy: () => import('./features/auth/forgotten-password-page') },
      { path: '/reset-password', lazy: () => import('./features/auth/reset-password-page') },
      { path: '/accept-invitation', lazy: () => import('./features/auth/accept-invitation-page') },
      {
        element: <Shell />,
        children: [
          { index: true, element: <Navigate to="/find" replace /> },
          { path: '/find', lazy: () => import('./features/search/find-page') },
          { path: '/parts/:id', lazy: () => import('./features/parts/part-page') },
          { path: '/account', lazy: () => import('./features/account/account-page') },
          { path: '/families', lazy: () => import('./features/families/families-page') },
          { path: '/families/:id', lazy: () => import('./features/families/family-page') },
          { path: '/permissions', lazy: () => import('./features/permissions/permissions-page') },
          { path: '/audit', lazy: () => import('./features/audit/audit-page') },
          { path: '/people', lazy: () => import('./features/users/people-page') },
          { path: '/mail', lazy: () => import('./features/mail/mail-page') },
          { path: '/mail/:id', lazy: () => import('./features/mail/letter-page') },
          { path: '/backups', lazy: () => import('./features/backups/backups-page') },
          { path: '/policies', lazy: () => import('./features/policies/policies-page') },
          { path: '/policies/:id', lazy: () => import('./features/policies/policy-page') },
          { path: '/reviews', lazy: () => import('./features/reviews/reviews-page') },
          { path: '*', element: <NotFoundPage /> },
        ],
      },
    ],
  },
];

export const createRouter = () => createBrowserRouter(routes);
