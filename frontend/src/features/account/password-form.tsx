import { chakra } from '@chakra-ui/react';
import { Formik } from 'formik';
import { object, string } from 'yup';
import { problemOf } from '../../api/problem';
import { Button } from '../../components/button';
import { DoneNotice } from '../../components/done-notice';
import { FormField } from '../../components/form-field';
import { FormRefusal } from '../../components/form-refusal';
import { StackedForm } from '../../components/stacked-form';
import { newPassword, repeatedPassword } from '../auth/password-rules';
import { useChangePassword } from './requests/change-password';

const schema = object({
  current: string().required('Enter the password you have now.'),
  password: newPassword,
  repeated: repeatedPassword,
});

const nothingEntered = { current: '', password: '', repeated: '' };

/** The password one has, and the one to have. */
export function PasswordForm() {
  const change = useChangePassword();
  const problem = change.isError ? problemOf(change.error) : undefined;
  return (
    <Formik
      validateOnBlur={false}
      initialValues={nothingEntered}
      validationSchema={schema}
      onSubmit={({ current, password }, { resetForm }) =>
        change.mutateAsync({ currentPassword: current, newPassword: password }).then(
          () => resetForm(),
          () => undefined,
        )
      }
    >
      {({ isSubmitting }) => (
        <StackedForm>
          {change.isError && <FormRefusal error={change.error} />}
          <FormField
            name="current"
            label="Password now"
            type="password"
            autoComplete="current-password"
            refusal={problem?.at('/currentPassword')}
          />
          <FormField
            name="password"
            label="New password"
            type="password"
            autoComplete="new-password"
            refusal={problem?.at('/newPassword')}
          />
          <FormField name="repeated" label="Once more" type="password" autoComplete="new-password" />
          {change.isSuccess && (
            <DoneNotice>The new password holds. Every other sign-in of yours has been ended.</DoneNotice>
          )}
          <chakra.div>
            <Button type="submit" disabled={isSubmitting}>
              Change the password
            </Button>
          </chakra.div>
        </StackedForm>
      )}
    </Formik>
  );
}
