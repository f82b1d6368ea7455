import { Dialog, Portal } from '@chakra-ui/react';
import { endSession } from '../../api/session';
import { Button } from '../../components/button';
import { SignInForm } from './sign-in-form';

/** Over a page whose sign-in has lapsed: signing in again sends what was waiting, and nothing typed is lost. */
export default function SignInAgainDialog({ email }: { email: string }) {
  return (
    <Dialog.Root open role="dialog" closeOnEscape={false} closeOnInteractOutside={false}>
      <Portal>
        <Dialog.Backdrop />
        <Dialog.Positioner>
          <Dialog.Content>
            <Dialog.Title>Sign in again</Dialog.Title>
            <Dialog.Description>
              Your sign-in has ended. The page behind stays as it is, and goes on once you are back.
            </Dialog.Description>
            <Dialog.Body>
              <SignInForm email={email} />
              <Button variant="plain" mt={4} onClick={endSession}>
                Leave this page instead
              </Button>
            </Dialog.Body>
          </Dialog.Content>
        </Dialog.Positioner>
      </Portal>
    </Dialog.Root>
  );
}
