import { chakra } from '@chakra-ui/react';
import { Link, Navigate, useSearchParams } from 'react-router-dom';
import { useSession } from '../../api/session';
import { Loading } from '../../components/states';
import { AuthFrame } from './auth-frame';
import { destinationAfterSignIn } from './destination';
import { SignInForm } from './sign-in-form';

export function Component() {
  const [parameters] = useSearchParams();
  const state = useSession();
  if (state.status === 'restoring') return <Loading label="Restoring the sign-in" />;
  if (state.status === 'signed-in')
    return <Navigate to={destinationAfterSignIn(parameters.get('next'))} replace />;
  return (
    <AuthFrame title="Sign in" lead="Approved resistors, and the arithmetic that says why they fit.">
      <SignInForm />
      <chakra.p mt={4} fontSize="sm">
        <Link to="/forgotten-password">Forgotten your password?</Link>
      </chakra.p>
    </AuthFrame>
  );
}
