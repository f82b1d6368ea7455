import { chakra } from '@chakra-ui/react';
import { Formik } from 'formik';
import { object, string } from 'yup';
import type { Schema } from '../../api/schema';
import { problemOf } from '../../api/problem';
import { Button } from '../../components/button';
import { DoneNotice } from '../../components/done-notice';
import { FormField } from '../../components/form-field';
import { FormRefusal } from '../../components/form-refusal';
import { StackedForm } from '../../components/stacked-form';
import { useInvite } from './requests/invitations';
import { RoleChoice, someRoles } from './role-choice';

const schema = object({
  email: string().trim().required('Enter the e-mail address.').email('This is not an e-mail address.'),
  roles: someRoles,
});

const nobody: { email: string; roles: Schema<'Role'>[] } = { email: '', roles: ['designer'] };

/** Address and roles; the name is chosen by whoever follows the link. */
export function InviteForm() {
  const invite = useInvite();
  return (
    <Formik
      validateOnBlur={false}
      initialValues={nobody}
      validationSchema={schema}
      onSubmit={({ email, roles }, { resetForm }) =>
        invite.mutateAsync({ email: email.trim(), roles }).then(
          () => resetForm(),
          () => undefined,
        )
      }
    >
      {({ isSubmitting }) => (
        <StackedForm>
          {invite.isError && <FormRefusal error={invite.error} />}
          <FormField
            name="email"
            label="E-mail"
            type="email"
            autoComplete="off"
            refusal={invite.isError ? problemOf(invite.error).at('/email') : undefined}
          />
          <RoleChoice />
          {invite.isSuccess && (
            <DoneNotice>An invitation is on its way to {invite.variables.email}.</DoneNotice>
          )}
          <chakra.div>
            <Button type="submit" variant="solid" disabled={isSubmitting}>
              Invite
            </Button>
          </chakra.div>
        </StackedForm>
      )}
    </Formik>
  );
}
