import { chakra } from '@chakra-ui/react';
import { isRouteErrorResponse, useRouteError } from 'react-router-dom';
import { Failed } from '../components/states';
import { NotFoundPage } from './not-found-page';

/** What is shown when a page breaks: what happened, and the way on. */
export function ErrorPage() {
  const error = useRouteError();
  if (isRouteErrorResponse(error) && error.status === 404) return <NotFoundPage />;
  return (
    <chakra.div px={6} py={4}>
      <title>Something went wrong · Resistry</title>
      <Failed error={error} onRetry={() => window.location.reload()} />
    </chakra.div>
  );
}
