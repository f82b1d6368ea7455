import { chakra } from '@chakra-ui/react';
import { useSignOut } from '../features/auth/requests/sign-out';

export function SignOutButton() {
  const { mutate, isPending, isError } = useSignOut();
  return (
    <chakra.button type="button" disabled={isPending} onClick={() => mutate('here')}>
      Sign out
      {isError && (
        <chakra.span role="alert" display="block" color="unmet" fontSize="xs">
          That did not work. Try again.
        </chakra.span>
      )}
    </chakra.button>
  );
}
