import { Dialog, Portal } from '@chakra-ui/react';
import { Formik } from 'formik';
import { object } from 'yup';
import { problemOf } from '../../api/problem';
import { Button } from '../../components/button';
import { FormField } from '../../components/form-field';
import { FormRefusal } from '../../components/form-refusal';
import { reasonRule } from '../../components/reason-rule';
import { StackedForm } from '../../components/stacked-form';
import { useChangeUser } from './requests/change-user';
import type { UserDetails } from './requests/list-users';
import { RoleChoice, someRoles } from './role-choice';

const schema = object({ roles: someRoles, reason: reasonRule });

/** Gives a person these roles and no others. */
export function RolesDialog({ user, onClose }: { user: UserDetails; onClose: () => void }) {
  const change = useChangeUser();
  return (
    <Dialog.Root open closeOnInteractOutside={false} onOpenChange={({ open }) => !open && onClose()}>
      <Portal>
        <Dialog.Backdrop />
        <Dialog.Positioner>
          <Dialog.Content>
            <Dialog.Title>Roles of {user.name}</Dialog.Title>
            <Dialog.Description>They hold from the next thing this person does.</Dialog.Description>
            <Dialog.Body>
              <Formik
                validateOnBlur={false}
                initialValues={{ roles: user.roles, reason: '' }}
                validationSchema={schema}
                onSubmit={({ roles, reason }) =>
                  change
                    .mutateAsync({
                      id: user.id,
                      change: 'roles',
                      body: { roles, reason: reason.trim(), version: user.version },
                    })
                    .then(onClose, () => undefined)
                }
              >
                {({ isSubmitting }) => (
                  <StackedForm>
                    {change.isError && <FormRefusal error={change.error} />}
                    <RoleChoice />
                    <FormField
                      name="reason"
                      label="Reason"
                      multiline
                      refusal={change.isError ? problemOf(change.error).at('/reason') : undefined}
                    />
                    <Dialog.Footer>
                      <Button onClick={onClose}>Leave them as they are</Button>
                      <Button type="submit" variant="solid" disabled={isSubmitting}>
                        Give these roles
                      </Button>
                    </Dialog.Footer>
                  </StackedForm>
                )}
              </Formik>
            </Dialog.Body>
          </Dialog.Content>
        </Dialog.Positioner>
      </Portal>
    </Dialog.Root>
  );
}
